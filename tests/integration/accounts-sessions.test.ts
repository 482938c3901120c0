import { Secret, TOTP } from 'otpauth';
import { beforeAll, beforeEach, describe, expect, it } from 'vitest';
import {
	actorOf,
	confirmFactor,
	endAllOwnSessions,
	endByCookie,
	endOwnSession,
	installationSecret,
	offerFactor,
	openSession,
	ownAccount,
	ownSessions,
	removeFactor,
	renewRecoveryCodes,
	signInByCode,
	writeSessionToken
} from '../../src/lib/server/accounts';
import { requireAdministrator, requireModerator, requireWriter } from '../../src/lib/server/actor';
import { config } from '../../src/lib/server/config';
import { inTransaction } from '../../src/lib/server/db';
import { giveNotice, readAllNotices } from '../../src/lib/server/inbox';
import { pausePerson, setRole } from '../../src/lib/server/people';
import {
	configureAccounts,
	cookieOf,
	join,
	mailsFor,
	PASSWORD,
	signIn
} from '../fixtures/accounts';
import { DAY, MINUTE, standingClock } from '../fixtures/clock';
import { openTestDatabase, type TestDatabase } from '../fixtures/database';
import { actorOf as buildActor, addPerson } from '../fixtures/people';

configureAccounts();
let database: TestDatabase;
let { clock, ahead } = standingClock();
let count = 0;
let address = '';
const ground = () => ({ database, clock });
const VISITOR = { role: 'visitor', id: null, awaitsCode: false };

beforeAll(async () => {
	database = await openTestDatabase();
});
beforeEach(() => {
	({ clock, ahead } = standingClock());
	address = `somebody-${(count += 1)}@example.org`;
});

describe('a session', () => {
	it('is somebody, for thirty days and no longer', async () => {
		const { cookie } = await join(ground(), address);
		ahead(30 * DAY - 1000);
		expect(await actorOf(ground(), cookie)).toMatchObject({ name: 'Ann Oyster' });
		ahead(1000);
		expect(await actorOf(ground(), cookie)).toEqual(VISITOR);
	});

	it('ends at once when it is signed out, for whoever has its cookie', async () => {
		const { cookie } = await join(ground(), address);
		const stolen = cookie;
		await endByCookie(ground(), cookie);
		expect(await actorOf(ground(), stolen)).toEqual(VISITOR);
	});

	it('is new at each sign-in: a cookie that was planted before is worth nothing afterwards', async () => {
		const mallory = await join(ground(), `mallory-${address}`);
		await join(ground(), address);
		const planted = mallory.cookie;
		const { cookie } = await signIn(ground(), address, { before: planted });
		expect(cookie).not.toBe(planted);
		expect(await actorOf(ground(), planted)).toEqual(VISITOR);
	});

	it.each<[string, (cookie: string, sid: string) => string]>([
		['nothing', () => ''],
		['something', () => 'something'],
		['a secret that we never made', (_, sid) => cookieOf(ground(), 'f'.repeat(sid.length))],
		['a signature of another secret', (_, sid) => writeSessionToken('x'.repeat(32), sid, 4e9)],
		['a later end', (cookie) => cookie.replace(/\.\d+\./, '.4000000000.')],
		['no signature', (cookie) => cookie.replace(/[^.]+$/, '')],
		['one part more', (cookie) => `${cookie}.x`],
		['the hash that the database keeps', (_, sid) => cookieOf(ground(), sid.toUpperCase())]
	])('is not opened by a cookie that was forged: %s', async (_, forge) => {
		const { user_id } = await join(ground(), address);
		const sid = await openSession(ground(), {
			user_id,
			way: 'password',
			device: 'x',
			codeGiven: false,
			before: undefined
		});
		const cookie = cookieOf(ground(), sid);
		expect(await actorOf(ground(), cookie)).toMatchObject({ id: user_id });
		expect(await actorOf(ground(), forge(cookie, sid))).toEqual(VISITOR);
	});

	it('is kept as a hash: who reads the database cannot take it over', async () => {
		const { cookie, user_id } = await join(ground(), address);
		const kept = await database.models.sessions.findAll({ where: { user_id }, raw: true });
		expect(JSON.stringify(kept)).not.toContain(cookie.split('.')[0]);
		const { id } = kept[0] as unknown as { id: string };
		expect(await actorOf(ground(), cookieOf(ground(), id))).toEqual(VISITOR);
		expect(await actorOf(ground(), writeSessionToken(installationSecret(), id, 4e9))).toEqual(
			VISITOR
		);
	});

	it('is seen and ended by its owner, one or all', async () => {
		const first = await join(ground(), address);
		ahead(MINUTE);
		const second = await signIn(ground(), address);
		const shown = await ownSessions(ground(), second.actor);
		expect(shown.map(({ here }) => here)).toEqual([true, false]);
		expect(shown[0]).toMatchObject({ device: 'Firefox on Linux', way: 'password', since: clock() });

		await endOwnSession(ground(), second.actor, shown[1]!.id);
		expect(await actorOf(ground(), first.cookie)).toEqual(VISITOR);
		expect(await ownSessions(ground(), second.actor)).toHaveLength(1);

		const third = await signIn(ground(), address);
		await endAllOwnSessions(ground(), second.actor);
		for (const { cookie } of [second, third])
			expect(await actorOf(ground(), cookie)).toEqual(VISITOR);
	});

	it('of somebody else is not there', async () => {
		const ann = await join(ground(), address);
		const bob = await join(ground(), `bob-${address}`);
		await expect(endOwnSession(ground(), bob.actor, ann.actor.session)).rejects.toMatchObject({
			code: 'unknown_session'
		});
		expect(await actorOf(ground(), ann.cookie)).toMatchObject({ id: ann.user_id });
	});

	it('knows how many notices its owner has not read', async () => {
		const { cookie, user_id } = await join(ground(), address);
		expect(await actorOf(ground(), cookie)).toMatchObject({ unread: 0 });
		await inTransaction(database, (transaction) =>
			giveNotice({ ...ground(), transaction }, { user_id, template: 'resumed', data: {} })
		);
		const actor = await actorOf(ground(), cookie);
		expect(actor).toMatchObject({ unread: 1 });
		await readAllNotices(ground(), actor);
		expect(await actorOf(ground(), cookie)).toMatchObject({ unread: 0 });
	});

	it('writes when it was last used about once an hour', async () => {
		const { cookie, actor } = await join(ground(), address);
		const began = clock();
		ahead(59 * MINUTE);
		await actorOf(ground(), cookie);
		expect((await ownSessions(ground(), actor))[0]!.seen).toEqual(began);
		ahead(2 * MINUTE);
		await actorOf(ground(), cookie);
		expect((await ownSessions(ground(), actor))[0]!.seen).toEqual(clock());
	});
});

