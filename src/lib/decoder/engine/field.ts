/** From an answer of the tables to a field of a reading. */
import type {
	Alternative,
	FieldName,
	FieldSource,
	Lookup,
	Outcome,
	Possible,
	ReadingField,
	RowValues,
	Strength,
	TableName
} from '../../types';
import { tableDefinition } from '../../types';
import { decoderText as text } from '../../text/en/decoder';
import type { CompiledRow } from './table-set';

/** What is the same for a field whatever the tables answer. */
export interface FieldHead {
	readonly name: FieldName;
	readonly label: string;
	readonly from: number;
	readonly to: number;
	readonly derived_from?: readonly FieldName[];
}

/** A field with the rows it rests on, which later fields and the ranking ask for. */
export interface FieldResult {
	readonly field: ReadingField;
	/** Rows of the meaning found, of all meanings when contested, of all that are possible otherwise. */
	readonly rows: readonly CompiledRow[];
	/** Whether the field counts as standing in the tables. */
	readonly counts: boolean;
	/** What the field could mean, listed only for readings that are told: with many marks there are many more. */
	readonly possible?: () => Pick<ReadingField, 'detail' | 'possible'>;
	/** Whether a running number stands outside the run on record. */
	readonly outOfRun?: boolean;
	/** The table that was asked; null when none was. */
	readonly table: TableName | null;
	/** The code that it was asked for, where that is not all of the field's characters. */
	readonly asked?: string;
}

/** The questions that a field put to the tables: one for each row, or the miss. */
export function lookupsOf({
	field,
	rows,
	table,
	asked: code = field.code
}: FieldResult): readonly Lookup[] {
	const asked = (name: TableName, exact: string): string => {
		const { match } = tableDefinition(name);
		return match === 'exact' ? exact : match === 'range' ? code : '';
	};
	if (rows.length === 0)
		return table === null ? [] : [{ table, code: asked(table, code), row_key: null }];
	return rows.map((row) => ({
		table: row.table,
		code: asked(row.table, row.code),
		row_key: row.row_key
	}));
}

/** What single rows told under a head: the same row always tells the same, so it is made once. */
const told = new WeakMap<CompiledRow, Map<FieldHead, FieldResult>>();

/** What a row told under a head before, if it did. */
export const toldBefore = (row: CompiledRow, head: FieldHead): FieldResult | undefined =>
	told.get(row)?.get(head);

/** Keeps what a row told under a head, and hands it on. */
export function keepTold(row: CompiledRow, head: FieldHead, result: FieldResult): FieldResult {
	const own = told.get(row) ?? new Map<FieldHead, FieldResult>();
	told.set(row, own.set(head, result));
	return result;
}

const NO_VALUES: RowValues = Object.freeze({});
const NOTHING: readonly never[] = Object.freeze([]);
const ORDER: readonly Strength[] = ['firm', 'fair', 'thin', 'contested', 'not_rated'];

interface Said {
	readonly code: string;
	readonly outcome: Outcome;
	readonly meaning?: string | null;
	readonly detail?: string;
	readonly values?: RowValues;
	readonly strength?: Strength | null;
	readonly strength_why?: string;
	readonly rows?: readonly string[];
	readonly sources?: readonly FieldSource[];
	readonly alternatives?: readonly Alternative[];
	readonly possible?: readonly Possible[];
}

/** A field, with what was not said left empty. */
export function fieldOf(head: FieldHead, said: Said): ReadingField {
	// Written out, one literal a shape: this runs several times a reading, and spreading is many times slower.
	const { name, label, from, to, derived_from } = head;
	const { code, outcome, meaning = null, detail = '', values = NO_VALUES } = said;
	const { strength = null, strength_why = '', rows = NOTHING, sources = NOTHING } = said;
	const { alternatives = NOTHING, possible = NOTHING } = said;
	return derived_from === undefined
		? {
				name,
				label,
				from,
				to,
				code,
				outcome,
				meaning,
				detail,
				values,
				strength,
				strength_why,
				rows,
				sources,
				alternatives,
				possible
			}
		: {
				name,
				label,
				from,
				to,
				derived_from,
				code,
				outcome,
				meaning,
				detail,
				values,
				strength,
				strength_why,
				rows,
				sources,
				alternatives,
				possible
			};
}

/** The best supported of rows that say the same. */
export const strongest = (rows: readonly CompiledRow[]): CompiledRow =>
	rows.length === 1
		? (rows[0] as CompiledRow)
		: ([...rows].sort(
				(a, b) => ORDER.indexOf(a.strength) - ORDER.indexOf(b.strength)
			)[0] as CompiledRow);

function sourcesOf(rows: readonly CompiledRow[]): readonly FieldSource[] {
	if (rows.length === 1) return (rows[0] as CompiledRow).sources;
	const seen = new Map<string, FieldSource>();
	for (const source of rows.flatMap((row) => row.sources))
		seen.set(`${source.key} ${source.locator}`, source);
	return [...seen.values()];
}

const keysOf = (rows: readonly CompiledRow[]): readonly string[] => rows.map((row) => row.row_key);

/** One meaning found; `shown` replaces meaning and values for fields derived from a fact of the row. */
export function foundField(
	head: FieldHead,
	code: string,
	rows: readonly CompiledRow[],
	shown?: { readonly meaning: string; readonly values: RowValues; readonly detail?: string }
): ReadingField {
	const best = strongest(rows);
	return fieldOf(head, {
		code,
		outcome: 'found',
		meaning: shown?.meaning ?? best.meaning,
		detail: shown === undefined ? best.note : (shown.detail ?? ''),
		values: shown?.values ?? best.values,
		strength: best.strength,
		strength_why: best.strength_why,
		rows: keysOf(rows),
		sources: sourcesOf(rows)
	});
}

/** Sources differ: every meaning over its own. */
export function contestedField(
	head: FieldHead,
	code: string,
	groups: readonly (readonly CompiledRow[])[],
	shown: (row: CompiledRow) => { readonly meaning: string; readonly values: RowValues } = (row) =>
		row
): ReadingField {
	return fieldOf(head, {
		code,
		outcome: 'contested',
		detail: text.fields.bothStand,
		strength: 'contested',
		strength_why: text.contestedWhy,
		rows: groups.flatMap(keysOf),
		alternatives: groups.map((group): Alternative => {
			const best = strongest(group);
			const { meaning, values } = shown(best);
			return {
				meaning,
				values,
				strength: best.strength,
				rows: keysOf(group),
				sources: sourcesOf(group)
			};
		})
	});
}

/** Where a row holds, in words; empty when it holds everywhere. */
export function scopeText(row: CompiledRow): string {
	return text.scope(
		[...row.division, ...row.line, ...row.plant, ...row.market],
		row.years_from,
		row.years_to
	);
}

/** Meanings that rows could give, each once, with the code it would stand for and where it holds. */
export function possibleOf(rows: readonly CompiledRow[]): Possible[] {
	const seen = new Map<string, Possible>();
	for (const row of rows) {
		const scope = scopeText(row);
		const id = `${row.code} ${row.meaning}`;
		if (!seen.has(id))
			seen.set(id, {
				code: row.code,
				meaning: row.meaning,
				values: row.values,
				...(scope === '' ? {} : { scope })
			});
	}
	return [...seen.values()];
}
