/** Fields whose meaning stands in a table. */
import { decoderText as text } from '../../text/en/decoder';
import { isRead, textOf, type Cell } from './characters';
import {
	contestedField,
	fieldOf,
	foundField,
	keepTold,
	possibleOf,
	toldBefore,
	type FieldHead,
	type FieldResult
} from './field';
import type { PrimaryField, Span } from './layout';
import type { PreparedLayout, Question } from './plan';
import { choose, claimFor, entriesMatching, lookUp, type Answer, type Scope } from './look-up';
import { rowsInYear, type CompiledRow, type TableSet } from './table-set';

/** What a field is read against. */
export interface Reader {
	readonly tables: TableSet;
	readonly prepared: PreparedLayout;
	readonly scope: Scope;
	readonly cells: readonly Cell[];
	/** The characters as one text when every one of them is read. */
	readonly text: string | null;
	/** How many characters were typed; the places after them are unread. */
	readonly typed: number;
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

const readCells = (reader: Reader, parts: readonly Span[]): string | null => {
	const [first] = parts;
	if (reader.text !== null && first !== undefined && parts.length === 1)
		return reader.text.slice(first[0] - 1, first[1]);
	const cells = cellsOf(reader.cells, parts);
	return cells.every(isRead) ? cells.join('') : null;
};

function answered(
	head: FieldHead,
	question: Question,
	code: string,
	answer: Answer,
	reader: Reader
): FieldResult {
	const { table } = question;
	if (answer.kind === 'found')
		return { field: foundField(head, code, answer.rows), rows: answer.rows, counts: true, table };
	if (answer.kind === 'contested') {
		const rows = answer.groups.flat();
		return {
			field: contestedField(head, code, answer.groups),
			rows,
			counts: true,
			table
		};
	}
	if (answer.kind === 'depends') {
		const parent = reader.prepared.parents.get(answer.on) as PrimaryField;
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
			table
		};
	}
	const compiled = reader.tables.tables.get(question.id);
	const claim = claimFor(compiled, reader.scope);
	const source = claim === undefined ? undefined : reader.tables.sources.get(claim.source);
	const field =
		source === undefined
			? fieldOf(head, {
					code,
					outcome: 'not_listed',
					detail: missingDetail(head, code, reader),
					possible: nearby(compiled?.byCode.get(code)?.all ?? NONE, reader.scope)
				})
			: fieldOf(head, {
					code,
					outcome: 'not_used',
					detail: text.fields.notUsed(code, source.title),
					sources: [{ key: source.key, title: source.title, locator: '', kind: source.kind }]
				});
	return { field, rows: NONE, counts: false, table };
}

/** What to say of a code without a row: for the line, also the gap that the car may fall into. */
function missingDetail(head: FieldHead, code: string, { prepared }: Reader): string {
	const { gap, lineFrom } = prepared.layout;
	const said = text.fields.notListed(head.label, code);
	return gap !== undefined && head.name === lineFrom ? `${said} ${gap}` : said;
}

/** What the same code meant on the same division in the years on either side. */
function nearby(rows: readonly CompiledRow[], scope: Scope) {
	const { division } = scope;
	const year = scope.year ?? NaN;
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
	{ id, table }: Question,
	cells: readonly Cell[],
	reader: Reader
): FieldResult {
	const code = textOf(cells);
	// What is not typed yet could be anything: listing all of it would tell nobody anything.
	if (head.from > reader.typed)
		return {
			field: fieldOf(head, { code, outcome: 'illegible', detail: text.fields.notTyped }),
			rows: NONE,
			counts: false,
			table
		};
	const rows: CompiledRow[] = [];
	for (const entry of entriesMatching(reader.tables.tables.get(id), cells)) {
		const answer = choose(rowsInYear(entry, reader.scope.year), reader.scope);
		const own =
			answer.kind === 'contested'
				? answer.groups.flat()
				: answer.kind === 'missing'
					? []
					: answer.rows;
		rows.push(...own);
	}
	return {
		field: fieldOf(head, { code, outcome: 'illegible', detail: text.fields.unread(cells) }),
		rows,
		possible: () => couldBe(cells, rows),
		counts: false,
		table
	};
}

/** A longer list would be read by nobody: its length is told in its place. */
const MOST_POSSIBLE = 40;

function couldBe(cells: readonly Cell[], rows: readonly CompiledRow[]) {
	const possible = possibleOf(rows);
	const named = new Set(rows.map((row) => row.code));
	for (const candidate of spelled(cells))
		if (!named.has(candidate))
			possible.push({ code: candidate, meaning: text.fields.noRowFor, values: {} });
	const detail = text.fields.unread(cells);
	return possible.length > MOST_POSSIBLE
		? { detail: `${detail} ${text.fields.manyPossible(possible.length)}`, possible: [] }
		: { detail, possible };
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
export function tableField(head: FieldHead, question: Question, reader: Reader): FieldResult {
	const code = readCells(reader, question.parts);
	if (code === null) return unread(head, question, cellsOf(reader.cells, question.parts), reader);
	const compiled = reader.tables.tables.get(question.id);
	const answer = lookUp(compiled, code, reader.scope);
	if (answer.kind === 'found' && answer.rows.length === 1) {
		const row = answer.rows[0] as CompiledRow;
		const before = question.range ? undefined : toldBefore(row, head);
		return before ?? keepTold(row, head, answered(head, question, code, answer, reader));
	}
	if (answer.kind === 'missing' && question.otherwise !== null) {
		const other = { ...question, parts: question.otherwise, otherwise: null };
		const result = tableField(head, other, reader);
		if (result.counts) return result;
	}
	return answered(head, question, code, answer, reader);
}
