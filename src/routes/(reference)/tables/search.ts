/** Rows that a page of tables shows. */
import type { CompiledRow, TableSet } from '$lib/decoder';
import { searchRows, type RowFilters } from '$lib/server/reference';

/** A search this short is taken as a code: as a part of a word it would fit nearly every row. */
const SHORT = 2;

export const isShortCode = (query: string): boolean =>
	query.length > 0 && [...query].length <= SHORT;

/** Rows that fit filters and a search: in canonical order, or the best match first. */
export function rowsFor(
	tables: TableSet,
	query: string,
	filters: RowFilters
): readonly CompiledRow[] {
	if (isShortCode(query)) {
		const code = query.toUpperCase();
		const { items } = searchRows(tables, '', filters);
		const exact = items.filter((row) => row.code.toUpperCase() === code);
		if (exact.length > 0) return exact;
	}
	return searchRows(tables, query, filters).items;
}

/** The same rows as CSV from the interface, which does not pick by strength. */
export function csvAddress(
	{ maker, table, division, year }: RowFilters,
	query: string
): string | null {
	if (maker === undefined || table === undefined) return null;
	const parameters = new URLSearchParams({ format: 'csv' });
	if (division !== undefined) parameters.set('division', division);
	if (year !== undefined) parameters.set('year', String(year));
	if (query !== '') parameters.set(isShortCode(query) ? 'code' : 'q', query);
	return `/api/v1/tables/${maker}/${table}?${parameters}`;
}