describe('a change of somebody in the middle of a session', () => {
	it('of their role counts from the next request on', async () => {
		const admin = buildActor(await addPerson(database, { role: 'administrator' }));
		await addPerson(database, { role: 'administrator' });
		const { cookie, user_id } = await join(ground(), address, { role: 'administrator' });
		const change = async (role: 'member' | 'moderator', version: number) =>
			setRole(ground(), admin, { id: user_id, version }, { role, areas: ['Ford'] });

		await change('moderator', 1);
		expect(await actorOf(ground(), cookie)).toMatchObject({
			granted: 'moderator',
			areas: ['Ford']
		});
		await change('member', 2);
		const actor = await actorOf(ground(), cookie);
		expect(actor).toMatchObject({ role: 'member', areas: [] });
		expect(() => requireModerator(actor)).toThrow('This is for moderators.');
	});

	it('of a pause counts from the next request on, and ends by itself', async () => {
		const admin = buildActor(await addPerson(database, { role: 'administrator' }));
		const { cookie, user_id } = await join(ground(), address);
		const until = new Date(clock().getTime() + DAY);
		await pausePerson(ground(), admin, { id: user_id, version: 1 }, { until, reason: 'Rest.' });
		const paused = await actorOf(ground(), cookie);
		expect(paused).toMatchObject({ paused: { until, reason: 'Rest.' } });
		expect(() => requireWriter(paused)).toThrow('paused until 2026-06-13: Rest.');
		expect(await ownAccount(ground(), paused)).toMatchObject({ paused: { until } });
		ahead(DAY);
		expect(await actorOf(ground(), cookie)).toMatchObject({ paused: null });
	});
});

