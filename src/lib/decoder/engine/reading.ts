/** Makes the readings of one layout and model year: one for each division that the tables know. */
import {
	makerOf,
	type FieldName,
	type Maker,
	type ReadContext,
	type ReadingField
} from '../../types';
import { decoderText as text } from '../../text/en/decoder';
import { checkField, sequenceField, yearField } from './calculated-field';
import { isRead, textOf, type Cell } from './characters';
import { derivedField, derivedHead } from './derived-field';
import { fieldOf, type FieldHead, type FieldResult } from './field';
import type { PreparedLayout } from './fit';
import type { Layout, PrimaryField, Span } from './layout';
import { entriesMatching, type Scope } from './look-up';
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

const partsOf = (field: PrimaryField): readonly Span[] =>
	(field.reads.by === 'table' ? field.reads.parts : undefined) ?? [[field.from, field.to]];

const divisionsOf = (rows: readonly CompiledRow[]): string[] => {
	const divisions = rows.flatMap((row) =>
		typeof row.values.division === 'string' ? [row.values.division] : row.division
	);
	return [...new Set(divisions)].sort();
};

/** The divisions that the naming field may stand for in a year; empty when no row tells. */
function divisionsIn(
	layout: Layout,
	cells: readonly Cell[],
	year: number | null,
	tables: TableSet
): string[] {
	const field = layout.fields.find((own) => own.name === layout.divisionFrom);
	if (field?.reads.by !== 'table') return [];
	const table = tables.tables.get(tableId(layout.maker, field.reads.table));
	const own = cellsOf(cells, partsOf(field));
	if (own.every(isRead)) {
		const entry = table?.byCode.get(own.join(''));
		return entry === undefined ? [] : divisionsOf(rowsInYear(entry, year));
	}
	return divisionsOf(entriesMatching(table, own).flatMap((entry) => rowsInYear(entry, year)));
}

const SCOPE_FIELDS: Partial<Record<FieldName, 'body' | 'engine' | 'plant'>> = {
	body_style: 'body',
	engine: 'engine',
	assembly_plant: 'plant'
};

/** Scope that the characters themselves give, whatever the order of look-ups. */
function scopeOf(layout: Layout, cells: readonly Cell[], year: number | null): Scope {
	const scope: Scope = { year };
	for (const field of layout.fields) {
		const column = SCOPE_FIELDS[field.name];
		if (column === undefined) continue;
		const own = cells.slice(field.from - 1, field.to);
		if (own.every(isRead)) scope[column] = own.join('');
	}
	return scope;
}

const linesOf = (rows: readonly CompiledRow[]): readonly string[] | undefined => {
	const lines = rows.map((row) => row.values.line).filter((line) => typeof line === 'string');
	return lines.length === 0 ? undefined : [...new Set(lines)];
};

function unknownField(head: FieldHead, reader: Reader): FieldResult {
	const cells = reader.cells.slice(head.from - 1, head.to);
	const open = cells.filter((cell) => !isRead(cell)).length;
	const detail =
		head.from > reader.typed
			? text.fields.notTyped
			: open > 0
				? text.fields.unread(open, cells.length)
				: text.fields.noTable;
	const outcome = open > 0 ? 'illegible' : 'not_listed';
	return {
		field: fieldOf(head, { code: textOf(cells), outcome, detail }),
		rows: [],
		counts: false,
		lookups: []
	};
}

function primaryField(field: PrimaryField, layout: Layout, reader: Reader): FieldResult {
	switch (field.reads.by) {
		case 'table':
			return tableField(field, field.reads.table, partsOf(field), reader);
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

/** The order in which the primary fields are asked: those that others depend on come first. */
const asked = (layout: Layout): readonly PrimaryField[] => {
	const first = layout.lookFirst ?? [];
	return [
		...layout.fields.filter((field) => first.includes(field.name)),
		...layout.fields.filter((field) => !first.includes(field.name))
	];
};

/** All fields under one division, derived ones after the last of their parents. */
function resultsOf(layout: Layout, reader: Reader): FieldResult[] {
	const { scope } = reader;
	const primary = new Map<PrimaryField, FieldResult>();
	for (const field of asked(layout)) {
		const result = primaryField(field, layout, reader);
		primary.set(field, result);
		scope.line ??= linesOf(result.rows);
	}
	const results: FieldResult[] = [];
	for (const field of layout.fields) {
		results.push(primary.get(field) as FieldResult);
		for (const derived of layout.derived) {
			if (derived.parents[derived.parents.length - 1] !== field.name) continue;
			const head = derivedHead(derived, layout.fields);
			const result = derivedField(derived, head, primary.get(field) as FieldResult, reader);
			if (result !== null) results.push(result);
		}
	}
	return results;
}

/**
 * The readings of a text under one layout and year. `cells` may be shorter than the layout: the rest is unread.
 */
export function draftsOf(
	prepared: PreparedLayout,
	typed: readonly Cell[],
	year: number | null,
	tables: TableSet,
	context: ReadContext
): Draft[] {
	const { layout } = prepared;
	const missing = layout.length - typed.length;
	const cells = missing > 0 ? [...typed, ...Array<Cell>(missing).fill('?')] : typed;
	const named = divisionsIn(layout, cells, year, tables);
	const given =
		context.division !== undefined && makerOf(context.division) === layout.maker
			? context.division
			: undefined;
	const branches: (string | undefined)[] = named.length > 0 ? named : [given];
	return branches.map((division): Draft => {
		const scope = scopeOf(layout, cells, year);
		if (division !== undefined) scope.division = division;
		const reader: Reader = {
			tables,
			maker: layout.maker,
			scope,
			cells,
			typed: typed.length,
			parentOf: (column) => {
				const own = layout.fields.find((field) => field.name === parentName(layout, column));
				return {
					label: own?.label ?? column,
					read: own !== undefined && cells.slice(own.from - 1, own.to).every(isRead)
				};
			}
		};
		return {
			layout,
			maker: (division === undefined ? undefined : makerOf(division)) ?? layout.maker,
			division: division ?? null,
			year,
			complete: missing <= 0,
			results: resultsOf(layout, reader)
		};
	});
}

/** Which field tells a scope column. */
function parentName(layout: Layout, column: string): FieldName {
	if (column === 'division') return layout.divisionFrom;
	if (column === 'line') return layout.lineFrom;
	const own = Object.entries(SCOPE_FIELDS).find(([, name]) => name === column);
	return own?.[0] as FieldName;
}

export const fieldsOf = (draft: Draft, lookups: boolean): readonly ReadingField[] =>
	draft.results.map((result) =>
		lookups ? { ...result.field, lookups: result.lookups } : result.field
	);
