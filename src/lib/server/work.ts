/** All that a worker knows how to do, and what it does again and again. */
import { LINK_CLEANERS } from './accounts';
import { cleanUpKind, EVERY_HOUR, RECORD_CLEANERS } from './clean-up';
import { checkFileKind, giveUpAbandoned, queueRemoval, removeFilesKind, type Store } from './files';
import { digestKind, EVERY_MORNING } from './inbox';
import type { JobKind, Repeated } from './jobs';
import { COUNTER_CLEANERS } from './limits';

const CLEANERS = [
	...RECORD_CLEANERS,
	...LINK_CLEANERS,
	...COUNTER_CLEANERS,
	giveUpAbandoned,
	async (ground) => {
		await queueRemoval(ground);
		return 0;
	}
] satisfies Parameters<typeof cleanUpKind>[0];

/** @param store where files are kept */
export const kindsFor = (store: Store): readonly JobKind[] => [
	checkFileKind(store),
	removeFilesKind(store),
	digestKind,
	cleanUpKind(CLEANERS)
];

export const REPEATED: readonly Repeated[] = [EVERY_HOUR, EVERY_MORNING];
