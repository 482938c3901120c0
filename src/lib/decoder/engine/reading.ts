/** Makes the readings of one layout and model year: one for each division that the tables know. */
import { makerOf, type Maker, type ReadContext, type ReadingField } from '../../types';
import { decoderText as text } from '../../text/en/decoder';
import { beginningOf, type Beginning, type Settled } from './beginnings';
import { checkField, sequenceField, yearField } from './calculated-field';
import { isRead, textOf, UNREAD, type Cell } from './characters';
import { derivedField } from './derived-field';
import { fieldOf, lookupsOf, type FieldHead, type FieldResult } from './field';
import type { Layout, PrimaryField } from './layout';
import { entriesMatching, type Scope } from './look-up';
import type { PreparedLayout, Question } from './plan';
import { cellsOf, tableField, type Reader } from './table-field';
import { rowsInYear, type CodeEntry, type CompiledRow, type TableSet } from './table-set';

/** A reading before it is ranked. */
export interface Draft {
	readonly layout: Pick<Layout, 'id' | 'title' | 'maker'>;
	/** How badly a stamp of several lines fits its layout; a serial fits or does not. */
	readonly misfit?: number;
	readonly maker: Maker;
	readonly division: string | null;
	readonly year: number | null;
	readonly complete: boolean;
	readonly results: readonly FieldResult[];
}

/** The divisions that the naming field may stand for in a year; empty when no row tells. */
function divisionsIn(reader: Reader): string[] {
	const { prepared, tables, cells, scope } = reader;
	const question = prepared.questions[prepared.division] as Question;
	const divisions: string[] = [];
	const add = (name: string): void => {
		if (!divisions.includes(name)) divisions.push(name);
	};
	const table = tables.tables.get(question.id);
	for (const entry of entriesMatching(table, cellsOf(cells, question.parts)))
		for (const row of rowsInYear(entry, scope.year))
			if (typeof row.values.division === 'string') add(row.values.division);
			else row.division.forEach(add);
	return divisions.length > 1 ? divisions.sort() : divisions;
}

/** Divisions whose run on record holds a running number. */
function divisionsByRun(reader: Reader, number: number): string[] {
	const { prepared, tables, scope } = reader;
	const runs = tables.tables.get(prepared.ids.sequence)?.byCode.get('') as CodeEntry;
	const holding = rowsInYear(runs, scope.year).filter(({ values }) => {
		const { first_sequence: first = 0, last_sequence: last = Infinity } = values;
		return Number(first) <= number && number <= Number(last);
	});
	return [...new Set(holding.flatMap((row) => row.division))].sort();
}

