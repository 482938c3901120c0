import { requireMember, type Actor } from '../actor';
import { record } from '../audit';
import { config } from '../config';
import { asking, inTransaction } from '../db';
import { accountTokens, users } from '../db/repositories';
import type { Ground } from '../ground';
import { queueMail } from '../mail';
import { LapsedLinkError } from './errors';
import { mayWriteTo } from './limits';
import { issueLink, lookAtLink, LINKS, useLink } from './links';
import { requireOwnPassword } from './profile';
import { inSteadyTime } from './steady';

/**
 * Asks that an account move to another address. That one is written to; nothing changes until it is confirmed.
 * Whether it has an account already, only its owner is told.
 * @throws {SignInNeededError} @throws {WrongPasswordError} @throws {TooOftenError}
 */
export async function requestNewAddress(
	ground: Ground,
	actor: Actor,
	{ address, password }: { address: string; password: string }
): Promise<void> {
	requireMember(actor);
	const user = await requireOwnPassword(ground, actor, password);
	await inSteadyTime(async () => {
		if (!(await mayWriteTo(ground, address))) return;
		await inTransaction(ground.database, async (transaction) => {
			const causing = { ...ground, transaction };
			const other = await users.userByAddress(ground.database, address, transaction);
			if (other !== null) {
				await queueMail(causing, {
					to: { address, user_id: other.id },
					template: 'already_member',
					data: { name: other.name, link: `${config().origin}/signin` },
					kind: 'access'
				});
				return;
			}
			const link = await issueLink(ground, transaction, 'new_address', {
				user_id: actor.id,
				address,
				detail: {}
			});
			await queueMail(causing, {
				to: { address, user_id: null },
				template: 'confirm_new_address',
				data: { name: user.name, link, holds: LINKS.new_address.holds },
				kind: 'access'
			});
		});
	});
}

/** To which address a link moves an account; null when it does so no longer. @throws {DatabaseAwayError} */
export async function lookAtNewAddress(ground: Ground, token: string): Promise<string | null> {
	const link = await asking(() => lookAtLink(ground, 'new_address', token));
	return link?.address ?? null;
}

/**
 * Moves an account to its new address, by the link that was sent there. The address that it leaves is told.
 * @throws {LapsedLinkError} @throws {DatabaseAwayError}
 */
export async function confirmNewAddress(ground: Ground, token: string): Promise<void> {
	const { database, clock } = ground;
	await inTransaction(database, async (transaction) => {
		const link = await useLink(ground, transaction, 'new_address', token);
		const user = link?.user_id && (await users.userById(database, link.user_id, transaction));
		if (!user) throw new LapsedLinkError();
		const moved = await users.changeUser(
			database,
			user.id,
			{ email: link.address, email_verified_at: clock() },
			transaction
		);
		// Somebody has opened an account with it since.
		if (!moved) throw new LapsedLinkError();
		await accountTokens.forgetTokensOf(database, user.id, transaction);
		await record(ground, transaction, {
			actor: user.id,
			action: 'person.address_changed',
			subject: { kind: 'person', id: user.id }
		});
		if (user.email === null) return;
		await queueMail(
			{ ...ground, transaction },
			{
				to: { address: user.email, user_id: user.id },
				template: 'address_changed',
				data: { name: user.name, link: `${config().origin}/help/your-account-and-your-data` },
				kind: 'access'
			}
		);
	});
}
