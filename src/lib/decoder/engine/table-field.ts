/** Fields whose meaning stands in a table. */
import { tableDefinition, type Lookup, type Maker, type TableName } from '../../types';
import { decoderText as text } from '../../text/en/decoder';
import { isRead, textOf, type Cell } from './characters';
import {
	contestedField,
	fieldOf,
	foundField,
	possibleOf,
	type FieldHead,
	type FieldResult
} from './field';
import type { PrimaryField, Span } from './layout';
import {
	choose,
	claimFor,
	entriesMatching,
	lookUp,
	lookUpRange,
	type Answer,
	type Scope
} from './look-up';
import { rowsInYear, tableId, type CompiledRow, type TableSet } from './table-set';

/** What a field is read against. */
export interface Reader {
	readonly tables: TableSet;
	readonly maker: Maker;
	readonly scope: Scope;
	readonly cells: readonly Cell[];
	/** How many characters were typed; the places after them are unread. */
	readonly typed: number;
	/** The field that tells each scope column. */
	readonly parents: ReadonlyMap<string, PrimaryField>;
}

const NONE: readonly never[] = [];

/** The cells of several spans, joined by `/`. */
export function cellsOf(cells: readonly Cell[], parts: readonly Span[]): Cell[] {
	const [first] = parts;
	if (first !== undefined && parts.length === 1) return cells.slice(first[0] - 1, first[1]);
	return parts.flatMap(([from, to], index) => [
		...(index === 0 ? [] : ['/']),
		...cells.slice(from - 1, to)
	]);
}

const missed = (table: TableName, code: string): readonly Lookup[] => [
	{ table, code, row_key: null }
];
const used = (table: TableName, code: string, rows: readonly CompiledRow[]): readonly Lookup[] =>
	rows.map((row) => ({ table, code, row_key: row.row_key }));

function answered(
	head: FieldHead,
	table: TableName,
	code: string,
	answer: Answer,
	reader: Reader
): FieldResult {
	if (answer.kind === 'found')
		return {
			field: foundField(head, code, answer.rows),
			rows: answer.rows,
			counts: true,
			lookups: used(table, code, answer.rows)
		};
	if (answer.kind === 'contested') {
		const rows = answer.groups.flat();
		return {
			field: contestedField(head, code, answer.groups),
			rows,
			counts: true,
			lookups: used(table, code, rows)
		};
	}
	if (answer.kind === 'depends') {
		const parent = reader.parents.get(answer.on) as PrimaryField;
		const read = reader.cells.slice(parent.from - 1, parent.to).every(isRead);
		return {
			field: fieldOf(head, {
				code,
				outcome: read ? 'not_listed' : 'illegible',
				detail: read
					? text.fields.parentMissing(parent.label)
					: text.fields.parentUnread(parent.label),
				possible: possibleOf(answer.rows)
			}),
			rows: answer.rows,
			counts: false,
			lookups: used(table, code, answer.rows)
		};
	}
	const compiled = reader.tables.tables.get(tableId(reader.maker, table));
	const claim = claimFor(compiled, reader.scope);
	const source = claim === undefined ? undefined : reader.tables.sources.get(claim.source);
	const field =
		source === undefined
			? fieldOf(head, {
					code,
					outcome: 'not_listed',
					detail: text.fields.notListed(head.label, code),
					possible: nearby(compiled?.byCode.get(code)?.all ?? NONE, reader.scope)
				})
			: fieldOf(head, {
					code,
					outcome: 'not_used',
					detail: text.fields.notUsed(code, source.title),
					sources: [{ key: source.key, title: source.title, locator: '', kind: source.kind }]
				});
	return { field, rows: NONE, counts: false, lookups: missed(table, code) };
}

/** What the same code meant on the same division in the years on either side. */
function nearby(rows: readonly CompiledRow[], scope: Scope) {
	const { year, division } = scope;
	if (year === null) return [];
	const distance = (row: CompiledRow): number =>
		Math.max((row.years_from ?? year) - year, year - (row.years_to ?? year), 0);
	const near = rows
		.filter(
			(row) =>
				division === undefined || row.division.length === 0 || row.division.includes(division)
		)
		.filter((row) => distance(row) <= 3)
		.sort((a, b) => distance(a) - distance(b))
		.slice(0, 2);
	return possibleOf(near);
}

function unread(
	head: FieldHead,
	table: TableName,
	cells: readonly Cell[],
	reader: Reader
): FieldResult {
	const compiled = reader.tables.tables.get(tableId(reader.maker, table));
	const rows: CompiledRow[] = [];
	const lookups: Lookup[] = [];
	for (const entry of entriesMatching(compiled, cells)) {
		const answer = choose(rowsInYear(entry, reader.scope.year), reader.scope);
		const own =
			answer.kind === 'contested'
				? answer.groups.flat()
				: answer.kind === 'missing'
					? []
					: answer.rows;
		rows.push(...own);
		lookups.push(...used(table, entry.code, own));
	}
	const code = textOf(cells);
	const open = cells.filter((cell) => !isRead(cell)).length;
	const possible = possibleOf(rows);
	const named = new Set(rows.map((row) => row.code));
	for (const candidate of spelled(cells))
		if (!named.has(candidate))
			possible.push({ code: candidate, meaning: text.fields.noRowFor, values: {} });
	return {
		field: fieldOf(head, {
			code,
			outcome: 'illegible',
			detail:
				head.from > reader.typed ? text.fields.notTyped : text.fields.unread(open, cells.length),
			possible
		}),
		rows,
		counts: false,
		lookups: lookups.length > 0 ? lookups : missed(table, code)
	};
}

/** The few codes that "could be either" places spell; nothing when a place is unread altogether. */
function spelled(cells: readonly Cell[]): string[] {
	if (cells.some((cell) => !isRead(cell) && cell.length === 1)) return [];
	let codes = [''];
	for (const cell of cells) {
		codes = codes.flatMap((code) => [...cell].map((character) => code + character));
		if (codes.length > 16) return [];
	}
	return codes;
}

/** Reads one field against a table. */
export function tableField(
	head: FieldHead,
	table: TableName,
	parts: readonly Span[],
	reader: Reader
): FieldResult {
	const cells = cellsOf(reader.cells, parts);
	if (!cells.every(isRead)) return unread(head, table, cells, reader);
	const code = cells.join('');
	const compiled = reader.tables.tables.get(tableId(reader.maker, table));
	const answer =
		tableDefinition(table).match === 'range'
			? lookUpRange(compiled, code, reader.scope)
			: lookUp(compiled, code, reader.scope);
	return answered(head, table, code, answer, reader);
}
