import { questionKey } from '../exceptions';
import { at, type Finding } from '../finding';
import type { Data } from '../read';

export const name = 'exceptions';

/** A closed question names rows that are there and the work that settles it, once. */
export function check(data: Data): Finding[] {
	const kinds = new Map(data.sources.map(({ value }) => [value.key, value.kind]));
	const rows = new Set(data.rows.map(({ value }) => value.row_key));
	const seen = new Set<string>();
	const findings: Finding[] = [];
	for (const exception of data.exceptions) {
		const { source } = exception.value;
		const question = questionKey(exception.value);
		for (const key of exception.value.rows)
			if (!rows.has(key)) findings.push(at(exception, `${question}: there is no row ${key}`));
		const kind = kinds.get(source);
		if (kind === undefined)
			findings.push(at(exception, `${question}: ${source} is not in sources.csv`));
		if (kind === 'memory')
			findings.push(at(exception, `${question} rests on memory, which settles nothing`));
		if (seen.has(question)) findings.push(at(exception, `${question} is closed twice`));
		seen.add(question);
	}
	return findings;
}
