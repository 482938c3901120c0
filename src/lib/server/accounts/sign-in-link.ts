import { asking, inTransaction } from '../db';
import { users, type UserRecord } from '../db/repositories';
import type { Ground } from '../ground';
import { queueMail } from '../mail';
import { mayWriteTo, takeRequest } from './limits';
import { issueLink, LINKS, useLinkByHash } from './links';
import { maySignIn } from './sign-in';

/** Whose address it is, where they may sign in; null otherwise. */
export async function signInUser(
	{ database }: Ground,
	address: string
): Promise<Pick<UserRecord, 'id' | 'name' | 'email'> | null> {
	const user = await asking(() => users.userByAddress(database, address));
	return user !== null && maySignIn(user) ? user : null;
}

/** Counts that somebody has a sign-in link sent. @throws {TooOftenError} */
export const takeLinkRequest = (ground: Ground, from: string): Promise<void> =>
	takeRequest(ground, 'sign_in_link', from);

/**
 * Queues a sign-in link, where the address has an account and was not written to too often.
 * @param token as the sign-in library has made it
 */
export async function sendSignInLink(
	ground: Ground,
	address: string,
	token: string
): Promise<void> {
	const user = await signInUser(ground, address);
	if (user === null || !(await mayWriteTo(ground, address))) return;
	const link = { user_id: user.id, address, detail: {} };
	await inTransaction(ground.database, async (transaction) => {
		const data = {
			name: user.name,
			link: await issueLink(ground, transaction, 'sign_in', link, token),
			holds: LINKS.sign_in.holds
		};
		await queueMail(
			{ ...ground, transaction },
			{ to: { address, user_id: user.id }, template: 'sign_in_link', data, kind: 'access' }
		);
	});
}

/** Uses a sign-in link up, by the hash of its token. Answers the address that it was sent to, or null. */
export async function useSignInLink(ground: Ground, hash: string): Promise<string | null> {
	const link = await inTransaction(ground.database, (transaction) =>
		useLinkByHash(ground, transaction, 'sign_in', hash)
	);
	return link?.address ?? null;
}
