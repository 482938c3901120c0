import { NOTICE_KINDS, type NoticeKind, type NoticeMail } from '../../types';
import { requireMember, type Actor } from '../actor';
import { config } from '../config';
import { asking, inTransaction, type Transaction } from '../db';
import { notices, users } from '../db/repositories';
import type { Ground } from '../ground';
import { readUnsubscribeToken, type Unsubscription } from '../mail';

/** How each kind of notice comes by mail. In the inbox all of them stand. */
export type NoticePreferences = Readonly<Record<NoticeKind, NoticeMail>>;

/** How they come to who has chosen nothing. */
const USUAL: NoticePreferences = { account: 'each', work: 'off' };

/** How somebody wants to have notices by mail. */
export async function preferencesOf(
	{ database }: Ground,
	user_id: string,
	transaction?: Transaction
): Promise<NoticePreferences> {
	const chosen = await notices.preferencesOf(database, user_id, transaction);
	return { ...USUAL, ...Object.fromEntries(chosen.map(({ kind, mail }) => [kind, mail])) };
}

/** How who asks wants to have notices by mail. @throws {SignInNeededError} @throws {DatabaseAwayError} */
export async function ownPreferences(ground: Ground, actor: Actor): Promise<NoticePreferences> {
	requireMember(actor);
	return asking(() => preferencesOf(ground, actor.id));
}

/** Changes how who asks wants to have notices by mail. @throws {SignInNeededError} @throws {DatabaseAwayError} */
export async function setOwnPreferences(
	{ database }: Ground,
	actor: Actor,
	chosen: NoticePreferences
): Promise<void> {
	requireMember(actor);
	await inTransaction(database, (transaction) =>
		notices.putPreferences(
			database,
			NOTICE_KINDS.map((kind) => ({ user_id: actor.id, kind, mail: chosen[kind] })),
			transaction
		)
	);
}

/** What the link in a mail would turn off, and for whom; null when the link is none of ours. */
export function lookAtUnsubscription(token: string): Unsubscription | null {
	const { authSecret } = config();
	return authSecret === undefined ? null : readUnsubscribeToken(authSecret, token);
}

/**
 * Turns a kind of mail off for whoever holds one: the link in it is signed, so that no sign-in is asked for.
 * Doing it twice changes nothing.
 * @returns false when the link is none of ours
 * @throws {DatabaseAwayError}
 */
export async function unsubscribe(ground: Ground, token: string): Promise<boolean> {
	const asked = lookAtUnsubscription(token);
	if (asked === null) return false;
	const { database } = ground;
	const { user_id, kind } = asked;
	await inTransaction(database, async (transaction) => {
		if ((await users.userById(database, user_id, transaction)) === null) return;
		const now = await preferencesOf(ground, user_id, transaction);
		const off = NOTICE_KINDS.filter((one) =>
			kind === 'digest' ? now[one] === 'digest' : one === kind
		);
		await notices.putPreferences(
			database,
			off.map((one) => ({ user_id, kind: one, mail: 'off' })),
			transaction
		);
	});
	return true;
}
