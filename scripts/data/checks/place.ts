import { at, type Finding } from '../finding';
import type { Data } from '../read';

export const name = 'place';

/** The code in lower case, everything but a-z and 0-9 as a dash, none at the ends, `x` when nothing is left. */
const slugOf = (code: string): string =>
	code
		.toLowerCase()
		.replace(/[^a-z0-9]+/g, '-')
		.replace(/^-|-$/g, '') || 'x';

/** A row's key begins with the maker and table of its file and carries its code; citations stand beside their rows. */
export function check(data: Data): Finding[] {
	const findings: Finding[] = [];
	for (const row of data.rows) {
		const { row_key, maker, table, code } = row.value;
		const expected = `${maker}.${table}.${slugOf(code)}.`;
		if (!row_key.startsWith(expected) || row_key.slice(expected.length).includes('.'))
			findings.push(at(row, `${row_key} should be ${expected}<number>`));
	}
	for (const citation of data.citations) {
		const [maker, table] = citation.value.row_key.split('.');
		if (citation.file !== `${maker}/${table}.citations.csv`)
			findings.push(at(citation, `${citation.value.row_key} belongs to another file`));
	}
	return findings;
}
