/** The orders that rows of a table can stand in. */
import type { SortColumn, SortColumns } from '$lib/components/reference/RowTable.svelte';
import { compareRows, type CompiledRow } from '$lib/decoder';
import { withParameters } from '$lib/format/paging';
import { tablesText } from '$lib/text/en/tables';
import { STRENGTHS } from '$lib/types';

const text = tablesText.sorts;
const COLUMNS = ['code', 'meaning', 'years', 'strength'] as const;
type Column = (typeof COLUMNS)[number];
export interface RowSort {
	readonly column: Column;
	readonly descending: boolean;
}

const byWord = (a: string, b: string): number =>
	a.localeCompare(b, 'en', { numeric: true, sensitivity: 'base' });
const byStrength = (a: CompiledRow, b: CompiledRow): number =>
	STRENGTHS.indexOf(a.strength) - STRENGTHS.indexOf(b.strength);
const byYears = (a: CompiledRow, b: CompiledRow): number =>
	(a.years_from ?? 0) - (b.years_from ?? 0) || (a.years_to ?? 0) - (b.years_to ?? 0);
const ORDERS: Readonly<Record<Column, (a: CompiledRow, b: CompiledRow) => number>> = {
	code: compareRows,
	meaning: (a, b) => byWord(a.meaning, b.meaning),
	years: byYears,
	strength: byStrength
};

/** Reads `code`, `-years`; null for what is none, and where nothing was asked. */
export function readSort(value: string | null): RowSort | null {
	const name = value?.replace(/^-/, '');
	const column = COLUMNS.find((one) => one === name);
	return column ? { column, descending: value?.startsWith('-') ?? false } : null;
}

export const sortName = ({ column, descending }: RowSort): string =>
	`${descending ? '-' : ''}${column}`;

/** Rows in an order; those that are equal by it in the canonical one. */
export function sortRows(rows: readonly CompiledRow[], sort: RowSort): CompiledRow[] {
	const order = ORDERS[sort.column];
	const sign = sort.descending ? -1 : 1;
	return [...rows].sort((a, b) => sign * order(a, b) || compareRows(a, b));
}

const wordsOf = ({ column, descending }: RowSort): string =>
	descending ? text[column].down : text[column].up;

/** Heads of the columns: how the rows stand now, and the address of the other order. */
export function sortColumns(url: URL, now: RowSort | null): SortColumns {
	const head = (column: Column): SortColumn => {
		const isSorted = now?.column === column;
		const next = { column, descending: isSorted && !now.descending };
		return {
			sorted: isSorted ? (now.descending ? 'descending' : 'ascending') : null,
			words: isSorted ? wordsOf(now) : '',
			href: withParameters(url, { sort: sortName(next), page: null }, 'rows')
		};
	};
	return Object.fromEntries(COLUMNS.map((column) => [column, head(column)]));
}

/** The same orders for a form. */
export const sortChoices = (withCode: boolean, matched: boolean) => [
	...(matched ? [{ value: '', label: text.match }] : []),
	...COLUMNS.filter((column) => withCode || column !== 'code').flatMap((column) =>
		[false, true].map((descending) => ({
			value: sortName({ column, descending }),
			label: `${tablesText.heads[column === 'meaning' ? 'means' : column]}, ${wordsOf({ column, descending })}`
		}))
	)
];
