import type { CompiledRow } from '../../decoder';
import type { Maker, TableName } from '../../types';
import {
	answerCsv,
	answerJson,
	etagOf,
	filtersOf,
	pageOf,
	readLimit,
	startOf,
	type Parameters
} from '../http';
import { readEdition } from '../readings';
import { searchRows, type CompiledEdition } from '../reference';
import { rowsAsCsv } from './csv';
import { editionAsked } from './edition';
import { readRowFilter, type RowFilter } from './filters';
import { rowAnswer, tableHead } from './rows';

export const TABLE_PARAMETERS = [
	'edition',
	'division',
	'year',
	'code',
	'q',
	'format',
	'limit',
	'cursor'
] as const;
type TableParameter = (typeof TABLE_PARAMETERS)[number];

/** Rows of a table that pass, in canonical order; under a search, the best match first. */
function rowsOf(
	{ tables }: CompiledEdition,
	place: { readonly maker: Maker; readonly table: TableName },
	{ q, code, division, year }: RowFilter
): readonly CompiledRow[] {
	const { items } = searchRows(tables, q ?? '', { ...place, division, year });
	return code === undefined ? items : items.filter((row) => row.code.toUpperCase() === code);
}

const nextLink = (url: URL, cursor: string): string => {
	const next = new URL(url);
	next.searchParams.set('cursor', cursor);
	return `<${next.pathname}${next.search}>; rel="next"`;
};

/**
 * Answers rows of a table: a page of them as JSON, or as CSV all of them unless a limit is given.
 * @throws {Refusal} for parameters that cannot be
 */
export async function answerTable(
	{ url, request }: { readonly url: URL; readonly request: Request },
	{ maker, table }: { readonly maker: Maker; readonly table: TableName },
	asked: Parameters<TableParameter>,
	as: 'json' | 'csv'
): Promise<Response> {
	const filter = readRowFilter(asked);
	const limit = readLimit(asked.limit);
	const filters = filtersOf(url.pathname, asked);
	const start = startOf(asked.cursor, filters, readEdition(asked.edition));
	const edition = await editionAsked(start.edition);
	const { number, digest } = edition.head;
	const etag = etagOf(digest, '', `${url.pathname}${url.search} ${as}`);
	const place = { edition: number, after: start.after, filters };
	if (as === 'json')
		return answerJson(request, { etag, headers: { vary: 'accept' } }, () => {
			const rows = rowsOf(edition, { maker, table }, filter);
			const { items, next } = pageOf(rows, limit, place);
			return {
				edition: number,
				digest,
				...tableHead({ maker, table }),
				total: rows.length,
				items: items.map(rowAnswer),
				next
			};
		});
	const rows = rowsOf(edition, { maker, table }, filter);
	const { items, next } = pageOf(rows, asked.limit === undefined ? rows.length : limit, place);
	const headers = { vary: 'accept', ...(next !== null && { link: nextLink(url, next) }) };
	const filename = `${maker}-${table}-edition-${number}.csv`;
	return answerCsv(request, { etag, headers }, filename, () => rowsAsCsv(items));
}
