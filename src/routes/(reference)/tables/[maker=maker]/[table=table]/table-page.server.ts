/** What the page of one table shows for an address. */
import type { CompiledTable, TableSet } from '$lib/decoder';
import { pageOfList } from '$lib/format/paging';
import { rowLine } from '$lib/format/row-lines';
import { scopeWords } from '$lib/format/scope';
import { yearSpan } from '$lib/format/years';
import type { CompiledEdition } from '$lib/server/reference';
import { tablesText as text } from '$lib/text/en/tables';
import { MAKER_NAMES, tableDefinition, type Claim } from '$lib/types';
import { divisionsOf, strengthChoices } from '../../choices';
import { readFilters } from '../../filters';
import { headingOf } from '../../heading';
import { csvAddress, rowsFor } from '../../search';
import {
	readSort,
	sortChoices,
	sortColumns,
	sortName,
	sortRows,
	type RowSort
} from '../../sorting';

/** Rows on a page. */
const PAGE = 100;

/** A claim of completeness in a sentence. */
function claimView(claim: Claim, { sources }: TableSet) {
	const scope = [
		scopeWords({ ...claim, body: [], engine: [], plant: [], market: [] }),
		yearSpan(claim.years_from, claim.years_to)
	].join(', ');
	return {
		key: claim.claim_key,
		text: text.table.complete(sources.get(claim.source)?.title ?? claim.source, scope),
		note: claim.note,
		source: claim.source
	};
}

/** The page: what the table is, the form over its rows, and the rows that fit. */
export function tablePage(url: URL, { tables, head }: CompiledEdition, table: CompiledTable) {
	const definition = tableDefinition(table.table);
	const { asked, filters, query, faults } = readFilters(url.searchParams);
	const place = { maker: table.maker, table: table.table };
	const within = { ...filters, ...place };
	const withCode = table.rows.some(({ code }) => code !== '');
	const usual: RowSort = { column: withCode ? 'code' : 'years', descending: false };
	const sort = readSort(url.searchParams.get('sort')) ?? (query === '' ? usual : null);
	const found = rowsFor(tables, query, within);
	const rows = sort ? sortRows(found, sort) : found;
	const { items, paging } = pageOfList(url, rows, PAGE, 'rows');
	return {
		...place,
		makerName: MAKER_NAMES[table.maker],
		label: definition.label,
		about: definition.about,
		isLookedUp: definition.sort === 'code',
		edition: head.number,
		claims: table.claims.map((claim) => claimView(claim, tables)),
		all: table.rows.length,
		// The make and the table stand in the title already.
		heading: headingOf({ ...filters, maker: undefined, table: undefined }, query),
		total: rows.length,
		rows: items.map(rowLine),
		paging,
		csv: csvAddress(within, query),
		sorts: sortColumns(url, sort),
		withCode,
		hasChips: items.some(({ values }) => values['hex_approximate'] !== undefined),
		form: {
			asked,
			faults,
			divisions: divisionsOf(table.maker),
			strengths: strengthChoices,
			sort: sort ? sortName(sort) : '',
			sorts: sortChoices(withCode, query !== '')
		}
	};
}
