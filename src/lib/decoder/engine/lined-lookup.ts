/** Looks up a field of a stamp of several lines. */
import type { Maker, TableName } from '../../types';
import { decoderText as text } from '../../text/en/decoder';
import { stampsText } from '../../text/en/stamps';
import { answerAlone } from './answer-alone';
import { isRead, textOf, type Cell } from './characters';
import {
	contestedField,
	fieldOf,
	foundField,
	possibleOf,
	scopeText,
	type FieldHead,
	type FieldResult
} from './field';
import type { Places } from './lined-layout';
import { choose, claimFor, entriesMatching, type Answer, type Scope } from './look-up';
import {
	rowsInYear,
	tableId,
	type CompiledRow,
	type CompiledTable,
	type TableSet
} from './table-set';

export interface Lookups {
	readonly tables: TableSet;
	readonly maker: Maker;
	readonly scope: Scope;
	/** A loose part may be of another car: what a code means elsewhere is told when it means nothing here. */
	readonly loose: boolean;
}

/**
 * The cells that make a code. Places count from the field's start, or from its end when negative. A place that is taken
 * twice is written twice: [[1, 1], [1, 1]] makes NN of N.
 */
export function partsOf(cells: readonly Cell[], parts: readonly Places[] | undefined): Cell[] {
	if (parts === undefined) return [...cells];
	const index = (place: number): number => (place < 0 ? cells.length + place : place - 1);
	return parts.flatMap(([from, to], part) => [
		...(part === 0 || from === parts[part - 1]?.[0] ? [] : ['/']),
		...cells.slice(index(from), index(to) + 1)
	]);
}

const MOST_POSSIBLE = 40;

/** Makers share some tables: theirs stand under "other". */
const tableOf = ({ tables, maker }: Lookups, table: TableName): CompiledTable | undefined =>
	tables.tables.get(tableId(maker, table)) ?? tables.tables.get(tableId('other', table));

function answerFor(
	table: CompiledTable | undefined,
	code: string,
	{ scope, loose }: Lookups
): Answer {
	const entry = table?.byCode.get(code);
	if (entry === undefined) return { kind: 'missing' };
	const answer = choose(rowsInYear(entry, scope.year), scope);
	if (!loose || answer.kind === 'found' || answer.kind === 'contested') return answer;
	const near = answerAlone(rowsInYear(entry, scope.year), scope);
	return near.kind === 'missing' ? answerAlone(entry.all, { year: null }) : near;
}

function missing(
	head: FieldHead,
	code: string,
	table: CompiledTable | undefined,
	{ scope, tables }: Lookups
) {
	const claim = claimFor(table, scope);
	const source = claim === undefined ? undefined : tables.sources.get(claim.source);
	if (source === undefined)
		return fieldOf(head, {
			code,
			outcome: 'not_listed',
			detail: text.fields.notListed(head.label, code)
		});
	return fieldOf(head, {
		code,
		outcome: 'not_used',
		detail: text.fields.notUsed(code, source.title),
		sources: [{ key: source.key, title: source.title, locator: '', kind: source.kind }]
	});
}

function unread(
	head: FieldHead,
	cells: readonly Cell[],
	table: CompiledTable | undefined,
	lookups: Lookups
) {
	const rows = entriesMatching(table, cells).flatMap((entry): readonly CompiledRow[] => {
		const answer = choose(rowsInYear(entry, lookups.scope.year), lookups.scope);
		if (answer.kind === 'missing') return [];
		return answer.kind === 'contested' ? answer.groups.flat() : answer.rows;
	});
	const possible = possibleOf(rows);
	const many = possible.length > MOST_POSSIBLE;
	const detail = text.fields.unread(cells);
	return fieldOf(head, {
		code: textOf(cells),
		outcome: 'illegible',
		detail: many ? `${detail} ${text.fields.manyPossible(possible.length)}` : detail,
		possible: many ? [] : possible
	});
}

/** The note of a row, and where it holds: what a part that comes without its car is for. */
const withScope = (note: string, rows: readonly CompiledRow[]): string => {
	const scopes = [...new Set(rows.map(scopeText))].filter((scope) => scope !== '');
	return [note, ...(scopes.length === 0 ? [] : [stampsText.holdsFor(scopes)])]
		.filter((part) => part !== '')
		.join(' ');
};

/** Reads cells against a table, with the code that the first of several splits finds. */
export function lookUpCells(
	head: FieldHead,
	name: TableName,
	cells: readonly Cell[],
	splits: readonly (readonly Places[] | undefined)[],
	lookups: Lookups
): FieldResult {
	const table = tableOf(lookups, name);
	const codes = splits.map((parts) => partsOf(cells, parts));
	const shown = textOf(cells);
	if (!cells.every(isRead))
		return {
			field: unread(head, codes[0] as Cell[], table, lookups),
			rows: [],
			counts: false,
			table: name
		};
	const answers = codes.map((code) => answerFor(table, code.join(''), lookups));
	const answer = answers.find(({ kind }) => kind !== 'missing') ?? { kind: 'missing' as const };
	switch (answer.kind) {
		case 'found': {
			const field = foundField(head, shown, answer.rows);
			return {
				field: lookups.loose ? { ...field, detail: withScope(field.detail, answer.rows) } : field,
				rows: answer.rows,
				counts: true,
				table: name
			};
		}
		case 'contested':
			return {
				field: contestedField(head, shown, answer.groups),
				rows: answer.groups.flat(),
				counts: true,
				table: name
			};
		case 'depends':
			return {
				field: fieldOf(head, {
					code: shown,
					outcome: 'found',
					meaning: stampsText.depends(answer.on),
					detail: text.code.narrowedBy,
					rows: answer.rows.map(({ row_key }) => row_key),
					possible: possibleOf(answer.rows)
				}),
				rows: answer.rows,
				counts: false,
				table: name
			};
		case 'missing':
			return {
				field: missing(head, shown, table, lookups),
				rows: [],
				counts: false,
				table: name,
				asked: (codes[0] as Cell[]).join('')
			};
	}
}
