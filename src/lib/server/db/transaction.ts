import { setTimeout as pause } from 'node:timers/promises';
import { DatabaseError, Transaction } from 'sequelize';
import type { Database } from './connection';
import { asking } from './errors';

export type { Transaction };

export interface TransactionOptions {
	/** Locks the rows that are met and not the gaps between them, where others may go on adding. */
	readonly gapsOpen?: boolean;
}

const LOCK_WAIT_TIMEOUT = 1205;
const DEADLOCK = 1213;
const ATTEMPTS = 6;

/** Whether the whole transaction may be tried again: it lost against another one. */
function lostARace(error: unknown): boolean {
	if (!(error instanceof DatabaseError)) return false;
	const { errno } = error.parent as { errno?: number };
	return errno === LOCK_WAIT_TIMEOUT || errno === DEADLOCK;
}

/**
 * Runs a whole transaction, again from its beginning when it lost against another one: in a deadlock,
 * by waiting too long, or at commit, where a cluster reports its conflicts. `work` must therefore
 * have no effect outside the database.
 * @throws what `work` threw, or the last lost race after six attempts
 * @throws {DatabaseAwayError}
 */
export async function inTransaction<T>(
	database: Database,
	work: (transaction: Transaction) => Promise<T>,
	{ gapsOpen = false }: TransactionOptions = {}
): Promise<T> {
	const isolationLevel = gapsOpen ? Transaction.ISOLATION_LEVELS.READ_COMMITTED : undefined;
	for (let attempt = 1; ; attempt += 1) {
		try {
			return await asking(() => database.sequelize.transaction({ isolationLevel }, work));
		} catch (error) {
			if (attempt === ATTEMPTS || !lostARace(error)) throw error;
			// Two that collided must not meet again in step.
			await pause(Math.random() * 20 * 2 ** attempt);
		}
	}
}
