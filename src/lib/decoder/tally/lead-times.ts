/** How far a date usually stands before another: rules of thumb, each a row that can be corrected. */
import { leadTimeSchema } from '../../types';
import { tableId, type CompiledRow, type TableSet } from '../engine/table-set';
import type { Against } from './date-relations';
import type { DateStatement } from './date-statements';

export interface LeadTime {
	readonly row: CompiledRow;
	/** Days from the part's date to the other; below nought where a plan may slip. */
	readonly daysMin: number;
	readonly daysMax: number;
}

function holds(row: CompiledRow, { division, year }: DateStatement): boolean {
	if (row.division.length > 0 && (division === null || !row.division.includes(division)))
		return false;
	if (row.years_from === null) return true;
	return year !== null && row.years_from <= year && year <= (row.years_to as number);
}

/**
 * The narrowest row of the part's maker, or of all makers, for a date against another. `part` of a row names a date
 * form, a unit or a sort of date, in this order of precedence.
 */
export function leadTimeOf(
	tables: TableSet,
	statement: DateStatement,
	against: Against
): LeadTime | null {
	const names = [statement.format.id, statement.unit, statement.dates];
	const makers =
		statement.maker === null ? (['other'] as const) : [statement.maker, 'other' as const];
	const found = makers
		.flatMap((maker) => tables.tables.get(tableId(maker, 'lead_time'))?.rows ?? [])
		.filter((row) => holds(row, statement))
		.flatMap((row) => {
			const { part, against: other, days_min, days_max } = leadTimeSchema.parse(row.values);
			const at = names.indexOf(part);
			return at < 0 || other !== against ? [] : [{ row, at, daysMin: days_min, daysMax: days_max }];
		})
		.sort((a, b) => a.at - b.at || b.row.narrowness - a.row.narrowness);
	return found[0] ?? null;
}
