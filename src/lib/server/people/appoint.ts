import { record } from '../audit';
import { inTransaction } from '../db';
import { users } from '../db/repositories';
import type { Ground } from '../ground';
import { UnknownPersonError } from './errors';

/**
 * Makes somebody an administrator: for whoever stands at the console of an installation that has none yet.
 * @param address as `mailAddressSchema` gives it; the account has to be there
 * @throws {UnknownPersonError} @throws {DatabaseAwayError}
 */
export async function appointAdministrator(ground: Ground, address: string): Promise<void> {
	await inTransaction(ground.database, async (transaction) => {
		const user = await users.userByAddress(ground.database, address, transaction);
		if (user === null) throw new UnknownPersonError();
		const role = 'administrator';
		await users.changeUser(ground.database, user.id, { role, areas: [] }, transaction);
		await record(ground, transaction, {
			actor: null,
			action: 'person.role_changed',
			subject: { kind: 'person', id: user.id },
			detail: { from: user.role, to: role, areas_from: user.areas, areas_to: [] }
		});
	});
}
