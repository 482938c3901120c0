import { contradictionText as text } from '../../text/en/contradictions';
import { cellsMeet, rowsNamed, spanOf, yearsMeet, type Check } from './check';

/** A row for cars of one plant, in years for which the table of plants does not list that plant. */
export const plantOutsideItsYears: Check = (tables) => {
	const plants = rowsNamed(tables, 'assembly_plant');
	return [...tables.rows.values()]
		.filter(({ years_from }) => years_from !== null)
		.flatMap((row) =>
			row.plant.flatMap((code) => {
				const own = plants.filter(
					(plant) =>
						plant.maker === row.maker &&
						plant.code === code &&
						cellsMeet(plant.division, row.division)
				);
				if (own.length === 0 || own.some((plant) => yearsMeet(plant, row))) return [];
				return [
					{
						check: 'plant_outside_its_years' as const,
						rows: [row.row_key, ...own.map(({ row_key }) => row_key)].sort(),
						sources: [],
						message: text.plant_outside_its_years(code, ...spanOf(row))
					}
				];
			})
		);
};
