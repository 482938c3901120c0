import type { CompiledTable, TableSet } from '$lib/decoder';
import { tablesInOrder } from '$lib/server/reference';
import { MAKER_NAMES, MAKERS, STRENGTHS, tableDefinition, type Strength } from '$lib/types';

export interface TableCoverage {
	readonly label: string;
	readonly address: string;
	readonly rows: number;
	/** In the order of the strengths. */
	readonly counts: readonly { readonly strength: Strength; readonly count: number }[];
}

const tableCoverage = ({ maker, table, rows }: CompiledTable): TableCoverage => ({
	label: tableDefinition(table).label,
	address: `/tables/${maker}/${table}`,
	rows: rows.length,
	counts: STRENGTHS.map((strength) => ({
		strength,
		count: rows.filter((row) => row.strength === strength).length
	}))
});

/** Every table of every maker, with its rows by strength. */
export function coverageByTable(tables: TableSet) {
	const all = tablesInOrder(tables);
	return MAKERS.map((maker) => ({
		maker,
		name: MAKER_NAMES[maker],
		tables: all.filter((table) => table.maker === maker).map(tableCoverage)
	})).filter((one) => one.tables.length > 0);
}
