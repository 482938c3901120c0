import { z } from 'zod';
import { jobs, outbox } from './db/repositories';
import type { Ground } from './ground';
import type { JobKind, Repeated } from './jobs';

/** Throws away what has had its time. Answers how much that was. */
export type Cleaner = (ground: Ground) => Promise<number>;

const DAY_MS = 86_400_000;
const KEPT_DAYS = 30;

const longAgo = ({ clock }: Ground) => new Date(clock().getTime() - KEPT_DAYS * DAY_MS);

/** Mail that was sent or given up, and work that has ended, stay on record for thirty days. */
export const RECORD_CLEANERS: readonly Cleaner[] = [
	(ground) => outbox.forgetMails(ground.database, longAgo(ground)),
	(ground) => jobs.forgetJobs(ground.database, longAgo(ground))
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
