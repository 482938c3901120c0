import { contradictionText as text } from '../../text/en/contradictions';
import { FIRST_YEAR, SCOPE_COLUMNS, tableDefinition } from '../../types';
import type { CompiledRow } from '../engine/table-set';
import type { Check, Hit } from './check';

/** A gap of more years than this is another use of the code, and no question. */
const LONGEST = 3;

const scopeKey = (row: CompiledRow): string =>
	JSON.stringify([row.meaning, SCOPE_COLUMNS.map((column) => [...row[column]].sort())]);

/** A code that meant the same before and after some years, with no row of any meaning for the years between. */
function gapsOf(rows: readonly CompiledRow[], listed: (year: number) => boolean): Hit[] {
	const dated = rows
		.flatMap((row) =>
			row.years_from === null || row.years_to === null
				? []
				: [{ row, from: row.years_from, to: row.years_to }]
		)
		.sort((a, b) => a.from - b.from || a.to - b.to);
	return dated.slice(1).flatMap(({ row, from }, index) => {
		const before = dated[index] as (typeof dated)[number];
		const [first, last] = [before.to + 1, from - 1];
		const missing = last - first + 1;
		if (missing < 1 || missing > LONGEST) return [];
		for (let year = first; year <= last; year += 1) if (listed(year)) return [];
		return [
			{
				check: 'gap',
				rows: [before.row.row_key, row.row_key].sort(),
				sources: [],
				message: text.gap(row.code, row.meaning, first, last)
			}
		];
	});
}

/** Years between two rows of one meaning and scope for which a code has no row at all. */
export const gap: Check = ({ tables }) =>
	[...tables.values()]
		.filter(({ table }) => tableDefinition(table).sort === 'code')
		.flatMap(({ byCode }) => [...byCode.values()])
		.filter(({ code }) => code !== '')
		.flatMap(({ all, years }) => {
			const alike = new Map<string, CompiledRow[]>();
			for (const row of all) {
				const key = scopeKey(row);
				alike.set(key, [...(alike.get(key) ?? []), row]);
			}
			return [...alike.values()].flatMap((rows) =>
				gapsOf(rows, (year) => years[year - FIRST_YEAR] !== undefined)
			);
		});
