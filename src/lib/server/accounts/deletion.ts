import { requireMember, type Actor } from '../actor';
import { record } from '../audit';
import { inTransaction, type Transaction } from '../db';
import { accountTokens, secondFactors, sessions, users } from '../db/repositories';
import type { Ground } from '../ground';
import { queueMail } from '../mail';
import { BELONGINGS } from './belongings';
import { LastAdministratorError } from './errors';
import { requireOwnPassword } from './profile';

/** @throws {LastAdministratorError} when nobody else would be left to appoint one */
export async function requireOtherAdministrator(
	{ database }: Ground,
	transaction: Transaction,
	id: string
): Promise<void> {
	const administrators = await users.lockRole(database, 'administrator', transaction);
	if (administrators.includes(id) && administrators.length === 1)
		throw new LastAdministratorError();
}

/**
 * Deletes the account of who is signed in. Name, address and all that is theirs go; the row stays without them,
 * so that corrections and the audit trail stand under "a former member".
 * @throws {SignInNeededError} @throws {WrongPasswordError} @throws {TooOftenError} @throws {LastAdministratorError}
 */
export async function deleteOwnAccount(
	ground: Ground,
	actor: Actor,
	password: string
): Promise<void> {
	requireMember(actor);
	const { database, clock } = ground;
	const user = await requireOwnPassword(ground, actor, password);
	await inTransaction(database, async (transaction) => {
		await requireOtherAdministrator(ground, transaction, user.id);
		await sessions.forgetSessionsOf(database, user.id, 'all', transaction);
		await accountTokens.forgetTokensOf(database, user.id, transaction);
		await secondFactors.removeFactor(database, user.id, transaction);
		for (const { remove } of BELONGINGS) await remove(ground, transaction, user.id);
		await users.changeUser(
			database,
			user.id,
			{
				name: null,
				email: null,
				email_verified_at: null,
				password_hash: null,
				role: 'member',
				areas: [],
				paused_until: null,
				pause_reason: null,
				deleted_at: clock()
			},
			transaction
		);
		await record(ground, transaction, {
			actor: user.id,
			action: 'person.left',
			subject: { kind: 'person', id: user.id }
		});
		if (user.email === null) return;
		await queueMail(
			{ ...ground, transaction },
			{
				to: { address: user.email, user_id: null },
				template: 'account_deleted',
				data: { name: user.name },
				kind: 'access'
			}
		);
	});
}
