import { record } from '../audit';
import { config } from '../config';
import { asking, inTransaction, type Transaction } from '../db';
import { accountTokens, sessions, users, type UserRecord } from '../db/repositories';
import type { Ground } from '../ground';
import { queueMail } from '../mail';
import { LapsedLinkError } from './errors';
import { mayWriteTo, takeRequest } from './limits';
import { issueLink, lookAtLink, LINKS, useLink } from './links';
import { hashPassword } from './passwords';
import { maySignIn } from './sign-in';
import { inSteadyTime } from './steady';

/**
 * Sends a link to choose a new password, where the address has an account. Nobody is told whether.
 * @param from the visitor's network address
 * @throws {TooOftenError} @throws {DatabaseAwayError}
 */
export const requestReset = (ground: Ground, address: string, from: string): Promise<void> =>
	inSteadyTime(async () => {
		await takeRequest(ground, 'reset', from);
		const user = await asking(() => users.userByAddress(ground.database, address));
		if (user === null || !maySignIn(user) || !(await mayWriteTo(ground, address))) return;
		await inTransaction(ground.database, async (transaction) => {
			const link = await issueLink(ground, transaction, 'reset', {
				user_id: user.id,
				address,
				detail: {}
			});
			await queueMail(
				{ ...ground, transaction },
				{
					to: { address, user_id: user.id },
					template: 'reset_password',
					data: { name: user.name, link, holds: LINKS.reset.holds },
					kind: 'access'
				}
			);
		});
	});

/** Whether a link to choose a new password holds. @throws {DatabaseAwayError} */
export const isReset = async (ground: Ground, token: string): Promise<boolean> =>
	(await asking(() => lookAtLink(ground, 'reset', token))) !== null;

/**
 * Writes a new password: whatever was signed in is signed out, other links lapse, and the owner is told.
 * @param keep a session that stays open
 */
export async function writePassword(
	ground: Ground,
	transaction: Transaction,
	user: Pick<UserRecord, 'id' | 'name' | 'email'>,
	password_hash: string,
	keep?: string
): Promise<void> {
	const { database, clock } = ground;
	await users.changeUser(database, user.id, { password_hash }, transaction);
	await sessions.revokeSessionsOf(database, user.id, clock(), transaction, keep);
	await accountTokens.forgetTokensOf(database, user.id, transaction);
	await record(ground, transaction, {
		actor: user.id,
		action: 'person.password_changed',
		subject: { kind: 'person', id: user.id }
	});
	if (user.email === null) return;
	await queueMail(
		{ ...ground, transaction },
		{
			to: { address: user.email, user_id: user.id },
			template: 'password_changed',
			data: { name: user.name, link: `${config().origin}/reset` },
			kind: 'access'
		}
	);
}

/**
 * Chooses a new password by a link from a mail. The second factor, where there is one, is asked for as before.
 * @throws {LapsedLinkError} @throws {DatabaseAwayError}
 */
export async function resetPassword(
	ground: Ground,
	token: string,
	password: string
): Promise<void> {
	const password_hash = await hashPassword(password);
	await inTransaction(ground.database, async (transaction) => {
		const link = await useLink(ground, transaction, 'reset', token);
		const user =
			link?.user_id && (await users.userById(ground.database, link.user_id, transaction));
		// An account that has moved to another address since is not opened from the old one.
		if (!user || user.email !== link.address) throw new LapsedLinkError();
		await writePassword(ground, transaction, user, password_hash);
	});
}
