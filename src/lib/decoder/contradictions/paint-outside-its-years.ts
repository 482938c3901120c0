import { contradictionText as text } from '../../text/en/contradictions';
import { rowsNamed, spanOf, yearsMeet, type Check } from './check';
import { lineKey, linesOf } from './lines';

/** A paint for a line, in years for which no table has that line. */
export const paintOutsideItsYears: Check = (tables) => {
	const lines = linesOf(tables);
	return rowsNamed(tables, 'paint')
		.filter(({ years_from }) => years_from !== null)
		.flatMap((row) => {
			const outside = row.line.filter((name) => {
				const own = lines.get(lineKey(row.maker, name)) ?? [];
				return own.length > 0 && !own.some((line) => yearsMeet(line, row));
			});
			if (outside.length === 0) return [];
			return [
				{
					check: 'paint_outside_its_years' as const,
					rows: [row.row_key],
					sources: [],
					message: text.paint_outside_its_years(outside.sort(), ...spanOf(row))
				}
			];
		});
};
