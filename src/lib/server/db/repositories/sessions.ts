import { Op, QueryTypes, type Transaction } from 'sequelize';
import type { Division, Role } from '../../../types';
import type { Database } from '../connection';
import type { SessionRecord } from '../models';

/** A session and whose it is, as a request needs it. */
export interface SessionOfPerson {
	readonly session: string;
	readonly way: string;
	readonly seen_at: Date;
	readonly code_given_at: Date | null;
	readonly id: string;
	readonly name: string | null;
	readonly role: Role;
	readonly areas: Division[];
	readonly paused_until: Date | null;
	readonly pause_reason: string | null;
	readonly demo: number;
	/** Whether a second factor is in force. */
	readonly factor: number;
	/** Notices in their inbox that they have not read. */
	readonly unread: number;
}

const OF_PERSON = `
	SELECT s.id AS session, s.way, s.seen_at, s.code_given_at,
		u.id, u.name, u.role, u.areas, u.paused_until, u.pause_reason, u.demo,
		EXISTS (SELECT 1 FROM second_factors f
			WHERE f.user_id = u.id AND f.confirmed_at IS NOT NULL) AS factor,
		(SELECT COUNT(*) FROM notices n
			WHERE n.user_id = u.id AND n.archived_at IS NULL AND n.read_at IS NULL) AS unread
	FROM sessions s JOIN users u ON u.id = s.user_id
	WHERE s.id = ? AND s.revoked_at IS NULL AND s.expires_at > ? AND u.deleted_at IS NULL`;

/** The session of a request, in one query by key: what every page with a session waits for. */
export async function sessionOfPerson(
	{ sequelize }: Database,
	id: string,
	now: Date
): Promise<SessionOfPerson | null> {
	const [found] = await sequelize.query<SessionOfPerson>(OF_PERSON, {
		replacements: [id, now],
		type: QueryTypes.SELECT
	});
	return found ?? null;
}

export async function addSession(
	{ models }: Database,
	session: SessionRecord,
	transaction: Transaction
): Promise<void> {
	await models.sessions.create(session, { transaction });
}

/** Writes when it was last used. */
export async function touchSession({ models }: Database, id: string, now: Date): Promise<void> {
	await models.sessions.update({ seen_at: now }, { where: { id } });
}

/** Writes that the second factor was given in it. */
export async function markCodeGiven(
	{ models }: Database,
	id: string,
	now: Date,
	transaction: Transaction
): Promise<void> {
	await models.sessions.update({ code_given_at: now }, { where: { id }, transaction });
}

const live = (now: Date) => ({ revoked_at: null, expires_at: { [Op.gt]: now } });

/** The sessions that somebody has open, the one used last first. */
export async function sessionsOf(
	{ models }: Database,
	user_id: string,
	now: Date
): Promise<SessionRecord[]> {
	const found = await models.sessions.findAll({
		where: { user_id, ...live(now) },
		order: [['seen_at', 'DESC']]
	});
	return found.map((one) => one.get({ plain: true }));
}

/** Revokes a session. Answers false when it is not theirs, or at its end already. */
export async function revokeSession(
	{ models }: Database,
	{ id, user_id }: { id: string; user_id: string },
	now: Date,
	transaction?: Transaction
): Promise<boolean> {
	const [changed] = await models.sessions.update(
		{ revoked_at: now },
		{ where: { id, user_id, ...live(now) }, transaction }
	);
	return changed > 0;
}

/** Revokes a session, whose ever it is. */
export async function revokeByHash(
	{ models }: Database,
	id: string,
	now: Date,
	transaction?: Transaction
): Promise<void> {
	await models.sessions.update(
		{ revoked_at: now },
		{ where: { id, revoked_at: null }, transaction }
	);
}

/** Revokes all sessions of somebody, but for one where told. Answers how many. */
export async function revokeSessionsOf(
	{ models }: Database,
	user_id: string,
	now: Date,
	transaction: Transaction,
	except?: string
): Promise<number> {
	const [changed] = await models.sessions.update(
		{ revoked_at: now },
		{
			where: { user_id, ...live(now), ...(except !== undefined && { id: { [Op.ne]: except } }) },
			transaction
		}
	);
	return changed;
}

/** Throws away sessions of somebody: those that are at their end, or all. */
export async function forgetSessionsOf(
	{ models }: Database,
	user_id: string,
	which: { endedBefore: Date } | 'all',
	transaction: Transaction
): Promise<void> {
	const ended =
		which === 'all'
			? {}
			: {
					[Op.or]: [
						{ expires_at: { [Op.lte]: which.endedBefore } },
						{ revoked_at: { [Op.lte]: which.endedBefore } }
					]
				};
	await models.sessions.destroy({ where: { user_id, ...ended }, transaction });
}
