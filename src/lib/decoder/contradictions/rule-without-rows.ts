import { contradictionText as text } from '../../text/en/contradictions';
import { constraintSchema, ruleSchema } from '../../types';
import type { CompiledRow, TableSet } from '../engine/table-set';
import { rowsNamed, type Check } from './check';

type Condition = ReturnType<typeof constraintSchema.parse>['left'];

/** The conditions of a rule or constraint. */
const conditionsOf = ({ table, values }: CompiledRow): readonly Condition[] => {
	if (table === 'constraint') {
		const { left, right } = constraintSchema.parse(values);
		return [left, right];
	}
	const { when, then } = ruleSchema.parse(values);
	return [...when, ...then];
};

/** Whether some row says a value of an attribute: as its code in the table of that name, or among its facts. */
function isSaid(tables: TableSet, attribute: string, value: string): boolean {
	return [...tables.rows.values()].some(
		({ table, code, values }) =>
			(table === attribute && code === value) || String(values[attribute] ?? '') === value
	);
}

/** A rule or constraint with a condition none of whose values stands in any row. */
export const ruleWithoutRows: Check = (tables) =>
	['rule', 'constraint']
		.flatMap((name) => rowsNamed(tables, name))
		.flatMap((row) =>
			conditionsOf(row)
				.filter(
					({ attribute, any_of: values = [] }) =>
						values.length > 0 && !values.some((value) => isSaid(tables, attribute, value))
				)
				.map(({ any_of: values = [] }) => ({
					check: 'rule_without_rows' as const,
					rows: [row.row_key],
					sources: [],
					message: text.rule_without_rows(values.join(', '))
				}))
		);
