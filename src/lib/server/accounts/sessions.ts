import { requireMember, VISITOR, type Actor } from '../actor';
import { config } from '../config';
import { asking, inTransaction, type Transaction } from '../db';
import { sessions, type SessionOfPerson } from '../db/repositories';
import type { Ground } from '../ground';
import { UnknownSessionError } from './errors';
import { hashOfSecret, installationSecret, newSecret } from './secrets';
import { readSessionToken } from './session-token';

/** A session ends after so long, however much it is used. */
export const SESSION_DAYS = 30;
const DAY_MS = 86_400_000;
/** "Last used" is written this often and no oftener. */
const SEEN_EVERY_MS = 3_600_000;

export interface NewSession {
	readonly user_id: string;
	/** By what somebody got in: `password` or `link`. */
	readonly way: string;
	readonly device: string;
	/** The second factor was given on the way in. */
	readonly codeGiven: boolean;
	/** The cookie that the browser had until now: its session ends. */
	readonly before: string | undefined;
}

/**
 * Opens a session. Its secret is new each time: whatever cookie a browser came with is worth nothing
 * afterwards, so that nobody can prepare one for somebody else.
 * @returns the secret, which only the cookie carries
 */
export async function openSession(
	ground: Ground,
	{ user_id, way, device, codeGiven, before }: NewSession
): Promise<string> {
	const { database, clock } = ground;
	const sid = newSecret();
	await inTransaction(database, async (transaction) => {
		const now = clock();
		await sessions.forgetSessionsOf(database, user_id, { endedBefore: now }, transaction);
		if (before !== undefined) await endByCookie(ground, before, transaction);
		await sessions.addSession(
			database,
			{
				id: hashOfSecret(sid),
				user_id,
				device,
				way,
				code_given_at: codeGiven ? now : null,
				created_at: now,
				seen_at: now,
				expires_at: new Date(now.getTime() + SESSION_DAYS * DAY_MS),
				revoked_at: null
			},
			transaction
		);
	});
	return sid;
}

/** The session that a cookie names, while it holds. */
async function sessionOf({ database, clock }: Ground, cookie: string) {
	const now = clock();
	const sid = readSessionToken(installationSecret(), cookie, now);
	if (sid === null) return null;
	const found = await asking(() => sessions.sessionOfPerson(database, hashOfSecret(sid), now));
	if (found === null) return null;
	// With a password that stands on the sign-in page, nobody gets in where no demonstration runs.
	return found.demo && !config().demo ? null : found;
}

/**
 * Who asks, by the cookie of the request. The person's role is asked anew each time, so that a
 * change counts from the next request on.
 * @throws {DatabaseAwayError}
 */
export async function actorOf(ground: Ground, cookie: string | undefined): Promise<Actor> {
	if (cookie === undefined) return VISITOR;
	const found = await sessionOf(ground, cookie);
	if (found === null) return VISITOR;
	if (found.factor && found.code_given_at === null) return { ...VISITOR, awaitsCode: true };
	const now = ground.clock();
	if (now.getTime() - found.seen_at.getTime() > SEEN_EVERY_MS)
		await asking(() => sessions.touchSession(ground.database, found.session, now));
	return personOf(found, now);
}

function personOf(found: SessionOfPerson, now: Date): Actor {
	const needsFactor = found.role !== 'member' && !found.factor && !config().demo;
	const { paused_until: until } = found;
	return {
		id: found.id,
		name: found.name ?? '',
		role: needsFactor ? 'member' : found.role,
		granted: found.role,
		areas: found.areas,
		paused: until !== null && until > now ? { until, reason: found.pause_reason ?? '' } : null,
		session: found.session,
		unread: found.unread
	};
}

/** Whose code is asked for, by the cookie of a sign-in that is not complete; null for any other. */
export async function awaitingCode(
	ground: Ground,
	cookie: string | undefined
): Promise<{ user_id: string; way: string } | null> {
	const found = cookie === undefined ? null : await sessionOf(ground, cookie);
	if (!found?.factor || found.code_given_at !== null) return null;
	return { user_id: found.id, way: found.way };
}

/** Ends the session of a cookie, whose ever it is: signing out. */
export async function endByCookie(
	{ database, clock }: Ground,
	cookie: string,
	transaction?: Transaction
): Promise<void> {
	const now = clock();
	const sid = readSessionToken(installationSecret(), cookie, now);
	if (sid === null) return;
	await asking(() => sessions.revokeByHash(database, hashOfSecret(sid), now, transaction));
}

/** A session as its owner sees it. */
export interface SessionShown {
	readonly id: string;
	readonly device: string;
	readonly way: string;
	readonly since: Date;
	readonly seen: Date;
	/** The one that they ask from. */
	readonly here: boolean;
}

/** The sessions that somebody has open. @throws {SignInNeededError} @throws {DatabaseAwayError} */
export async function ownSessions(
	{ database, clock }: Ground,
	actor: Actor
): Promise<SessionShown[]> {
	requireMember(actor);
	const found = await asking(() => sessions.sessionsOf(database, actor.id, clock()));
	return found.map(({ id, device, way, created_at, seen_at }) => ({
		id,
		device,
		way,
		since: created_at,
		seen: seen_at,
		here: id === actor.session
	}));
}

/** Ends one session of somebody's own, at once. @throws {SignInNeededError} @throws {UnknownSessionError} */
export async function endOwnSession(
	{ database, clock }: Ground,
	actor: Actor,
	id: string
): Promise<void> {
	requireMember(actor);
	const ended = await asking(() =>
		sessions.revokeSession(database, { id, user_id: actor.id }, clock())
	);
	if (!ended) throw new UnknownSessionError();
}

/** Ends all sessions of somebody's own, this one among them. @throws {SignInNeededError} */
export async function endAllOwnSessions({ database, clock }: Ground, actor: Actor): Promise<void> {
	requireMember(actor);
	await inTransaction(database, (transaction) =>
		sessions.revokeSessionsOf(database, actor.id, clock(), transaction)
	);
}
