import { at, type Finding } from '../finding';
import { citedRows, differingPairs } from '../pairs';
import type { Data } from '../read';

export const name = 'overlap';

/** Rows that differ for the same cars are a dispute between sources; memory takes no part in one. */
export function check(data: Data): Finding[] {
	const cited = citedRows(data);
	const findings: Finding[] = [];
	for (const [one, other] of differingPairs(data)) {
		const weak = [one, other].filter(({ value }) => !cited.has(value.row_key));
		const [row] = weak;
		if (weak.length !== 1 || row === undefined) continue;
		const rival = row === one ? other : one;
		findings.push(
			at(row, `"${row.value.meaning}", from memory, contradicts cited ${rival.value.row_key}`)
		);
	}
	return findings;
}
