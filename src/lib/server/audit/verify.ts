import { asking, type Database } from '../db';
import { audit } from '../db/repositories';
import { GENESIS, hashOf } from './hash';

/** Whether the chain holds. */
export type Verdict =
	| { readonly holds: true; readonly entries: number; readonly last: string }
	| {
			readonly holds: false;
			/** The first entry that is not what it was. */
			readonly number: number;
			readonly why: 'changed' | 'missing' | 'not_after' | 'not_as_noted';
	  };

const AT_ONCE = 500;

/**
 * Goes through the whole trail and makes every hash anew.
 * @param noted the number and hash of an entry as an earlier run told it: what was cut off at the end since
 *   then is not to be seen from the chain alone
 * @throws {DatabaseAwayError}
 */
export async function verifyChain(
	database: Database,
	noted?: { readonly number: number; readonly hash: string }
): Promise<Verdict> {
	let number = 0;
	let last = GENESIS;
	for (;;) {
		const entries = await asking(() => audit.entriesAfter(database, number, AT_ONCE));
		for (const entry of entries) {
			const fails = (why: 'changed' | 'missing' | 'not_after') => ({
				holds: false as const,
				number: number + 1,
				why
			});
			if (entry.number !== number + 1) return fails('missing');
			if (entry.hash_before !== last) return fails('not_after');
			if (entry.hash !== hashOf(entry)) return fails('changed');
			number = entry.number;
			last = entry.hash;
			if (noted?.number === number && noted.hash !== last)
				return { holds: false, number, why: 'not_as_noted' };
		}
		if (entries.length < AT_ONCE) break;
	}
	if (noted && noted.number > number) return { holds: false, number: number + 1, why: 'missing' };
	return { holds: true, entries: number, last };
}
