/** How much each edition changed. */
import { compareEditions, type Difference } from '$lib/server/reference';
import type { EditionHead } from '$lib/types';

export interface ChangeCounts {
	readonly added: number;
	readonly changed: number;
	readonly retired: number;
}

export const countsOf = ({ added, changed, retired }: Difference<unknown>): ChangeCounts => ({
	added: added.length,
	changed: changed.length,
	retired: retired.length
});

/** An edition never changes, so what it changed is counted once; the oldest count goes. */
const known = new Map<number, ChangeCounts>();
const MOST = 500;

/**
 * Rows that an edition added, changed and retired; null for the first.
 * @throws {DatabaseAwayError}
 */
export async function rowCounts({ number, parent }: EditionHead): Promise<ChangeCounts | null> {
	if (parent === null) return null;
	let counts = known.get(number);
	if (counts === undefined) {
		counts = countsOf((await compareEditions(parent, number)).rows);
		known.set(number, counts);
		const [oldest] = known.keys();
		if (known.size > MOST && oldest !== undefined) known.delete(oldest);
	}
	return counts;
}
