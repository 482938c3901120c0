import { contradictionText as text } from '../../text/en/contradictions';
import { SCOPE_COLUMNS, tableDefinition } from '../../types';
import { saysTheSame } from '../engine/compare';
import type { CompiledRow } from '../engine/table-set';
import { cellsMeet, pairsOf, yearsMeet, type Check } from './check';

/** Whether each is narrower than the other somewhere, and some cars are in both: neither is an exception of the other. */
function cross(a: CompiledRow, b: CompiledRow): boolean {
	if (a.narrowness !== b.narrowness || !yearsMeet(a, b)) return false;
	if (!SCOPE_COLUMNS.every((column) => cellsMeet(a[column], b[column]))) return false;
	const narrower = (one: CompiledRow, other: CompiledRow): boolean =>
		SCOPE_COLUMNS.some((column) => one[column].length > 0 && other[column].length === 0);
	return narrower(a, b) && narrower(b, a);
}

/** Two meanings of one code whose scopes cross, so that nothing says which of them goes first. */
export const crossingScopes: Check = ({ tables }) =>
	[...tables.values()]
		.filter(({ table }) => tableDefinition(table).sort === 'code')
		.flatMap(({ byCode }) => [...byCode.values()])
		.filter(({ code }) => code !== '')
		.flatMap(({ all }) => pairsOf(all))
		.filter(([a, b]) => !saysTheSame(a, b) && cross(a, b))
		.map(([a, b]) => ({
			check: 'crossing_scopes',
			rows: [a.row_key, b.row_key].sort(),
			sources: [],
			message: text.crossing_scopes(a.code, a.meaning, b.meaning)
		}));
