import { randomBytes } from 'node:crypto';
import type { Transaction } from '../db';
import { jobs } from '../db/repositories';
import type { Ground } from '../ground';

export interface Work {
	readonly kind: string;
	/** JSON, in the shape of its kind. */
	readonly payload: unknown;
	/** For whom; null for what the product does of its own accord. */
	readonly user_id: string | null;
	/** Not before; at once when left out. */
	readonly dueAt?: Date;
	/** Two pieces of one key are one, for as long as the first is on record. */
	readonly onceKey?: string;
}

/**
 * Queues work, in the transaction that causes it where there is one.
 * @returns its id; null when work of the same key is on record already
 */
export async function queueJob(
	{ database, clock, transaction }: Ground & { readonly transaction?: Transaction },
	{ kind, payload, user_id, dueAt, onceKey }: Work
): Promise<string | null> {
	const now = clock();
	const id = randomBytes(16).toString('hex');
	const job = {
		id,
		kind,
		payload,
		user_id,
		once_key: onceKey ?? null,
		created_at: now,
		due_at: dueAt ?? now
	};
	return (await jobs.addJob(database, job, transaction)) ? id : null;
}
