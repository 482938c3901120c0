/** A date as a field of a reading. */
import type { Possible, ReadingField, RowValues } from '../../types';
import { datesText as text } from '../../text/en/dates';
import { decoderText } from '../../text/en/decoder';
import { isRead, normalise } from '../engine/characters';
import { fieldOf, strongest, type FieldHead } from '../engine/field';
import { tableId, type CompiledRow, type TableSet } from '../engine/table-set';
import type { DateContext, DateFormat, DateMeaning, DateReading } from './format';
import { dateFormat, type DateFormatId } from './index';
import { readIn } from './read-date';

/** Facts of a date field: the interval, what it dates, and the format. */
export interface DateValues extends RowValues {
	readonly earliest?: string;
	readonly latest?: string;
	readonly dates: string;
	readonly format: string;
}

const valuesOf = (format: DateFormat, { earliest, latest }: DateMeaning): DateValues => ({
	...(earliest === null || latest === null ? {} : { earliest, latest }),
	dates: format.dates,
	format: format.id
});

/** Rows of table `layout` that say how dates of a format are written: what the date rests on. */
export function formatRows(format: DateFormat, tables: TableSet): readonly CompiledRow[] {
	const table = tables.tables.get(tableId(format.maker ?? 'other', 'layout'));
	return table?.byCode.get(format.id)?.all ?? [];
}

/** What a field says of a date that has been read. */
export function fieldOfDate(
	head: FieldHead,
	typed: string,
	{ format, meanings, fault, detail }: DateReading,
	tables: TableSet
): ReadingField {
	const { cells, normalised } = normalise(typed);
	const rows = formatRows(format, tables);
	const [row] = rows;
	const rests =
		row === undefined
			? { strength: 'not_rated' as const, strength_why: decoderText.layoutStrength }
			: {
					strength: strongest(rows).strength,
					strength_why: strongest(rows).strength_why,
					rows: rows.map(({ row_key }) => row_key),
					sources: strongest(rows).sources
				};
	const [first, ...others] = meanings;
	if (first === undefined)
		return fieldOf(head, {
			code: normalised,
			outcome: 'not_listed',
			detail: (fault as NonNullable<typeof fault>).message,
			values: { dates: format.dates, format: format.id }
		});
	const possible =
		others.length === 0
			? []
			: meanings.map((meaning): Possible => ({
					meaning: meaning.words,
					values: valuesOf(format, meaning)
				}));
	const open = { dates: format.dates, format: format.id };
	return fieldOf(head, {
		code: normalised,
		outcome: cells.every(isRead) ? 'found' : 'illegible',
		meaning: text.several(meanings.map(({ words }) => words)),
		detail,
		values: others.length === 0 ? valuesOf(format, first) : open,
		possible,
		...rests
	});
}

/**
 * Reads a date into a field: `values` hold earliest and latest when one interval is left, `possible` all of them
 * otherwise. An impossible date is `not_listed` and says why; it says nothing against the car.
 */
export const dateField = (
	head: FieldHead,
	id: DateFormatId,
	typed: string,
	context: DateContext,
	tables: TableSet
): ReadingField => {
	const format = dateFormat(id);
	return fieldOfDate(head, typed, readIn(format, typed, context), tables);
};
