/** Reads the fields of a stamp of several lines, each from the cells that were laid under it. */
import type { ReadingField, RowValues } from '../../types';
import { decoderText } from '../../text/en/decoder';
import { stampsText as text } from '../../text/en/stamps';
import { dateField } from '../dates/field';
import { isRead, textOf, type Cell } from './characters';
import { fieldOf, foundField, type FieldHead, type FieldResult } from './field';
import { lookUpCells, type Lookups } from './lined-lookup';
import type { AlsoReads, LineReads, Places } from './lined-layout';
import type { Placed } from './line-match';
import { spanText } from './lines';
import type { CompiledRow } from './table-set';

/** What a field is read against, beside the tables. */
export interface LinedReader extends Lookups {
	/** Calendar years that a date may be of. */
	readonly years: readonly [from: number, to: number];
}

/** A punched pair: the column, then what is punched in it. */
const COLUMN: readonly Places[] = [
	[1, 1],
	[2, -1]
];

export const cellsOfPlaced = ({ line, from, to }: Placed): readonly Cell[] =>
	line.cells.slice(from, to);

export function headOf({ field, line, from, to }: Placed): FieldHead {
	const [first] = line.places[from] as readonly [number, number];
	const [, last] = line.places[to - 1] as readonly [number, number];
	return { name: field.name, label: field.label, from: first, to: last };
}

const alone = (field: ReadingField, counts = false): FieldResult[] => [
	{ field, rows: [], counts, table: null }
];

/** A field that no table is asked for. */
function plainField(
	head: FieldHead,
	cells: readonly Cell[],
	said: { readonly meaning: string; readonly values?: RowValues; readonly why: string } | null
): ReadingField {
	const code = textOf(cells);
	if (!cells.every(isRead))
		return fieldOf(head, { code, outcome: 'illegible', detail: decoderText.fields.unread(cells) });
	if (said === null)
		return fieldOf(head, { code, outcome: 'not_listed', detail: decoderText.fields.noTable });
	return fieldOf(head, {
		code,
		outcome: 'found',
		meaning: said.meaning,
		values: said.values ?? {},
		strength: 'not_rated',
		strength_why: said.why
	});
}

function also(
	parent: FieldResult,
	{ name, label, ...reads }: AlsoReads,
	cells: readonly Cell[],
	lookups: Lookups
): FieldResult[] {
	const { from, to, code } = parent.field;
	const head = { name, label, from, to, derived_from: [parent.field.name] };
	if (reads.by === 'table') {
		const result = lookUpCells(head, reads.table, cells, [reads.parts], lookups);
		return result.counts ? [{ ...result, counts: false }] : [];
	}
	if (!parent.counts || parent.field.outcome !== 'found') return [];
	const value = parent.field.values[reads.key];
	if (typeof value !== 'string' && typeof value !== 'number') return [];
	const shown = { meaning: String(value), values: { [reads.key]: value } };
	const field = foundField(head, code, parent.rows, shown);
	return [{ field, rows: parent.rows, counts: false, table: null }];
}

function tableFields(
	head: FieldHead,
	cells: readonly Cell[],
	reads: Extract<LineReads, { by: 'table' }>,
	lookups: Lookups
): FieldResult[] {
	const splits = [reads.parts, ...(reads.otherwise ?? [])];
	const own = lookUpCells(head, reads.table, cells, splits, lookups);
	return [own, ...(reads.also ?? []).flatMap((one) => also(own, one, cells, lookups))];
}

/** The car's own number as read beside, its fields as statements derived from this one. */
export function serialFields(
	placed: Placed,
	found: readonly ReadingField[],
	rowOf: (key: string) => CompiledRow
): FieldResult[] {
	const head = headOf(placed);
	const cells = cellsOfPlaced(placed);
	const own = plainField(
		head,
		cells,
		found.length === 0
			? null
			: { meaning: text.partOfSerial(textOf(cells)), why: decoderText.layoutStrength }
	);
	const derived = found.map((field): FieldResult => ({
		field: { ...field, from: head.from, to: head.to, derived_from: [head.name] },
		rows: field.rows.map(rowOf),
		counts: false,
		table: null
	}));
	return [...alone(own, found.length > 0 && own.outcome === 'found'), ...derived];
}

/** Reads one field; parts of a serial are read by `serialFields`. */
export function linedField(placed: Placed, reader: LinedReader): FieldResult[] {
	const { line, from, to } = placed;
	const { reads } = placed.field;
	const head = headOf(placed);
	const cells = cellsOfPlaced(placed);
	switch (reads.by) {
		case 'table':
			return tableFields(head, cells, reads, reader);
		case 'columns':
			return [lookUpCells(head, reads.table, cells, [COLUMN], reader)];
		case 'date': {
			const { year } = reader.scope;
			const context = { years: reader.years, ...(year === null ? {} : { year }) };
			const field = dateField(head, reads.format, spanText(line, from, to), context, reader.tables);
			const own: FieldResult = {
				field,
				rows: [],
				counts: field.outcome === 'found',
				table: null
			};
			return [own, ...(reads.also ?? []).flatMap((one) => also(own, one, cells, reader))];
		}
		case 'year': {
			const { year } = reader.scope;
			const stamped = (reads.years[cells.join('')] ?? []).find((own) => own === year);
			const said =
				stamped === undefined
					? null
					: {
							meaning: String(stamped),
							values: { model_year: stamped },
							why: decoderText.year.byLayout
						};
			return alone(plainField(head, cells, said), stamped !== undefined);
		}
		case 'number':
			return alone(
				plainField(head, cells, {
					meaning: text.number(placed.field.label, textOf(cells)),
					why: decoderText.layoutStrength
				})
			);
		default:
			return alone(plainField(head, cells, null));
	}
}
