import { z } from 'zod';
import { jobs, notices, outbox } from './db/repositories';
import type { Ground } from './ground';
import type { JobKind, Repeated } from './jobs';

/** Throws away what has had its time. Answers how much that was. */
export type Cleaner = (ground: Ground) => Promise<number>;

const DAY_MS = 86_400_000;

const daysAgo = ({ clock }: Ground, days: number) => new Date(clock().getTime() - days * DAY_MS);

/**
 * Mail that was sent or given up, and work that has ended, stay on record for thirty days; notices that were put away,
 * for a year.
 */
export const RECORD_CLEANERS: readonly Cleaner[] = [
	(ground) => outbox.forgetMails(ground.database, daysAgo(ground, 30)),
	(ground) => jobs.forgetJobs(ground.database, daysAgo(ground, 30)),
	(ground) => notices.forgetArchived(ground.database, daysAgo(ground, 365))
];

const KIND = 'clean_up';

/** Runs all cleaners, one after the other. */
export const cleanUpKind = (cleaners: readonly Cleaner[]): JobKind => ({
	kind: KIND,
	payload: z.unknown(),
	async run({ database, clock, report }) {
		for (const [index, clean] of cleaners.entries()) {
			await clean({ database, clock });
			await report({ done: index + 1, of: cleaners.length });
		}
	}
});

export const EVERY_HOUR: Repeated = { kind: KIND, every: 3_600_000 };
