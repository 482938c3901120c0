/** Tables in a list of tables. */
import type { TableSet } from '$lib/decoder';
import { searchRows, tablesInOrder, type RowFilters } from '$lib/server/reference';
import { MAKER_NAMES, tableDefinition, type TableDefinition } from '$lib/types';

export interface TableEntryView {
	readonly maker: string;
	readonly label: string;
	readonly about: string;
	readonly sort: TableDefinition['sort'];
	readonly address: string;
	/** Rows that hold, and how many of them are firm or fair. */
	readonly rows: number;
	readonly supported: number;
}

/** Tables that have a row for a make and year, with links that carry them on. */
export function tableEntries(
	tables: TableSet,
	{ maker, division, year }: Pick<RowFilters, 'maker' | 'division' | 'year'> = {}
): TableEntryView[] {
	const parameters = new URLSearchParams();
	if (division !== undefined) parameters.set('division', division);
	if (year !== undefined) parameters.set('year', String(year));
	const query = parameters.size > 0 ? `?${parameters}` : '';
	return tablesInOrder(tables, { maker })
		.map((table) => {
			const place = { maker: table.maker, table: table.table };
			const { items } = searchRows(tables, '', { ...place, division, year });
			const { label, about, sort } = tableDefinition(table.table);
			return {
				maker: MAKER_NAMES[table.maker],
				label,
				about,
				sort,
				address: `/tables/${table.maker}/${table.table}${query}`,
				rows: items.length,
				supported: items.filter(({ strength }) => strength === 'firm' || strength === 'fair').length
			};
		})
		.filter(({ rows }) => rows > 0);
}