/** Scope that the characters themselves give, whatever the order of look-ups. */
function scopeOf(
	prepared: PreparedLayout,
	cells: readonly Cell[],
	whole: string | null,
	year: number | null,
	division: string | undefined
): Scope {
	const scope: Scope = { year };
	if (division !== undefined) scope.division = division;
	for (const { column, field } of prepared.codeColumns) {
		if (whole !== null) scope[column] = whole.slice(field.from - 1, field.to);
		else {
			const own = cells.slice(field.from - 1, field.to);
			if (own.every(isRead)) scope[column] = own.join('');
		}
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
	const open = !cells.every(isRead);
	const unread = (): string =>
		head.from > reader.typed ? text.fields.notTyped : text.fields.unread(cells);
	return {
		field: fieldOf(head, {
			code: textOf(cells),
			outcome: open ? 'illegible' : 'not_listed',
			detail: open ? unread() : text.fields.noTable
		}),
		rows: [],
		counts: false,
		table: null
	};
}

function primaryField(index: number, prepared: PreparedLayout, reader: Reader): FieldResult {
	const { layout, questions } = prepared;
	const field = layout.fields[index] as PrimaryField;
	switch (field.reads.by) {
		case 'table':
			return tableField(field, questions[index] as Question, reader);
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

/** A primary field and those derived from it. */
function withDerived(index: number, own: FieldResult, prepared: PreparedLayout, reader: Reader) {
	const results = [own];
	for (const { field, head, question } of prepared.derived[
		index
	] as PreparedLayout['derived'][number]) {
		const result = derivedField(field, head, question, own, reader);
		if (result !== null) results.push(result);
	}
	return results;
}

/** The fields that do not turn on the running number, and what they tell of the car. */
function settle(prepared: PreparedLayout, reader: Reader): Settled {
	const { scope } = reader;
	const primary: FieldResult[] = [];
	for (const index of prepared.order) {
		if (prepared.open.includes(index)) continue;
		const result = primaryField(index, prepared, reader);
		primary[index] = result;
		scope.line ??= linesOf(result.rows);
	}
	const results = prepared.layout.fields.map((_, index) => {
		const own = primary[index];
		return own === undefined ? null : withDerived(index, own, prepared, reader);
	});
	return { scope, results };
}

/** All fields under one division, derived ones after the last of their parents. */
function resultsOf(prepared: PreparedLayout, settled: Settled, reader: Reader): FieldResult[] {
	const results: FieldResult[] = [];
	settled.results.forEach((own, index) => {
		const all = own ?? withDerived(index, primaryField(index, prepared, reader), prepared, reader);
		for (const result of all) results.push(result);
	});
	return results;
}

/** The readings of a text under one layout and year. `typed` may be shorter than the layout: the rest is unread. `plain` is the text where every character of the layout is known to be read. */
export function draftsOf(
	prepared: PreparedLayout,
	typed: readonly Cell[],
	year: number | null,
	tables: TableSet,
	context: ReadContext,
	plain: string | null = null
): Draft[] {
	const { layout } = prepared;
	const missing = layout.length - typed.length;
	const cells = missing > 0 ? [...typed, ...Array<Cell>(missing).fill(UNREAD)] : typed;
	const whole = plain ?? (cells.every(isRead) ? cells.join('') : null);
	const readerOf = (scope: Scope): Reader => ({
		tables,
		prepared,
		scope,
		cells,
		text: whole,
		typed: typed.length
	});
	const begin = (): Beginning => ({
		named: divisionsIn(readerOf({ year })),
		settled: new Map()
	});
	const { named, settled } =
		whole === null ? begin() : beginningOf(tables, prepared, whole, year, begin);
	const draft = (division = ''): Draft => {
		let own = settled.get(division);
		if (own === undefined) {
			const scope = scopeOf(prepared, cells, whole, year, division === '' ? undefined : division);
			own = settle(prepared, readerOf(scope));
			settled.set(division, own);
		}
		return {
			layout,
			maker: makerOf(division) ?? layout.maker,
			division: division === '' ? null : division,
			year,
			complete: missing <= 0,
			results: resultsOf(prepared, own, readerOf(own.scope))
		};
	};
	const { division: given } = context;
	if (named.length === 0)
		return [draft(given !== undefined && makerOf(given) === layout.maker ? given : undefined)];
	const drafts = named.map((division) => draft(division));
	if (layout.divisionInferred !== true) return drafts;
	const number = strayNumber(drafts[0] as Draft);
	if (number !== undefined && drafts.every((own) => strayNumber(own) !== undefined)) {
		const runs = divisionsByRun(readerOf({ year }), number);
		const others = runs.filter((division) => !named.includes(division));
		drafts.push(...others.map((division) => draft(division)));
	}
	return drafts;
}

/** The running number where it stands outside the run on record of the reading's division. */
export function strayNumber(draft: Draft): number | undefined {
	const stray = draft.results.find((result) => result.outOfRun === true);
	return stray === undefined ? undefined : Number(stray.field.code);
}

/** Whether any row stands under the code that a field has in these cells. */
export function hasRow(
	prepared: PreparedLayout,
	index: number,
	cells: readonly Cell[],
	tables: TableSet
): boolean {
	const question = prepared.questions[index] ?? null;
	if (question === null) return false;
	const table = tables.tables.get(question.id);
	return entriesMatching(table, cellsOf(cells, question.parts)).length > 0;
}

/** The fields of a draft, with the questions they put to the tables when asked for. */
export const fieldsOf = (draft: Draft, lookups: boolean): readonly ReadingField[] =>
	draft.results.map((result) => {
		const field =
			result.possible === undefined ? result.field : { ...result.field, ...result.possible() };
		return lookups ? { ...field, lookups: lookupsOf(result) } : field;
	});
