import { z } from 'zod';
import { record } from '../audit';
import { config } from '../config';
import { asking, inTransaction } from '../db';
import { users } from '../db/repositories';
import type { Ground } from '../ground';
import { queueMail } from '../mail';
import { LapsedLinkError } from './errors';
import { mayWriteTo, takeRequest } from './limits';
import { issueLink, lookAtLink, LINKS, useLink } from './links';
import { hashPassword } from './passwords';
import { newId } from './secrets';
import { inSteadyTime } from './steady';

/** The license that whatever somebody contributes is under. */
export const DATA_LICENSE = 'CC BY-SA 4.0';

export interface SignUp {
	/** As `personNameSchema` gives it. */
	readonly name: string;
	/** As `mailAddressSchema` gives it. */
	readonly address: string;
	/** The visitor's network address. */
	readonly from: string;
}

const detailSchema = z.object({ name: z.string(), license: z.string(), at: z.iso.datetime() });
type Detail = z.output<typeof detailSchema>;

/**
 * Writes to an address that somebody wants an account for; who calls this has their consent to the license.
 * Nothing is made yet, and nobody is told whether the address has an account: its owner is.
 * @throws {TooOftenError} @throws {DatabaseAwayError}
 */
export const requestSignUp = (ground: Ground, { name, address, from }: SignUp): Promise<void> =>
	inSteadyTime(async () => {
		await takeRequest(ground, 'sign_up', from);
		if (!(await mayWriteTo(ground, address))) return;
		await inTransaction(ground.database, async (transaction) => {
			const causing = { ...ground, transaction };
			const user = await users.userByAddress(ground.database, address, transaction);
			if (user !== null) {
				const link = `${config().origin}/signin`;
				await queueMail(causing, {
					to: { address, user_id: user.id },
					template: 'already_member',
					data: { name: user.name, link },
					kind: 'access'
				});
				return;
			}
			const link = await issueLink<Detail>(ground, transaction, 'sign_up', {
				user_id: null,
				address,
				detail: { name, license: DATA_LICENSE, at: ground.clock().toISOString() }
			});
			await queueMail(causing, {
				to: { address, user_id: null },
				template: 'confirm_address',
				data: { name, link, holds: LINKS.sign_up.holds },
				kind: 'access'
			});
		});
	});

/** For whom a link opens an account; null when it does so no longer. @throws {DatabaseAwayError} */
export async function lookAtSignUp(
	ground: Ground,
	token: string
): Promise<{ name: string; address: string } | null> {
	const link = await asking(() => lookAtLink(ground, 'sign_up', token));
	return link && { name: detailSchema.parse(link.detail).name, address: link.address };
}

/**
 * Opens the account. The password is chosen here and not before, by who reads the mail of the address: an account
 * that somebody else asked for is theirs all the same.
 * @throws {LapsedLinkError} @throws {DatabaseAwayError}
 */
export async function confirmSignUp(
	ground: Ground,
	token: string,
	password: string
): Promise<{ address: string }> {
	const password_hash = await hashPassword(password);
	return inTransaction(ground.database, async (transaction) => {
		const link = await useLink(ground, transaction, 'sign_up', token);
		if (link === null) throw new LapsedLinkError();
		const { name, license, at } = detailSchema.parse(link.detail);
		const now = ground.clock();
		const id = newId();
		const added = await users.addUser(
			ground.database,
			{
				id,
				name,
				email: link.address,
				email_verified_at: now,
				password_hash,
				role: 'member',
				areas: [],
				paused_until: null,
				pause_reason: null,
				consented_to: license,
				consented_at: new Date(at),
				demo: false,
				version: 1,
				created_at: now,
				deleted_at: null
			},
			transaction
		);
		// Another link to the same address was quicker.
		if (!added) throw new LapsedLinkError();
		await record(ground, transaction, {
			actor: id,
			action: 'person.joined',
			subject: { kind: 'person', id },
			detail: { license }
		});
		return { address: link.address };
	});
}
