import { contradictionText as text } from '../../text/en/contradictions';
import { constraintSchema, ruleSchema } from '../../types';
import type { CompiledRow, TableSet } from '../engine/table-set';
import { rowsNamed, type Check } from './check';

type Condition = ReturnType<typeof constraintSchema.parse>['left'];

/** The conditions of a rule or constraint; none where its facts are not those of one. */
function conditionsOf({ table, values }: CompiledRow): readonly Condition[] {
	if (table === 'constraint') {
		const { data } = constraintSchema.safeParse(values);
		return data === undefined ? [] : [data.left, data.right];
	}
	const { data } = ruleSchema.safeParse(values);
	return data === undefined ? [] : [...data.when, ...data.then];
}

/** Whether some row says a value of an attribute: as its code in the table of that name, or among its facts. */
function isSaid(tables: TableSet, attribute: string, value: string): boolean {
	return [...tables.rows.values()].some(({ table, code, values }) => {
		if (table === attribute && code === value) return true;
		const told = values[attribute] ?? '';
		return typeof told !== 'object' && String(told) === value;
	});
}

/** A rule or constraint with a condition none of whose values stands in any row. */
export const ruleWithoutRows: Check = (tables) =>
	['rule', 'constraint']
		.flatMap((name) => rowsNamed(tables, name))
		.flatMap((row) => {
			const unmet = conditionsOf(row).filter(
				({ attribute, any_of: values = [] }) =>
					values.length > 0 && !values.some((value) => isSaid(tables, attribute, value))
			);
			if (unmet.length === 0) return [];
			return [
				{
					check: 'rule_without_rows' as const,
					rows: [row.row_key],
					sources: [],
					message: text.rule_without_rows(unmet.flatMap(({ any_of: values = [] }) => values))
				}
			];
		});
