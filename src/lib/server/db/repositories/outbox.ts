import { UniqueConstraintError, type Transaction } from 'sequelize';
import type { Database } from '../connection';
import type { OutboxMailRecord } from '../models';

/** A mail as it is queued. */
export type QueuedMailRecord = Omit<
	OutboxMailRecord,
	'taken_by' | 'taken_until' | 'attempts' | 'last_error' | 'sent_at' | 'failed_at'
>;

const UNSENT = {
	taken_by: null,
	taken_until: null,
	attempts: 0,
	last_error: null,
	sent_at: null,
	failed_at: null
} as const;

/** Queues a mail in the transaction that causes it. One whose `once_key` is queued already is left out. */
export async function addMail(
	{ models }: Database,
	mail: QueuedMailRecord,
	transaction: Transaction
): Promise<void> {
	try {
		await models.outbox.create({ ...mail, ...UNSENT }, { transaction });
	} catch (error) {
		if (mail.once_key === null || !(error instanceof UniqueConstraintError)) throw error;
	}
}
