import { Op, QueryTypes, UniqueConstraintError, type Transaction } from 'sequelize';
import type { Database } from '../connection';
import type { OutboxMailRecord } from '../models';
import { inTransaction } from '../transaction';
import type { Lease } from './lease';

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

/**
 * Takes the mail that has been due longest, for the time of a lease. Passes by what others take at the
 * same moment: the dialect leaves SKIP LOCKED out, so that the query is written by hand.
 */
export const takeMail = (
	database: Database,
	now: Date,
	lease: Lease
): Promise<OutboxMailRecord | null> =>
	inTransaction(
		database,
		async (transaction) => {
			const [due] = await database.sequelize.query<{ id: string }>(
				`SELECT id FROM outbox
			WHERE sent_at IS NULL AND failed_at IS NULL AND due_at <= :now
				AND (taken_until IS NULL OR taken_until <= :now)
			ORDER BY due_at LIMIT 1 FOR UPDATE SKIP LOCKED`,
				{ replacements: { now }, type: QueryTypes.SELECT, transaction }
			);
			if (!due) return null;
			const mail = await database.models.outbox.findByPk(due.id, {
				rejectOnEmpty: true,
				transaction
			});
			await mail.update(
				{
					taken_by: lease.worker,
					taken_until: lease.until,
					attempts: (mail.get('attempts') as number) + 1
				},
				{ transaction }
			);
			return mail.get({ plain: true });
		},
		{ gapsOpen: true }
	);

/** What is told of a mail that was tried; only by the worker whose lease it is. */
type Outcome = Partial<
	Pick<
		OutboxMailRecord,
		'sent_at' | 'failed_at' | 'due_at' | 'last_error' | 'body_text' | 'body_html'
	>
>;

/** Ends a lease with what came of it. Answers false when another worker has taken the mail meanwhile. */
export async function giveBackMail(
	{ models }: Database,
	id: string,
	worker: string,
	outcome: Outcome
): Promise<boolean> {
	const [changed] = await models.outbox.update(
		{ ...outcome, taken_by: null, taken_until: null },
		{ where: { id, taken_by: worker } }
	);
	return changed > 0;
}

/** Mails that were given up or could not be sent yet, newest first, without their bodies. */
export async function unsentMails(
	{ models }: Database,
	limit: number
): Promise<OutboxMailRecord[]> {
	const found = await models.outbox.findAll({
		attributes: { exclude: ['body_text', 'body_html'] },
		where: { sent_at: null, last_error: { [Op.ne]: null } },
		order: [
			['created_at', 'DESC'],
			['id', 'ASC']
		],
		limit
	});
	return found.map((one) => one.get({ plain: true }));
}

/** Throws away mails that were sent or given up before a time. Answers how many. */
export const forgetMails = ({ models }: Database, before: Date): Promise<number> =>
	models.outbox.destroy({
		where: { [Op.or]: [{ sent_at: { [Op.lt]: before } }, { failed_at: { [Op.lt]: before } }] }
	});

/** Mails about somebody's account, oldest first, without their bodies. */
export const mailsTo = async (
	{ models }: Database,
	user_id: string
): Promise<Pick<OutboxMailRecord, 'recipient' | 'subject' | 'created_at' | 'sent_at'>[]> => {
	const found = await models.outbox.findAll({
		attributes: ['recipient', 'subject', 'created_at', 'sent_at'],
		where: { user_id },
		order: ['created_at', 'id']
	});
	return found.map((one) => one.get({ plain: true }));
};

/** Throws away all mails about somebody's account, sent or not. */
export async function forgetMailsTo(
	{ models }: Database,
	user_id: string,
	transaction: Transaction
): Promise<void> {
	await models.outbox.destroy({ where: { user_id }, transaction });
}
