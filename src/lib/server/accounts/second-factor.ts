import { Secret, TOTP } from 'otpauth';
import { requireMember, type Actor } from '../actor';
import { record } from '../audit';
import { config } from '../config';
import { asking, inTransaction, type Transaction } from '../db';
import { secondFactors, sessions, type UserRecord } from '../db/repositories';
import type { Ground } from '../ground';
import { queueMail } from '../mail';
import { FactorStateError, WrongCodeError } from './errors';
import { countingCode } from './limits';
import { ownRecord, requireOwnPassword } from './profile';
import { newRecoveryCodes, hashOfRecoveryCode } from './recovery-codes';
import { installationSecret } from './secrets';
import { seal, unseal } from './seal';
import { awaitingCode, endByCookie } from './sessions';

const STEP_S = 30;
/** Codes of the step before and after are taken too: clocks of phones are not exact. */
const STEPS_BESIDE = 1;

const totpOf = (secret: string, label: string): TOTP =>
	new TOTP({
		issuer: 'Tallyplate',
		label,
		secret: Secret.fromBase32(secret),
		digits: 6,
		period: STEP_S
	});

/**
 * Takes a code of six figures, or a recovery code, in a transaction.
 * @throws {WrongCodeError} when it is not right, or was taken before
 */
async function takeCode(
	{ database, clock }: Ground,
	transaction: Transaction,
	user_id: string,
	code: string
): Promise<void> {
	const factor = await secondFactors.factorOf(database, user_id, transaction);
	if (factor === null) throw new WrongCodeError();
	const now = clock();
	if (code.length > 6) {
		const hash = hashOfRecoveryCode(code);
		if (await secondFactors.useRecoveryCode(database, user_id, hash, now, transaction)) return;
		throw new WrongCodeError();
	}
	const timestamp = now.getTime();
	const delta = totpOf(unseal(installationSecret(), factor.sealed_secret), user_id).validate({
		token: code,
		timestamp,
		window: STEPS_BESIDE
	});
	if (delta === null) throw new WrongCodeError();
	const step = Math.floor(timestamp / 1000 / STEP_S) + delta;
	if (!(await secondFactors.moveToStep(database, user_id, step, transaction)))
		throw new WrongCodeError();
}

/**
 * The second step of signing in: whose code this is, by the cookie that the first step left. That cookie's session
 * ends; the one that follows has another secret.
 * @throws {WrongCodeError} @throws {TooOftenError} @throws {DatabaseAwayError}
 */
export async function signInByCode(
	ground: Ground,
	cookie: string | undefined,
	code: string
): Promise<{ user_id: string; way: string }> {
	const awaiting = await awaitingCode(ground, cookie);
	if (awaiting === null || cookie === undefined) throw new WrongCodeError();
	await countingCode(ground, awaiting.user_id, () =>
		inTransaction(ground.database, async (transaction) => {
			await takeCode(ground, transaction, awaiting.user_id, code);
			await endByCookie(ground, cookie, transaction);
		})
	);
	return awaiting;
}

/** What an app on the phone needs, to be typed or photographed. */
export interface FactorOffer {
	/** In base 32. */
	readonly secret: string;
	/** `otpauth://…`, for a QR code. */
	readonly address: string;
}

/**
 * Begins with a second factor: it is not asked for until a first code was given. Asked again before that, the same
 * secret is offered, so that a page that is loaded anew spoils nothing.
 * @throws {SignInNeededError} @throws {FactorStateError} when one is in force
 */
export async function offerFactor(ground: Ground, actor: Actor): Promise<FactorOffer> {
	requireMember(actor);
	const { database, clock } = ground;
	const user = await ownRecord(ground, actor);
	const factor = await asking(() => secondFactors.factorOf(database, actor.id));
	if (factor?.confirmed_at) throw new FactorStateError();
	const secret = factor
		? unseal(installationSecret(), factor.sealed_secret)
		: new Secret({ size: 20 }).base32;
	if (factor === null)
		await inTransaction(database, (transaction) =>
			secondFactors.putFactor(
				database,
				{
					user_id: actor.id,
					sealed_secret: seal(installationSecret(), secret),
					created_at: clock(),
					confirmed_at: null,
					last_step: 0
				},
				transaction
			)
		);
	return { secret, address: totpOf(secret, user.email ?? user.id).toString() };
}

async function tell(
	ground: Ground,
	transaction: Transaction,
	user: UserRecord,
	on: boolean
): Promise<void> {
	await record(ground, transaction, {
		actor: user.id,
		action: on ? 'person.second_factor_added' : 'person.second_factor_removed',
		subject: { kind: 'person', id: user.id }
	});
	if (user.email === null) return;
	await queueMail(
		{ ...ground, transaction },
		{
			to: { address: user.email, user_id: user.id },
			template: 'second_factor_changed',
			data: { name: user.name, on, link: `${config().origin}/reset` },
			kind: 'access'
		}
	);
}

/**
 * Puts the second factor in force with a first code. Other sessions end: none of them gave one.
 * @returns recovery codes, which are shown this once
 * @throws {SignInNeededError} @throws {WrongCodeError} @throws {FactorStateError} @throws {TooOftenError}
 */
export async function confirmFactor(
	ground: Ground,
	actor: Actor,
	code: string
): Promise<readonly string[]> {
	requireMember(actor);
	const { database, clock } = ground;
	const user = await ownRecord(ground, actor);
	const codes = newRecoveryCodes();
	await countingCode(ground, actor.id, () =>
		inTransaction(database, async (transaction) => {
			const factor = await secondFactors.factorOf(database, actor.id, transaction);
			if (factor === null || factor.confirmed_at !== null) throw new FactorStateError();
			await takeCode(ground, transaction, actor.id, code);
			const now = clock();
			await secondFactors.confirmFactor(database, actor.id, now, transaction);
			const hashes = codes.map(hashOfRecoveryCode);
			await secondFactors.putRecoveryCodes(database, actor.id, hashes, transaction);
			await sessions.revokeSessionsOf(database, actor.id, now, transaction, actor.session);
			await sessions.markCodeGiven(database, actor.session, now, transaction);
			await tell(ground, transaction, user, true);
		})
	);
	return codes;
}

/**
 * Makes new recovery codes; those before are worth nothing.
 * @throws {SignInNeededError} @throws {WrongCodeError} @throws {TooOftenError}
 */
export async function renewRecoveryCodes(
	ground: Ground,
	actor: Actor,
	code: string
): Promise<readonly string[]> {
	requireMember(actor);
	const { database } = ground;
	const codes = newRecoveryCodes();
	await countingCode(ground, actor.id, () =>
		inTransaction(database, async (transaction) => {
			await takeCode(ground, transaction, actor.id, code);
			const hashes = codes.map(hashOfRecoveryCode);
			await secondFactors.putRecoveryCodes(database, actor.id, hashes, transaction);
		})
	);
	return codes;
}

/**
 * Removes the second factor. Takes the password and a code: who has one of them does not have both.
 * @throws {SignInNeededError} @throws {WrongPasswordError} @throws {WrongCodeError} @throws {TooOftenError}
 */
export async function removeFactor(
	ground: Ground,
	actor: Actor,
	{ password, code }: { password: string; code: string }
): Promise<void> {
	requireMember(actor);
	const user = await requireOwnPassword(ground, actor, password);
	await countingCode(ground, actor.id, () =>
		inTransaction(ground.database, async (transaction) => {
			await takeCode(ground, transaction, actor.id, code);
			await secondFactors.removeFactor(ground.database, actor.id, transaction);
			await tell(ground, transaction, user, false);
		})
	);
}
