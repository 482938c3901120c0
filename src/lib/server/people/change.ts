import { day } from '../../format/editions';
import type { NoticeTemplate } from '../../text/en/notices';
import type { Division, Role } from '../../types';
import { requireOtherAdministrator } from '../accounts';
import { requireAdministrator, type Actor, type Person } from '../actor';
import { record } from '../audit';
import { inTransaction, type Transaction } from '../db';
import { sessions, users, type AuditDetail, type UserRecord } from '../db/repositories';
import type { Ground } from '../ground';
import { giveNotice, type Notice } from '../inbox';
import { ChangedMeanwhileError, OwnAccountError, UnknownPersonError } from './errors';

/** Whom a change is about, and the version of them that was seen. */
export interface Seen {
	readonly id: string;
	readonly version: number;
}

interface Change<Template extends NoticeTemplate> {
	readonly action: string;
	readonly changes: Partial<UserRecord>;
	readonly detail: AuditDetail;
	/** What they are told of it. */
	readonly notice: Omit<Notice<Template>, 'user_id'>;
}

/** Changes somebody other than who asks, writes it down, and tells them. */
async function changePerson<Template extends NoticeTemplate>(
	ground: Ground,
	actor: Person,
	{ id, version }: Seen,
	decide: (
		user: UserRecord,
		transaction: Transaction
	) => Promise<Change<Template>> | Change<Template>
): Promise<void> {
	if (id === actor.id) throw new OwnAccountError();
	await inTransaction(ground.database, async (transaction) => {
		const user = await users.userById(ground.database, id, transaction);
		if (user === null) throw new UnknownPersonError();
		const { action, changes, detail, notice } = await decide(user, transaction);
		if (!(await users.changeUser(ground.database, id, changes, transaction, version)))
			throw new ChangedMeanwhileError();
		await record(ground, transaction, {
			actor: actor.id,
			action,
			subject: { kind: 'person', id },
			detail
		});
		await giveNotice({ ...ground, transaction }, { user_id: id, ...notice });
	});
}

/**
 * Gives somebody another role. It counts from their next request on. Only a moderator has areas.
 * @throws what `requireAdministrator` throws @throws {OwnAccountError} @throws {UnknownPersonError}
 * @throws {ChangedMeanwhileError} @throws {LastAdministratorError}
 */
export async function setRole(
	ground: Ground,
	actor: Actor,
	seen: Seen,
	{ role, areas }: { role: Role; areas: readonly Division[] }
): Promise<void> {
	requireAdministrator(actor);
	const kept = role === 'moderator' ? [...areas] : [];
	await changePerson(ground, actor, seen, async (user, transaction) => {
		if (role !== 'administrator') await requireOtherAdministrator(ground, transaction, user.id);
		return {
			action: 'person.role_changed',
			changes: { role, areas: kept },
			detail: { from: user.role, to: role, areas_from: user.areas, areas_to: kept },
			notice: { template: 'role_changed' as const, data: { role, areas: kept } }
		};
	});
}

/**
 * Lets somebody write nothing until a time. They still read, and take away what is theirs.
 * @param reason is shown to them, and stays on record
 * @throws as `setRole`
 */
export async function pausePerson(
	ground: Ground,
	actor: Actor,
	seen: Seen,
	{ until, reason }: { until: Date; reason: string }
): Promise<void> {
	requireAdministrator(actor);
	await changePerson(ground, actor, seen, () => ({
		action: 'person.paused',
		changes: { paused_until: until, pause_reason: reason },
		detail: { until: until.toISOString(), reason },
		notice: {
			template: 'paused' as const,
			data: { until: day(until.toISOString()), reason }
		}
	}));
}

/** Ends a pause before its time. @throws as `setRole` */
export async function resumePerson(ground: Ground, actor: Actor, seen: Seen): Promise<void> {
	requireAdministrator(actor);
	await changePerson(ground, actor, seen, () => ({
		action: 'person.resumed',
		changes: { paused_until: null, pause_reason: null },
		detail: {},
		notice: { template: 'resumed' as const, data: {} }
	}));
}

/**
 * Signs somebody out: one session, or all. It holds from their next request on.
 * @throws what `requireAdministrator` throws @throws {UnknownPersonError}
 */
export async function endSessionsOf(
	ground: Ground,
	actor: Actor,
	id: string,
	session: string | 'all'
): Promise<void> {
	requireAdministrator(actor);
	const { database, clock } = ground;
	await inTransaction(database, async (transaction) => {
		if ((await users.userById(database, id, transaction)) === null) throw new UnknownPersonError();
		const now = clock();
		const ended =
			session === 'all'
				? await sessions.revokeSessionsOf(database, id, now, transaction)
				: Number(
						await sessions.revokeSession(database, { id: session, user_id: id }, now, transaction)
					);
		if (ended === 0) return;
		await record(ground, transaction, {
			actor: actor.id,
			action: 'person.sessions_ended',
			subject: { kind: 'person', id },
			detail: { sessions: ended }
		});
	});
}
