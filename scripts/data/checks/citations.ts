import { at, type Finding } from '../finding';
import type { Data } from '../read';

export const name = 'citations';

const NOTHING_TO_READ: ReadonlySet<string> = new Set(['memory', 'common_practice']);

/** Every row rests on something; every citation has its row and says how much of the source was read. */
export function check(data: Data): Finding[] {
	const rows = new Set(data.rows.map(({ value }) => value.row_key));
	const kinds = new Map(data.sources.map(({ value }) => [value.key, value.kind]));
	const supported = new Set<string>();
	const findings: Finding[] = [];
	for (const citation of data.citations) {
		const { row_key, source, stance, read, locator, quotation } = citation.value;
		if (stance === 'for') supported.add(row_key);
		if (!rows.has(row_key)) findings.push(at(citation, `there is no row ${row_key}`));
		const kind = kinds.get(source);
		if (kind === undefined) continue;
		if (NOTHING_TO_READ.has(kind)) {
			if (read !== null || locator !== '' || quotation !== '')
				findings.push(at(citation, `${source} cannot be read, located or quoted`));
		} else if (read === null) findings.push(at(citation, `how much of ${source} was read?`));
	}
	for (const row of data.rows)
		if (!supported.has(row.value.row_key))
			findings.push(at(row, `nothing speaks for ${row.value.row_key}`));
	return findings;
}
