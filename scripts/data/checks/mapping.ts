import { familyOf } from '../collected';
import { at, type Finding } from '../finding';
import type { Data } from '../read';

export const name = 'mapping';

const label = (family: string, area: string, field: string): string =>
	`${family}, ${area}, ${field}`;

/** Every label under which facts were collected has a place in our tables, and no label is made up. */
export function check(data: Data): Finding[] {
	const mapped = new Set(
		data.mapping.map(({ value }) => label(value.family, value.area, value.field))
	);
	const used = new Set<string>();
	const findings: Finding[] = [];
	for (const candidate of data.candidates) {
		const { candidate: id, area, field } = candidate.value;
		const own = label(familyOf(id), area, field);
		if (!mapped.has(own) && !used.has(own))
			findings.push(at(candidate, `label ${own} is not in mapping.csv`));
		used.add(own);
	}
	for (const line of data.mapping) {
		const own = label(line.value.family, line.value.area, line.value.field);
		if (!used.has(own)) findings.push(at(line, `no collected fact carries the label ${own}`));
	}
	return findings;
}
