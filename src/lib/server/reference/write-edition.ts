import type { EditionCause } from '../../types';
import type { Database, Transaction } from '../db';
import { claims, editions, referenceRows, sources } from '../db/repositories';
import { digestOf } from './digest';
import type { Entries } from './entries';
import type { ContentChanges } from './merge';

export interface NewEdition {
	/** The newest edition, as `lockNewestEdition` answered in this transaction; 0 before the first. */
	readonly after: number;
	readonly cause: EditionCause;
	readonly cause_id: string | null;
	readonly credits: readonly string[] | null;
	readonly changes: ContentChanges;
	/** Everything that is live once the changes are made. */
	readonly entries: Entries;
	readonly made_at: Date;
}

/**
 * Writes the next edition: its head, new versions of what changed, ends of what was replaced or retired.
 * @returns its number
 */
export async function writeEdition(
	database: Database,
	{ after, cause, cause_id, credits, changes, entries, made_at }: NewEdition,
	transaction: Transaction
): Promise<number> {
	const number = after + 1;
	const digest = digestOf(entries);
	const parent = after === 0 ? null : after;
	await editions.addEdition(
		database,
		{ number, parent, digest, cause, cause_id, credits, made_at },
		transaction
	);
	await sources.closeSources(database, changes.sources.retire, number, transaction);
	await sources.putSources(database, changes.sources.put, number, transaction);
	await referenceRows.closeRows(database, changes.rows.retire, number, transaction);
	await referenceRows.putRows(database, changes.rows.put, number, transaction);
	await claims.closeClaims(database, changes.claims.retire, number, transaction);
	await claims.putClaims(database, changes.claims.put, number, transaction);
	return number;
}
