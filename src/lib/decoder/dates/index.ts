/** Every date format, and reading in one of them. A new format is a module beside this file and a line here. */
import type { DateContext, DateFormat, DateReading } from './format';
import { gmBodyMonthWeek } from './gm-body-month-week';
import { gmCasting } from './gm-casting';
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

const ALL = [gmBodyMonthWeek, gmCasting] as const;

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
