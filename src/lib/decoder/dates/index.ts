/** Every date format, and reading in one of them. A new format is a module beside this file and a line here. */
import type { DateContext, DateFormat, DateReading } from './format';
import { amcEngineDayBuild } from './amc-engine-day-build';
import { carterMonthYear } from './carter-month-year';
import { chryslerCasting } from './chrysler-casting';
import { chryslerDayCount } from './chrysler-day-count';
import { chryslerPad } from './chrysler-pad';
import { chryslerPunched } from './chrysler-punched';
import { chryslerScheduled } from './chrysler-scheduled';
import { corvetteBodyMonthDay } from './corvette-body-month-day';
import { delcoYearMonthDay } from './delco-year-month-day';
import { fordAxleTag } from './ford-axle-tag';
import { fordCasting } from './ford-casting';
import { fordEngineAssembly } from './ford-engine-assembly';
import { fordEngineTag } from './ford-engine-tag';
import { fordPartWeek } from './ford-part-week';
import { fordPartYear } from './ford-part-year';
import { fordPlate } from './ford-plate';
import { gmAssemblyMonthDay } from './gm-assembly-month-day';
import { gmBodyMonthWeek } from './gm-body-month-week';
import { gmCasting } from './gm-casting';
import { gmEngineMonthDay } from './gm-engine-month-day';
import { gmGearboxMonthDay } from './gm-gearbox-month-day';
import { gmGearboxYearMonthDay } from './gm-gearbox-year-month-day';
import { holleyYearMonthWeek } from './holley-year-month-week';
import { labelMonthYear } from './label-month-year';
import { lofGlass } from './lof-glass';
import { muncieMonthDay } from './muncie-month-day';
import { muncieYearMonthDay } from './muncie-year-month-day';
import { partMonthYear } from './part-month-year';
import { pontiacCasting } from './pontiac-casting';
import { rochesterDayOfYear } from './rochester-day-of-year';
import { rochesterMonthYear } from './rochester-month-year';
import { turbo400RunDay } from './turbo-400-run-day';
import { weekYear } from './week-year';
import { readIn } from './read-date';

export type {
	DateContext,
	DateFault,
	DateFormat,
	DateMeaning,
	DatePart,
	DateReading
} from './format';
export { readIn } from './read-date';

const ALL = [
	gmBodyMonthWeek,
	corvetteBodyMonthDay,
	gmEngineMonthDay,
	gmAssemblyMonthDay,
	gmCasting,
	pontiacCasting,
	muncieMonthDay,
	muncieYearMonthDay,
	gmGearboxMonthDay,
	gmGearboxYearMonthDay,
	turbo400RunDay,
	delcoYearMonthDay,
	rochesterDayOfYear,
	rochesterMonthYear,
	lofGlass,
	chryslerScheduled,
	chryslerPunched,
	chryslerCasting,
	chryslerPad,
	chryslerDayCount,
	fordPlate,
	fordCasting,
	fordEngineAssembly,
	fordEngineTag,
	fordPartYear,
	fordAxleTag,
	fordPartWeek,
	amcEngineDayBuild,
	labelMonthYear,
	weekYear,
	partMonthYear,
	carterMonthYear,
	holleyYearMonthWeek
] as const;

/** The formats, by id. */
export const DATE_FORMATS: readonly DateFormat[] = ALL;
export type DateFormatId = (typeof ALL)[number]['id'];
const BY_ID = new Map<DateFormatId, DateFormat>(ALL.map((format) => [format.id, format]));

/** The declaration of a format. */
export const dateFormat = (id: DateFormatId): DateFormat => BY_ID.get(id) as DateFormat;

/**
 * Reads a date of a known format: its possible intervals, or why it is impossible.
 * @example readDate('gm-casting', 'A 12 9', { year: 1969 }).meanings[0]?.earliest // '1969-01-12'
 */
export const readDate = (id: DateFormatId, text: string, context: DateContext = {}): DateReading =>
	readIn(dateFormat(id), text, context);
