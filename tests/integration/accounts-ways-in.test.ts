import { beforeAll, beforeEach, describe, expect, it } from 'vitest';
import {
	actorOf,
	confirmSignUp,
	isReset,
	lookAtSignUp,
	requestReset,
	requestSignUp,
	resetPassword,
	sendSignInLink,
	signInByPassword,
	useSignInLink
} from '../../src/lib/server/accounts';
import { verifyChain } from '../../src/lib/server/audit';
import { config } from '../../src/lib/server/config';
import {
	configureAccounts,
	FROM,
	join,
	keptToken,
	mailsFor,
	PASSWORD,
	signIn,
	tokenFor
} from '../fixtures/accounts';
import { HOUR, MINUTE, standingClock } from '../fixtures/clock';
import { openTestDatabase, type TestDatabase } from '../fixtures/database';
import { addPerson } from '../fixtures/people';

configureAccounts();
let database: TestDatabase;
let { clock, ahead } = standingClock();
let count = 0;
/** Each test has an address of its own: limits and accounts of others are none of its business. */
let address = '';
const ground = () => ({ database, clock });

beforeAll(async () => {
	database = await openTestDatabase();
});
beforeEach(() => {
	({ clock, ahead } = standingClock());
	address = `somebody-${(count += 1)}@example.org`;
});

describe('signing up', () => {
	it('opens an account once the address is confirmed, with the password chosen there', async () => {
		await requestSignUp(ground(), { name: 'Ann Oyster', address, from: FROM });
		const token = await tokenFor(database, address);
		expect(await lookAtSignUp(ground(), token)).toEqual({ name: 'Ann Oyster', address });
		expect(await database.models.users.count({ where: { email: address } })).toBe(0);

		expect(await confirmSignUp(ground(), token, PASSWORD)).toEqual({ address });
		const { actor } = await signIn(ground(), address);
		expect(actor).toMatchObject({ name: 'Ann Oyster', role: 'member', granted: 'member' });
		const user = await database.models.users.findOne({ where: { email: address }, raw: true });
		expect(user).toMatchObject({ consented_to: 'CC BY-SA 4.0', consented_at: clock() });
		expect(await verifyChain(database)).toMatchObject({ holds: true });
	});

	it('takes a link once, for a day, and no other', async () => {
		await requestSignUp(ground(), { name: 'Ann', address, from: FROM });
		const token = await tokenFor(database, address);
		const lapsed = { code: 'lapsed_link' };
		await expect(confirmSignUp(ground(), 'f'.repeat(64), PASSWORD)).rejects.toMatchObject(lapsed);
		ahead(24 * HOUR);
		expect(await lookAtSignUp(ground(), token)).toBeNull();
		await expect(confirmSignUp(ground(), token, PASSWORD)).rejects.toMatchObject(lapsed);
		ahead(-MINUTE);
		await confirmSignUp(ground(), token, PASSWORD);
		await expect(confirmSignUp(ground(), token, PASSWORD)).rejects.toMatchObject(lapsed);
	});

	it('lets one of two win who open the same link at once', async () => {
		await requestSignUp(ground(), { name: 'Ann', address, from: FROM });
		const token = await tokenFor(database, address);
		const both = await Promise.allSettled([
			confirmSignUp(ground(), token, PASSWORD),
			confirmSignUp(ground(), token, PASSWORD)
		]);
		expect(both.map(({ status }) => status).sort()).toEqual(['fulfilled', 'rejected']);
	});

	it('gives an account that somebody else asked for to who reads the mail, with a password of theirs', async () => {
		await requestSignUp(ground(), { name: 'Mallory', address, from: FROM });
		const foreign = await tokenFor(database, address);
		ahead(MINUTE);
		await requestSignUp(ground(), { name: 'Ann', address, from: FROM });
		const own = await tokenFor(database, address);
		await confirmSignUp(ground(), own, PASSWORD);
		await expect(confirmSignUp(ground(), foreign, 'mallory wants in')).rejects.toMatchObject({
			code: 'lapsed_link'
		});
	});

	it('answers the same for an address that has an account, and tells its owner', async () => {
		await join(ground(), address);
		ahead(MINUTE);
		await requestSignUp(ground(), { name: 'Mallory', address, from: FROM });
		expect((await mailsFor(database, address)).at(-1)?.subject).toMatch(/already have an account/);
	});

	it('keeps only the hash of a link', async () => {
		await requestSignUp(ground(), { name: 'Ann', address, from: FROM });
		const token = await tokenFor(database, address);
		const kept = await database.models.accountTokens.findAll({ where: { address }, raw: true });
		expect(kept).toEqual([expect.objectContaining({ hash: keptToken(token) })]);
		expect(JSON.stringify(kept)).not.toContain(token);
	});
});