describe('a second factor', () => {
	const codeOf = (secret: string, at = clock()) =>
		new TOTP({ secret: Secret.fromBase32(secret) }).generate({ timestamp: at.getTime() });
	async function withFactor() {
		const signedIn = await join(ground(), address);
		const { secret } = await offerFactor(ground(), signedIn.actor);
		const recovery = await confirmFactor(ground(), signedIn.actor, codeOf(secret));
		ahead(MINUTE);
		return { ...signedIn, secret, recovery };
	}

	it('is in force once a first code was given; other sessions end, this one stays', async () => {
		const { cookie, actor } = await join(ground(), address);
		const other = await signIn(ground(), address);
		const offer = await offerFactor(ground(), actor);
		expect(offer.address).toMatch(/^otpauth:\/\/totp\/Tallyplate:/);
		expect(await offerFactor(ground(), actor)).toEqual(offer);
		await expect(confirmFactor(ground(), actor, '000000')).rejects.toMatchObject({
			code: 'wrong_code'
		});
		expect(await ownAccount(ground(), actor)).toMatchObject({ factor: null });

		const recovery = await confirmFactor(ground(), actor, codeOf(offer.secret));
		expect(new Set(recovery).size).toBe(10);
		expect(await ownAccount(ground(), actor)).toMatchObject({ factor: { codesLeft: 10 } });
		expect(await actorOf(ground(), cookie)).toMatchObject({ id: actor.id });
		expect(await actorOf(ground(), other.cookie)).toEqual(VISITOR);
		expect((await mailsFor(database, address)).at(-1)?.subject).toMatch(/second factor is asked/);
		await expect(offerFactor(ground(), actor)).rejects.toMatchObject({ code: 'factor_state' });
	});

	it('is asked for after the password; until then nobody is signed in', async () => {
		const { secret } = await withFactor();
		const half = await signIn(ground(), address);
		expect(half.actor).toEqual({ ...VISITOR, awaitsCode: true });
		await expect(ownSessions(ground(), half.actor)).rejects.toMatchObject({
			code: 'sign_in_needed'
		});
		const { user_id, way } = await signInByCode(ground(), half.cookie, codeOf(secret));
		expect(way).toBe('password');
		expect(await actorOf(ground(), half.cookie)).toEqual(VISITOR);
		const sid = await openSession(ground(), {
			user_id,
			way,
			device: 'x',
			codeGiven: true,
			before: half.cookie
		});
		expect(await actorOf(ground(), cookieOf(ground(), sid))).toMatchObject({ id: user_id });
	});

	it('takes each code once, of now or half a minute beside it', async () => {
		const { secret } = await withFactor();
		const half = async () => (await signIn(ground(), address)).cookie;
		const at = (seconds: number) => codeOf(secret, new Date(clock().getTime() + seconds * 1000));
		const wrong = { code: 'wrong_code' };
		const code = at(-30);
		await signInByCode(ground(), await half(), code);
		await expect(signInByCode(ground(), await half(), code)).rejects.toMatchObject(wrong);
		await expect(signInByCode(ground(), await half(), at(-60))).rejects.toMatchObject(wrong);
		await expect(signInByCode(ground(), await half(), at(60))).rejects.toMatchObject(wrong);
		await signInByCode(ground(), await half(), at(30));
		// The code of now stands before the one that was taken.
		await expect(signInByCode(ground(), await half(), at(0))).rejects.toMatchObject(wrong);
	});

	it('lets one of two win who give the same code at once', async () => {
		const { secret } = await withFactor();
		const cookies = [await signIn(ground(), address), await signIn(ground(), address)];
		const both = await Promise.allSettled(
			cookies.map(({ cookie }) => signInByCode(ground(), cookie, codeOf(secret)))
		);
		expect(both.map(({ status }) => status).sort()).toEqual(['fulfilled', 'rejected']);
	});

	it('is guessed ten times in a quarter of an hour', async () => {
		const { secret } = await withFactor();
		const { cookie } = await signIn(ground(), address);
		for (let n = 0; n < 10; n += 1)
			await expect(signInByCode(ground(), cookie, '000000')).rejects.toMatchObject({
				code: 'wrong_code'
			});
		await expect(signInByCode(ground(), cookie, codeOf(secret))).rejects.toMatchObject({
			code: 'too_often'
		});
	});

	it('is stood in for by a recovery code, each once', async () => {
		const { recovery, actor, secret } = await withFactor();
		const first = await signIn(ground(), address);
		await signInByCode(ground(), first.cookie, recovery[3]!);
		expect(await ownAccount(ground(), actor)).toMatchObject({ factor: { codesLeft: 9 } });
		const second = await signIn(ground(), address);
		await expect(signInByCode(ground(), second.cookie, recovery[3]!)).rejects.toMatchObject({
			code: 'wrong_code'
		});
		const renewed = await renewRecoveryCodes(ground(), actor, codeOf(secret));
		expect(renewed).toHaveLength(10);
		await expect(signInByCode(ground(), second.cookie, recovery[4]!)).rejects.toMatchObject({
			code: 'wrong_code'
		});
		await signInByCode(ground(), second.cookie, renewed[0]!);
	});

	it('is kept sealed', async () => {
		const { secret, user_id, recovery } = await withFactor();
		const kept = JSON.stringify([
			await database.models.secondFactors.findAll({ where: { user_id }, raw: true }),
			await database.models.recoveryCodes.findAll({ where: { user_id }, raw: true })
		]);
		expect(kept).not.toContain(secret);
		for (const code of recovery) expect(kept).not.toContain(code);
	});

	it('goes with password and code together', async () => {
		const { actor, secret } = await withFactor();
		const remove = (password: string, code: string) =>
			removeFactor(ground(), actor, { password, code });
		await expect(remove('not this one', codeOf(secret))).rejects.toMatchObject({
			code: 'wrong_password'
		});
		await expect(remove(PASSWORD, '000000')).rejects.toMatchObject({ code: 'wrong_code' });
		await remove(PASSWORD, codeOf(secret));
		expect((await signIn(ground(), address)).actor).toMatchObject({ role: 'member' });
	});

	it('is asked of moderators and administrators where no demonstration runs', async () => {
		expect(config().demo).toBe(false);
		const { cookie, actor } = await join(ground(), address, { role: 'administrator' });
		expect(actor).toMatchObject({ role: 'member', granted: 'administrator' });
		expect(() => requireAdministrator(actor)).toThrow('This needs a second factor.');
		expect(await ownAccount(ground(), actor)).toMatchObject({ needsFactor: true });
		const { secret } = await offerFactor(ground(), actor);
		await confirmFactor(ground(), actor, codeOf(secret));
		const now = await actorOf(ground(), cookie);
		expect(now).toMatchObject({ role: 'administrator' });
		expect(() => requireAdministrator(now)).not.toThrow();
	});
});
