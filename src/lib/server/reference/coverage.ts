import type { CompiledRow, TableSet } from '../../decoder';
import { DIVISIONS, MAKERS, TABLES, type Maker, type TableDefinition } from '../../types';

export interface CoverageCell {
	readonly year: number;
	/** Rows of code tables that hold for the division in this year. */
	readonly rows: number;
	/** How many of them are firm or fair. */
	readonly supported: number;
}
export interface DivisionCoverage {
	readonly maker: Maker;
	readonly division: string;
	/** Years with rows, ascending. */
	readonly years: readonly CoverageCell[];
}
export interface Coverage {
	/** First and last year of all divisions; null when no row has years. */
	readonly first_year: number | null;
	readonly last_year: number | null;
	/** In the order of the makers' divisions; those without rows have no years. */
	readonly divisions: readonly DivisionCoverage[];
}

const known = new WeakMap<TableSet, Coverage>();

const isSupported = ({ strength }: CompiledRow): boolean =>
	strength === 'firm' || strength === 'fair';

/**
 * Rows that carry years decide which years a division has. A row without years holds in each of those, and
 * one without a division in each of its maker's.
 */
function coverageOf(
	maker: Maker,
	division: string,
	rows: readonly CompiledRow[]
): DivisionCoverage {
	const cells = new Map<number, { rows: number; supported: number }>();
	const count = (row: CompiledRow, year: number) => {
		const cell = cells.get(year) ?? { rows: 0, supported: 0 };
		cells.set(year, {
			rows: cell.rows + 1,
			supported: cell.supported + (isSupported(row) ? 1 : 0)
		});
	};
	const own = rows.filter(
		(row) => row.maker === maker && (row.division.length === 0 || row.division.includes(division))
	);
	const decides = (row: CompiledRow) => row.division.length > 0 && row.years_from !== null;
	for (const row of own.filter(decides))
		for (let year = row.years_from ?? 0; year <= (row.years_to ?? 0); year += 1) count(row, year);
	const covered = [...cells.keys()];
	for (const row of own.filter((one) => !decides(one)))
		for (const year of covered)
			if (row.years_from === null || (row.years_from <= year && year <= (row.years_to ?? year)))
				count(row, year);
	return {
		maker,
		division,
		years: [...cells].sort(([a], [b]) => a - b).map(([year, cell]) => ({ year, ...cell }))
	};
}

/** Divisions by model years: how many rows of code tables there are, and how many are well supported. */
export function coverage(tables: TableSet): Coverage {
	let found = known.get(tables);
	if (!found) {
		const rows = [...tables.rows.values()].filter(
			({ table }) => (TABLES[table] as TableDefinition).sort === 'code'
		);
		const divisions = MAKERS.flatMap((maker) =>
			DIVISIONS[maker].map((division) => coverageOf(maker, division, rows))
		);
		const years = divisions.flatMap((one) => one.years.map(({ year }) => year));
		found = {
			first_year: years.length > 0 ? Math.min(...years) : null,
			last_year: years.length > 0 ? Math.max(...years) : null,
			divisions
		};
		known.set(tables, found);
	}
	return found;
}