describe('a password', () => {
	it('is kept as argon2id', async () => {
		await requestSignUp(ground(), { name: 'Ann', address, from: FROM });
		await confirmSignUp(ground(), await tokenFor(database, address), PASSWORD);
		const user = await database.models.users.findOne({ where: { email: address } });
		expect(user?.get('password_hash')).toMatch(/^\$argon2id\$v=19\$m=19456,t=2,p=1\$/);
	});

	it('that is wrong is told no further than an address that is unknown', async () => {
		await join(ground(), address);
		const attempt = (of: string) =>
			signInByPassword(ground(), { address: of, password: 'not this one', from: FROM });
		await expect(attempt(address)).rejects.toMatchObject({ code: 'wrong_sign_in' });
		await expect(attempt(`no-${address}`)).rejects.toMatchObject({ code: 'wrong_sign_in' });
		await expect(attempt("' OR 1=1 --@example.org")).rejects.toMatchObject({
			code: 'wrong_sign_in'
		});
	});

	it('takes as long to be refused for an unknown address as for a known one', async () => {
		await join(ground(), address);
		const timeOf = async (of: string, from: string) => {
			const began = performance.now();
			await expect(
				signInByPassword(ground(), { address: of, password: 'not this one', from })
			).rejects.toThrow();
			return performance.now() - began;
		};
		const times: [number, number][] = [];
		for (let n = 0; n < 9; n += 1)
			times.push([
				await timeOf(address, `192.0.2.${100 + n}`),
				await timeOf(`no-${address}`, `192.0.2.${100 + n}`)
			]);
		// What else runs on the machine only ever adds to a time: the shortest of each tells.
		const shortest = (of: 0 | 1) => Math.min(...times.map((pair) => pair[of]));
		// Hashing takes many times as long as all else: without it the answer would come in a tenth of the time.
		expect(shortest(1)).toBeGreaterThan(shortest(0) * 0.4);
		expect(shortest(1)).toBeLessThan(shortest(0) * 2.5);
	});

	it('may be guessed ten times from one place; others and the owner elsewhere are not locked out', async () => {
		await join(ground(), address);
		const guess = (from: string, password = 'not this one') =>
			signInByPassword(ground(), { address, password, from });
		for (let n = 0; n < 10; n += 1)
			await expect(guess('198.51.100.1')).rejects.toMatchObject({ code: 'wrong_sign_in' });
		await expect(guess('198.51.100.1', PASSWORD)).rejects.toMatchObject({ code: 'too_often' });
		await guess('198.51.100.2', PASSWORD);
		ahead(15 * MINUTE);
		await guess('198.51.100.1', PASSWORD);
	});

	it('that is right is not counted', async () => {
		await join(ground(), address);
		for (let n = 0; n < 15; n += 1) await signIn(ground(), address);
	});

	it('is tried from one network so many times an hour, whatever the address', async () => {
		const guess = (n: number) =>
			signInByPassword(ground(), {
				address: `nobody-${n}@example.org`,
				password: 'not this one',
				from: '203.0.113.9'
			});
		const { attemptsPerHour } = config();
		await Promise.allSettled(Array.from({ length: attemptsPerHour }, (_, n) => guess(n)));
		await expect(guess(-1)).rejects.toMatchObject({ code: 'too_often' });
	});

	it('never opens an account that has none, is gone, or belongs to a demonstration that does not run', async () => {
		await addPerson(database, { email: address });
		const { user_id } = await join(ground(), `demo-${address}`);
		await database.models.users.update({ demo: true }, { where: { id: user_id } });
		for (const of of [address, `demo-${address}`])
			await expect(
				signInByPassword(ground(), { address: of, password: PASSWORD, from: FROM })
			).rejects.toMatchObject({ code: 'wrong_sign_in' });
	});
});

