import { contradictionText as text } from '../../text/en/contradictions';
import { SCOPE_COLUMNS } from '../../types';
import type { CompiledRow } from '../engine/table-set';
import { rowsNamed, type Check } from './check';

const sameCars = (a: CompiledRow, b: CompiledRow): boolean =>
	a.maker === b.maker &&
	a.years_from === b.years_from &&
	a.years_to === b.years_to &&
	SCOPE_COLUMNS.every(
		(column) =>
			a[column].length === b[column].length && a[column].every((value) => b[column].includes(value))
	);

/** A run of numbers that is longer than the cars that were built of the same scope. */
export const sequenceBeyondProduction: Check = (tables) => {
	const built = rowsNamed(tables, 'production');
	return rowsNamed(tables, 'sequence').flatMap((row) => {
		const { first_sequence: first, last_sequence: last } = row.values;
		if (typeof first !== 'number' || typeof last !== 'number') return [];
		const room = last - first + 1;
		return built.flatMap((total) => {
			const { units_built: units } = total.values;
			if (typeof units !== 'number' || units >= room || !sameCars(row, total)) return [];
			return [
				{
					check: 'sequence_beyond_production' as const,
					rows: [row.row_key, total.row_key].sort(),
					sources: [],
					message: text.sequence_beyond_production(room, units)
				}
			];
		});
	});
};
