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
	Strength
} from '../../types';
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
	readonly lookups: readonly Lookup[];
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
	return {
		name: head.name,
		label: head.label,
		from: head.from,
		to: head.to,
		...(head.derived_from === undefined ? {} : { derived_from: head.derived_from }),
		code: said.code,
		outcome: said.outcome,
		meaning: said.meaning ?? null,
		detail: said.detail ?? '',
		values: said.values ?? NO_VALUES,
		strength: said.strength ?? null,
		strength_why: said.strength_why ?? '',
		rows: said.rows ?? NOTHING,
		sources: said.sources ?? NOTHING,
		alternatives: said.alternatives ?? NOTHING,
		possible: said.possible ?? NOTHING
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
				...(row.code === '' ? {} : { code: row.code }),
				meaning: row.meaning,
				values: row.values,
				...(scope === '' ? {} : { scope })
			});
	}
	return [...seen.values()];
}
