import { tableDefinition, valuesSchemaFor } from '../../../src/lib/types';
import { at, type Finding } from '../finding';
import type { Data } from '../read';

export const name = 'schema';

/** Every file and record has its shape; values meet the schema of their table; codes stand where they must. */
export function check(data: Data): Finding[] {
	const findings: Finding[] = [...data.unreadable];
	for (const row of data.rows) {
		const { table, code, values } = row.value;
		const result = valuesSchemaFor(table).safeParse(values);
		if (!result.success)
			for (const issue of result.error.issues)
				findings.push(at(row, `values ${issue.path.join('.')}: ${issue.message}`));
		if (code === '' && tableDefinition(table).match !== 'none')
			findings.push(at(row, `a row of ${table} needs a code`));
	}
	return findings;
}