describe('a sign-in link', () => {
	const TOKEN = 'ab'.repeat(32);

	it('goes to an address with an account, and holds once, for a quarter of an hour', async () => {
		await join(ground(), address);
		await sendSignInLink(ground(), address, TOKEN);
		expect(await tokenFor(database, address)).toBe(TOKEN);
		expect((await mailsFor(database, address)).at(-1)?.body_text).toContain(
			`https://tallyplate.example/signin/link?token=${TOKEN}`
		);
		ahead(15 * MINUTE);
		expect(await useSignInLink(ground(), keptToken(TOKEN))).toBeNull();
		ahead(-1);
		expect(await useSignInLink(ground(), keptToken(TOKEN))).toBe(address);
		expect(await useSignInLink(ground(), keptToken(TOKEN))).toBeNull();
	});

	it('goes to nobody else', async () => {
		await sendSignInLink(ground(), `no-${address}`, 'cd'.repeat(32));
		expect(await mailsFor(database, `no-${address}`)).toEqual([]);
	});

	it('goes to one address five times an hour', async () => {
		await join(ground(), address);
		for (let n = 0; n < 8; n += 1) await sendSignInLink(ground(), address, `${n}a`.repeat(32));
		expect(await mailsFor(database, address)).toHaveLength(5);
	});
});

describe('a reset', () => {
	it('lets choose a new password once, ends all sessions and tells the owner', async () => {
		const { cookie } = await join(ground(), address);
		ahead(MINUTE);
		await requestReset(ground(), address, FROM);
		const token = await tokenFor(database, address);
		expect(await isReset(ground(), token)).toBe(true);
		ahead(MINUTE);
		await resetPassword(ground(), token, 'another cowl tag');
		expect(await isReset(ground(), token)).toBe(false);
		await expect(resetPassword(ground(), token, PASSWORD)).rejects.toMatchObject({
			code: 'lapsed_link'
		});

		expect(await actorOf(ground(), cookie)).toMatchObject({ role: 'visitor' });
		await expect(signIn(ground(), address)).rejects.toMatchObject({ code: 'wrong_sign_in' });
		await signIn(ground(), address, { password: 'another cowl tag' });
		expect((await mailsFor(database, address)).at(-1)?.subject).toMatch(/password .* was changed/);
	});

	it('lets every other link to the account lapse', async () => {
		await join(ground(), address);
		await requestReset(ground(), address, FROM);
		const first = await tokenFor(database, address);
		ahead(MINUTE);
		await requestReset(ground(), address, FROM);
		await resetPassword(ground(), await tokenFor(database, address), 'another cowl tag');
		expect(await isReset(ground(), first)).toBe(false);
	});

	it('holds for half an hour', async () => {
		await join(ground(), address);
		await requestReset(ground(), address, FROM);
		ahead(30 * MINUTE);
		expect(await isReset(ground(), await tokenFor(database, address))).toBe(false);
	});

	it('takes the same time for an unknown address, and writes to nobody', async () => {
		await join(ground(), address);
		const timeOf = async (of: string) => {
			const began = performance.now();
			await requestReset(ground(), of, FROM);
			return performance.now() - began;
		};
		const known = await timeOf(address);
		const unknown = await timeOf(`no-${address}`);
		expect(Math.abs(known - unknown)).toBeLessThan(150);
		expect(unknown).toBeGreaterThan(240);
		expect(await mailsFor(database, `no-${address}`)).toEqual([]);
	});
});
