import { requireMember, SignInNeededError, type Actor, type Person } from '../actor';
import { asking, inTransaction } from '../db';
import { secondFactors, users, type UserRecord } from '../db/repositories';
import type { Ground } from '../ground';
import { WrongPasswordError } from './errors';
import { countingCode } from './limits';
import { hashPassword, isPassword } from './passwords';
import { writePassword } from './reset';

/** The account of who is signed in, as it stands in the database. */
export async function ownRecord({ database }: Ground, actor: Person): Promise<UserRecord> {
	const user = await asking(() => users.userById(database, actor.id));
	if (user === null) throw new SignInNeededError();
	return user;
}

/**
 * Demands the password of who is signed in once more, before something that a borrowed phone must not do.
 * @throws {WrongPasswordError} @throws {TooOftenError}
 */
export async function requireOwnPassword(
	ground: Ground,
	actor: Person,
	password: string
): Promise<UserRecord> {
	const user = await ownRecord(ground, actor);
	await countingCode(ground, actor.id, async () => {
		if (!(await isPassword(password, user.password_hash))) throw new WrongPasswordError();
	});
	return user;
}

/** An account as its owner sees it. */
export interface OwnAccount {
	readonly name: string;
	readonly address: string;
	readonly role: UserRecord['role'];
	readonly areas: UserRecord['areas'];
	readonly since: Date;
	readonly consent: { readonly license: string; readonly at: Date } | null;
	readonly paused: Person['paused'];
	/** How many recovery codes are left; null without a second factor. */
	readonly factor: { readonly since: Date; readonly codesLeft: number } | null;
	/** The role on record asks for a second factor that is not there. */
	readonly needsFactor: boolean;
}

/** @throws {SignInNeededError} @throws {DatabaseAwayError} */
export async function ownAccount(ground: Ground, actor: Actor): Promise<OwnAccount> {
	requireMember(actor);
	const user = await ownRecord(ground, actor);
	const { database } = ground;
	const factor = await asking(() => secondFactors.factorOf(database, actor.id));
	const since = factor?.confirmed_at ?? null;
	const codesLeft = await asking(() => secondFactors.recoveryCodesLeft(database, actor.id));
	return {
		name: user.name ?? '',
		address: user.email ?? '',
		role: user.role,
		areas: user.areas,
		since: user.created_at,
		consent:
			user.consented_to !== null && user.consented_at !== null
				? { license: user.consented_to, at: user.consented_at }
				: null,
		paused: actor.paused,
		factor: since && { since, codesLeft },
		needsFactor: actor.role !== actor.granted
	};
}

/** Changes the name beside somebody's work, on what is there already too. @throws {SignInNeededError} */
export async function changeOwnName(ground: Ground, actor: Actor, name: string): Promise<void> {
	requireMember(actor);
	await inTransaction(ground.database, (transaction) =>
		users.changeUser(ground.database, actor.id, { name }, transaction)
	);
}

/**
 * Chooses another password. All other sessions end.
 * @throws {SignInNeededError} @throws {WrongPasswordError} @throws {TooOftenError}
 */
export async function changeOwnPassword(
	ground: Ground,
	actor: Actor,
	{ current, chosen }: { current: string; chosen: string }
): Promise<void> {
	requireMember(actor);
	const user = await requireOwnPassword(ground, actor, current);
	const password_hash = await hashPassword(chosen);
	await inTransaction(ground.database, (transaction) =>
		writePassword(ground, transaction, user, password_hash, actor.session)
	);
}
