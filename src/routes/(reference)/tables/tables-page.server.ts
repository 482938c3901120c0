/** What the page of all tables shows for an address. */
import type { CompiledRow, TableSet } from '$lib/decoder';
import { drawnCoverage } from '$lib/format/coverage';
import { pageOfList, withParameters, type Paging } from '$lib/format/paging';
import { rowLine, type RowLine } from '$lib/format/row-lines';
import { coverage, current, tablesInOrder, type RowFilters } from '$lib/server/reference';
import { tablesText as text } from '$lib/text/en/tables';
import { MAKER_NAMES, MAKERS } from '$lib/types';
import { divisionChoices, strengthChoices, tableChoices } from './choices';
import { readFilters } from './filters';
import { headingOf } from './heading';
import { csvAddress, rowsFor } from './search';
import { tableEntries, type TableEntryView } from './table-entries';

/** Rows on a page. */
const PAGE = 100;

export interface RowResults {
	readonly heading: string;
	readonly total: number;
	readonly rows: readonly RowLine[];
	readonly paging: Paging;
	readonly csv: string | null;
	/** Nothing was found: the same search without its filters. */
	readonly wider: string | null;
}
export interface TableResults {
	readonly heading: string;
	readonly tables: readonly TableEntryView[];
}

function rowResults(url: URL, tables: TableSet, query: string, filters: RowFilters): RowResults {
	const rows: readonly CompiledRow[] = rowsFor(tables, query, filters);
	const { items, paging } = pageOfList(url, rows, PAGE, 'find');
	const narrow = { table: null, division: null, maker: null, year: null, strength: null };
	return {
		heading: headingOf(filters, query),
		total: rows.length,
		rows: items.map(rowLine),
		paging,
		csv: csvAddress(filters, query),
		wider:
			rows.length === 0 && query !== '' && Object.keys(filters).length > 0
				? withParameters(url, { ...narrow, page: null }, 'find')
				: null
	};
}

/** The page: coverage, the form, and what was asked for. */
export function tablesPage(url: URL) {
	const { tables, head } = current();
	const { asked, filters, query, faults } = readFilters(url.searchParams);
	const { maker, division, year, table, strength } = filters;
	const wantsRows = query !== '' || table !== undefined || strength !== undefined;
	const wantsTables = !wantsRows && (maker !== undefined || year !== undefined);
	const inOrder = tablesInOrder(tables);
	return {
		edition: head.number,
		coverage: drawnCoverage(coverage(tables).divisions),
		chosen: { division, year },
		form: {
			asked,
			faults,
			tables: tableChoices(tables),
			divisions: divisionChoices(tables),
			strengths: strengthChoices
		},
		rows: wantsRows ? rowResults(url, tables, query, filters) : null,
		tables: wantsTables
			? {
					heading: text.results.tablesOf(headingOf(filters, '')),
					tables: tableEntries(tables, { maker, division, year })
				}
			: null,
		makers: MAKERS.map((key) => ({ key, own: inOrder.filter((one) => one.maker === key) }))
			.filter(({ own }) => own.length > 0)
			.map(({ key, own }) => ({
				name: MAKER_NAMES[key],
				address: `/tables/${key}`,
				about: text.makers.about(
					own.length,
					own.reduce((sum, { rows }) => sum + rows.length, 0)
				)
			}))
	};
}
