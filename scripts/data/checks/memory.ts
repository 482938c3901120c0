import { at, type Finding } from '../finding';
import { citedRows, differingPairs } from '../pairs';
import type { Data } from '../read';

export const name = 'memory';

/** Memory does not contradict itself: one of two such rows is wrong, and neither has a source to show. */
export function check(data: Data): Finding[] {
	const cited = citedRows(data);
	const findings: Finding[] = [];
	for (const [one, other] of differingPairs(data))
		if (!cited.has(one.value.row_key) && !cited.has(other.value.row_key))
			findings.push(
				at(other, `"${other.value.meaning}" against ${one.value.row_key}, both from memory`)
			);
	return findings;
}
