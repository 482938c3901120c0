import { audit, type AuditDetail } from '../db/repositories';
import type { Ground } from '../ground';
import type { Transaction } from '../db';
import { GENESIS, hashOf } from './hash';

/** Something that was done, by whom, to what. */
export interface Deed {
	/** Id of a person; null for the product itself and for whoever stands at its console. */
	readonly actor: string | null;
	/** As `person.role_changed`. */
	readonly action: string;
	readonly subject: { readonly kind: 'person'; readonly id: string };
	readonly detail?: AuditDetail;
}

/**
 * Writes an entry, in the transaction that does what it tells. Entries of transactions at the same time follow
 * one another: the later one waits, or is run again.
 */
export async function record(
	{ database, clock }: Ground,
	transaction: Transaction,
	{ actor, action, subject, detail = {} }: Deed
): Promise<void> {
	const before = await audit.lockNewestEntry(database, transaction);
	const entry = {
		number: (before?.number ?? 0) + 1,
		hash_before: before?.hash ?? GENESIS,
		actor,
		action,
		subject_kind: subject.kind,
		subject_id: subject.id,
		detail,
		at: clock()
	};
	await audit.appendEntry(database, { ...entry, hash: hashOf(entry) }, transaction);
}
