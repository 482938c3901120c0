/** A date alone: a reading for each format that it fits. */
import { makerOf, type FieldName, type Problem, type ReadContext, type Reading } from '../types';
import { datesText as text } from '../text/en/dates';
import { DATE_FORMATS, readIn, type DateFault, type DateFormat, type DateReading } from './dates';
import { fieldOfDate, formatRows } from './dates/field';
import { normalise } from './engine/characters';
import { strongest } from './engine/field';
import type { TableSet } from './engine/table-set';

/** The field that a date of a format stands in. */
export function dateFieldName({ dates }: DateFormat): FieldName {
	switch (dates) {
		case 'cast':
			return 'casting_date';
		case 'designed':
			return 'casting_number';
		case 'part_made':
		case 'unit_assembled':
			return 'assembly_date';
		default:
			return 'build_date';
	}
}

/** At most so many readings come back; the rest is counted. */
const MOST = 24;
/** So many reasons are given where nothing fits. */
const REASONS = 3;
/** The fault that tells most stands first. */
const TELLING: readonly DateFault[] = ['no_such_day', 'skipped_letter', 'too_open'];
const STRENGTHS = ['firm', 'fair', 'thin', 'contested', 'not_rated'] as const;

const makerGiven = ({ maker, division }: ReadContext): string | undefined =>
	maker ?? (division === undefined ? undefined : makerOf(division));

/** Formats of the maker given and those that makers share; all of them where those do not fit. */
function fitting(readings: readonly DateReading[], context: ReadContext): readonly DateReading[] {
	const fit = readings.filter(({ meanings }) => meanings.length > 0);
	const maker = makerGiven(context);
	const own = fit.filter(
		({ format }) => maker === undefined || format.maker === maker || format.maker === null
	);
	return own.length > 0 ? own : fit;
}

/** What readings are ordered by: the maker's own formats, those of the years, the better supported. */
function orderOf(
	{ format, meanings }: DateReading,
	tables: TableSet,
	context: ReadContext
): readonly number[] {
	const [from, to] = format.years;
	const { year } = context;
	const ofCar = year === undefined || (year >= from && year - 1 <= to);
	const inYears = meanings.some((one) => one.year === null || (one.year >= from && one.year <= to));
	const rows = formatRows(format, tables);
	const strength = rows.length === 0 ? 'not_rated' : strongest(rows).strength;
	return [
		format.maker === (makerGiven(context) ?? format.maker) ? 0 : 1,
		ofCar && inYears ? 0 : 1,
		STRENGTHS.indexOf(strength)
	];
}

const compare = (left: readonly number[], right: readonly number[]): number => {
	const at = left.findIndex((value, index) => value !== right[index]);
	return at < 0 ? 0 : (left[at] as number) - (right[at] as number);
};

function problemsOf(readings: readonly DateReading[], typed: string): Problem[] {
	const telling = readings
		.filter(({ fault }) => fault !== null && TELLING.includes(fault.code))
		.slice(0, REASONS)
		.map(({ format, fault }): Problem => {
			const { code, message } = fault as NonNullable<DateReading['fault']>;
			return { layout: format.id, code, message: text.nearest(format.title, message), offers: [] };
		});
	if (telling.length > 0) return telling;
	return [{ code: 'no_date_form', message: text.noForm(typed), offers: [] }];
}

/**
 * Reads a date of which nothing but the characters is known. The maker narrows, the year and the strength of the form
 * order; where no form fits, the problems say why the nearest do not.
 * @example readDateAlone('9C15', tables, { maker: 'ford' }).readings[0]?.fields[0]?.meaning
 */
export function readDateAlone(
	typed: string,
	tables: TableSet,
	context: ReadContext
): { readonly readings: Reading[]; readonly more: number; readonly problems: Problem[] } {
	const { year, field } = context;
	const { cells, normalised } = normalise(typed);
	const all = DATE_FORMATS.filter(
		(format) => field === undefined || dateFieldName(format) === field
	).map((format) => readIn(format, typed, year === undefined ? {} : { year }));
	const sorted = fitting(all, context)
		.map((reading) => ({ reading, order: orderOf(reading, tables, context) }))
		.sort((a, b) => compare(a.order, b.order));
	const readings: Reading[] = [];
	for (const [index, { reading, order }] of sorted.slice(0, MOST).entries()) {
		const { format } = reading;
		const before = sorted[index - 1];
		const equal = before !== undefined && compare(before.order, order) === 0;
		const label = text.dated[format.dates];
		readings.push({
			layout: format.id,
			layout_title: format.title,
			maker: format.maker,
			division: null,
			model_year: year ?? null,
			state: 'complete',
			rank: equal ? (readings[index - 1] as Reading).rank : index + 1,
			why: text.why(format.parts.map((part) => part.label)),
			fields: [
				fieldOfDate(
					{ name: dateFieldName(format), label, from: 1, to: cells.length },
					typed,
					reading,
					tables
				)
			]
		});
	}
	return {
		readings,
		more: sorted.length - readings.length,
		problems: readings.length > 0 ? [] : problemsOf(all, normalised)
	};
}
