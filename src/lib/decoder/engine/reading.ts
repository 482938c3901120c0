/** Makes the readings of one layout and model year: one for each division that the tables know. */
import { makerOf, type Maker, type ReadContext, type ReadingField } from '../../types';
import { decoderText as text } from '../../text/en/decoder';
import { checkField, sequenceField, yearField } from './calculated-field';
import { isRead, textOf, UNREAD, type Cell } from './characters';
import { derivedField } from './derived-field';
import { fieldOf, type FieldHead, type FieldResult } from './field';
import type { Layout, PrimaryField } from './layout';
import { entriesMatching, type Scope } from './look-up';
import type { PreparedLayout } from './plan';
import { cellsOf, tableField, type Reader } from './table-field';
import { rowsInYear, tableId, type CompiledRow, type TableSet } from './table-set';

/** A reading before it is ranked. */
export interface Draft {
	readonly layout: Layout;
	readonly maker: Maker;
	readonly division: string | null;
	readonly year: number | null;
	readonly complete: boolean;
	readonly results: readonly FieldResult[];
}

/** The divisions that the naming field may stand for in a year; empty when no row tells. */
function divisionsIn(
	prepared: PreparedLayout,
	cells: readonly Cell[],
	year: number | null,
	tables: TableSet
): string[] {
	const { layout, division, parts } = prepared;
	const { reads } = layout.fields[division] as PrimaryField;
	if (reads.by !== 'table') return [];
	const table = tables.tables.get(tableId(layout.maker, reads.table));
	const divisions: string[] = [];
	const add = (name: string): void => {
		if (!divisions.includes(name)) divisions.push(name);
	};
	for (const entry of entriesMatching(table, cellsOf(cells, parts[division] ?? [])))
		for (const row of rowsInYear(entry, year))
			if (typeof row.values.division === 'string') add(row.values.division);
			else row.division.forEach(add);
	return divisions.sort();
}

/** Scope that the characters themselves give, whatever the order of look-ups. */
function scopeOf(prepared: PreparedLayout, cells: readonly Cell[], year: number | null): Scope {
	const scope: Scope = { year };
	for (const { column, field } of prepared.codeColumns) {
		const own = cells.slice(field.from - 1, field.to);
		if (own.every(isRead)) scope[column] = own.join('');
	}
	return scope;
}

function linesOf(rows: readonly CompiledRow[]): readonly string[] | undefined {
	let lines: string[] | undefined;
	for (const { values } of rows) {
		if (typeof values.line !== 'string') continue;
		if (lines === undefined) lines = [values.line];
		else if (!lines.includes(values.line)) lines.push(values.line);
	}
	return lines;
}

function unknownField(head: FieldHead, reader: Reader): FieldResult {
	const cells = reader.cells.slice(head.from - 1, head.to);
	const open = cells.filter((cell) => !isRead(cell)).length;
	const unread = (): string =>
		head.from > reader.typed ? text.fields.notTyped : text.fields.unread(open, cells.length);
	return {
		field: fieldOf(head, {
			code: textOf(cells),
			outcome: open > 0 ? 'illegible' : 'not_listed',
			detail: open > 0 ? unread() : text.fields.noTable
		}),
		rows: [],
		counts: false,
		lookups: []
	};
}

function primaryField(index: number, prepared: PreparedLayout, reader: Reader): FieldResult {
	const { layout, parts } = prepared;
	const field = layout.fields[index] as PrimaryField;
	switch (field.reads.by) {
		case 'table':
			return tableField(field, field.reads.table, parts[index] ?? [], reader);
		case 'year':
			return yearField(field, layout, reader);
		case 'sequence':
			return sequenceField(field, layout, reader);
		case 'check_digit':
			return checkField(field, layout, reader);
		case 'unknown':
			return unknownField(field, reader);
	}
}

/** All fields under one division, derived ones after the last of their parents. */
function resultsOf(prepared: PreparedLayout, reader: Reader): FieldResult[] {
	const { scope } = reader;
	const primary: FieldResult[] = [];
	for (const index of prepared.order) {
		const result = primaryField(index, prepared, reader);
		primary[index] = result;
		scope.line ??= linesOf(result.rows);
	}
	const results: FieldResult[] = [];
	primary.forEach((own, index) => {
		results.push(own);
		for (const { field, head } of prepared.derived[index] ?? []) {
			const result = derivedField(field, head, own, reader);
			if (result !== null) results.push(result);
		}
	});
	return results;
}

/** The readings of a text under one layout and year. `typed` may be shorter than the layout: the rest is unread. */
export function draftsOf(
	prepared: PreparedLayout,
	typed: readonly Cell[],
	year: number | null,
	tables: TableSet,
	context: ReadContext
): Draft[] {
	const { layout, parents } = prepared;
	const missing = layout.length - typed.length;
	const cells = missing > 0 ? [...typed, ...Array<Cell>(missing).fill(UNREAD)] : typed;
	const named = divisionsIn(prepared, cells, year, tables);
	const given = context.division;
	const own = given !== undefined && makerOf(given) === layout.maker ? given : undefined;
	const branches: readonly (string | undefined)[] = named.length > 0 ? named : [own];
	return branches.map((division): Draft => {
		const scope = scopeOf(prepared, cells, year);
		if (division !== undefined) scope.division = division;
		const reader: Reader = {
			tables,
			maker: layout.maker,
			scope,
			cells,
			typed: typed.length,
			parents
		};
		return {
			layout,
			maker: (division === undefined ? undefined : makerOf(division)) ?? layout.maker,
			division: division ?? null,
			year,
			complete: missing <= 0,
			results: resultsOf(prepared, reader)
		};
	});
}

/** The fields of a draft, with the questions they put to the tables when asked for. */
export const fieldsOf = (draft: Draft, lookups: boolean): readonly ReadingField[] =>
	draft.results.map((result) =>
		lookups ? { ...result.field, lookups: result.lookups } : result.field
	);
