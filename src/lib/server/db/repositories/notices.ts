import { Op, type Transaction } from 'sequelize';
import type { Database } from '../connection';
import type { NoticePreferenceRecord, NoticeRecord } from '../models';

export type NewNotice = Omit<NoticeRecord, 'read_at' | 'archived_at' | 'digested_at'>;

export async function addNotice(
	{ models }: Database,
	notice: NewNotice,
	transaction: Transaction
): Promise<void> {
	await models.notices.create(
		{ ...notice, read_at: null, archived_at: null, digested_at: null },
		{ transaction }
	);
}

/** Somebody's notices, newest first: those in the inbox, or those in the archive. */
export async function noticesOf(
	{ models }: Database,
	user_id: string,
	{ archived, limit }: { archived: boolean; limit: number }
): Promise<NoticeRecord[]> {
	const found = await models.notices.findAll({
		where: { user_id, archived_at: archived ? { [Op.ne]: null } : null },
		order: [
			['created_at', 'DESC'],
			['id', 'ASC']
		],
		limit
	});
	return found.map((one) => one.get({ plain: true }));
}

/** All of somebody's notices, oldest first: for their own copy. */
export async function allNoticesOf({ models }: Database, user_id: string): Promise<NoticeRecord[]> {
	const found = await models.notices.findAll({ where: { user_id }, order: ['created_at', 'id'] });
	return found.map((one) => one.get({ plain: true }));
}

export async function noticeOf(
	{ models }: Database,
	{ id, user_id }: { id: string; user_id: string }
): Promise<NoticeRecord | null> {
	const found = await models.notices.findOne({ where: { id, user_id } });
	return found && found.get({ plain: true });
}

/** Marks notices of somebody as read: one, or all in the inbox. */
export async function markRead(
	{ models }: Database,
	user_id: string,
	which: string | 'all',
	now: Date
): Promise<void> {
	await models.notices.update(
		{ read_at: now },
		{
			where: {
				user_id,
				read_at: null,
				...(which === 'all' ? { archived_at: null } : { id: which })
			}
		}
	);
}

/** Moves one notice of somebody to the archive, read by then; or back. Answers false when there is none. */
export async function moveNotice(
	{ models }: Database,
	{ id, user_id }: { id: string; user_id: string },
	archived_at: Date | null
): Promise<boolean> {
	const found = await models.notices.findOne({ where: { id, user_id } });
	if (found === null) return false;
	const read_at = (found.get('read_at') as Date | null) ?? archived_at;
	await found.update({ archived_at, read_at });
	return true;
}

/** What somebody wants otherwise than usual. */
export async function preferencesOf(
	{ models }: Database,
	user_id: string,
	transaction?: Transaction
): Promise<NoticePreferenceRecord[]> {
	const found = await models.noticePreferences.findAll({ where: { user_id }, transaction });
	return found.map((one) => one.get({ plain: true }));
}

export async function putPreferences(
	{ models }: Database,
	preferences: readonly NoticePreferenceRecord[],
	transaction: Transaction
): Promise<void> {
	for (const preference of preferences)
		await models.noticePreferences.upsert(preference, { transaction });
}

/** Who has notices for the daily mail that came before a time. */
export async function waitingForDigest({ models }: Database, before: Date): Promise<string[]> {
	const found = await models.notices.findAll({
		attributes: ['user_id'],
		where: { mail: 'digest', digested_at: null, created_at: { [Op.lt]: before } },
		group: 'user_id',
		raw: true
	});
	return (found as unknown as Pick<NoticeRecord, 'user_id'>[]).map(({ user_id }) => user_id);
}

/** Takes somebody's notices for the daily mail, oldest first; no other daily mail takes them again. */
export async function takeForDigest(
	{ models }: Database,
	user_id: string,
	before: Date,
	now: Date,
	transaction: Transaction
): Promise<NoticeRecord[]> {
	const found = await models.notices.findAll({
		where: { user_id, mail: 'digest', digested_at: null, created_at: { [Op.lt]: before } },
		order: ['created_at', 'id'],
		lock: true,
		transaction
	});
	const notices = found.map((one) => one.get({ plain: true }));
	await models.notices.update(
		{ digested_at: now },
		{ where: { id: notices.map(({ id }) => id) }, transaction }
	);
	return notices;
}

/** Throws away all that somebody was told, and how they wanted it. */
export async function forgetNoticesOf(
	{ models }: Database,
	user_id: string,
	transaction: Transaction
): Promise<void> {
	await models.notices.destroy({ where: { user_id }, transaction });
	await models.noticePreferences.destroy({ where: { user_id }, transaction });
}

/** Throws away what was archived before a time. Answers how much. */
export const forgetArchived = ({ models }: Database, before: Date): Promise<number> =>
	models.notices.destroy({ where: { archived_at: { [Op.lt]: before } } });
