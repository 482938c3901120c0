import { beforeAll, describe, expect, it } from 'vitest';
import { actorOf as asking } from '../../src/lib/server/accounts';
import { verifyChain } from '../../src/lib/server/audit';
import { noticesFor } from '../../src/lib/server/inbox';
import type { UserRecord } from '../../src/lib/server/db/models';
import {
	appointAdministrator,
	endSessionsOf,
	listPeople,
	pausePerson,
	resumePerson,
	setRole,
	showPerson
} from '../../src/lib/server/people';
import { configureAccounts, join, signIn } from '../fixtures/accounts';
import { DAY, standingClock } from '../fixtures/clock';
import { openTestDatabase, type TestDatabase } from '../fixtures/database';
import { actorOf, addPerson } from '../fixtures/people';

configureAccounts();
const { clock } = standingClock();
let database: TestDatabase;
let ada: UserRecord;
const ground = () => ({ database, clock });
const admin = () => actorOf(ada);
const deedsOf = async (id: string) =>
	(await database.models.audit.findAll({ where: { subject_id: id }, order: ['number'] })).map(
		(entry) => entry.get({ plain: true })
	);

beforeAll(async () => {
	database = await openTestDatabase();
	ada = await addPerson(database, { name: 'Ada Quill', role: 'administrator' });
	for (let n = 0; n < 120; n += 1)
		await addPerson(database, { name: `Member ${String(n).padStart(3, '0')}` });
	await addPerson(database, { name: 'René Óscar', email: 'rene@motors.example' });
	await addPerson(database, { name: '100% Percent', role: 'moderator', areas: ['Ford'] });
	await addPerson(database, { name: null, email: null, deleted_at: clock() });
});

describe('the list of people', () => {
	it('comes by name, a page at a time, without those who have left', async () => {
		const first = await listPeople(ground(), admin());
		expect(first.total).toBe(123);
		expect(first.people).toHaveLength(50);
		expect(first.people[0]).toMatchObject({ name: '100% Percent', areas: ['Ford'] });
		const last = await listPeople(ground(), admin(), { page: 3 });
		expect(last.people).toHaveLength(23);
		expect(last.people.at(-1)?.name).toBe('René Óscar');
	});

	it.each([
		['rene osc', 1],
		['motors.example', 1],
		['member 01', 10],
		['100%', 1],
		['%', 1],
		['_', 0],
		["' OR 1=1 --", 0],
		['<b>', 0]
	])('is searched in names, whatever their accents, and addresses: %j', async (text, total) => {
		expect(await listPeople(ground(), admin(), { text })).toMatchObject({ total });
	});

	it('is narrowed to a role', async () => {
		const found = await listPeople(ground(), admin(), { role: 'moderator' });
		expect(found.people.map(({ name }) => name)).toEqual(['100% Percent']);
	});
});

describe('a role', () => {
	it('is given with areas, and written down', async () => {
		const { id } = await addPerson(database, { name: 'Mo' });
		const seen = { id, version: 1 };
		await setRole(ground(), admin(), seen, { role: 'moderator', areas: ['Dodge', 'Plymouth'] });
		const shown = await showPerson(ground(), admin(), id);
		expect(shown).toMatchObject({ role: 'moderator', areas: ['Dodge', 'Plymouth'], version: 2 });
		expect(await deedsOf(id)).toMatchObject([
			{
				actor: ada.id,
				action: 'person.role_changed',
				detail: { from: 'member', to: 'moderator', areas_to: ['Dodge', 'Plymouth'] }
			}
		]);
		expect(await noticesFor(ground(), actorOf({ ...ada, id }), { archived: false })).toMatchObject([
			{ title: 'You are a moderator now', body: expect.stringContaining('Dodge, Plymouth') }
		]);
		await setRole(ground(), admin(), { id, version: 2 }, { role: 'member', areas: ['Dodge'] });
		expect(await showPerson(ground(), admin(), id)).toMatchObject({ role: 'member', areas: [] });
		expect(await verifyChain(database)).toMatchObject({ holds: true });
	});

	it('is not given over what another administrator has changed meanwhile', async () => {
		const { id } = await addPerson(database);
		const change = () =>
			setRole(ground(), admin(), { id, version: 1 }, { role: 'moderator', areas: [] });
		const both = await Promise.allSettled([change(), change()]);
		expect(both.map(({ status }) => status).sort()).toEqual(['fulfilled', 'rejected']);
		await expect(change()).rejects.toMatchObject({ code: 'changed_meanwhile' });
		expect(await deedsOf(id)).toHaveLength(1);
	});

	it('of one’s own is nobody’s own decision', async () => {
		const seen = { id: ada.id, version: 1 };
		const own = { code: 'own_account' };
		const role = { role: 'member', areas: [] } as const;
		await expect(setRole(ground(), admin(), seen, role)).rejects.toMatchObject(own);
		const pause = { until: new Date(), reason: 'x' };
		await expect(pausePerson(ground(), admin(), seen, pause)).rejects.toMatchObject(own);
	});

	it('of administrator is left to one of two who take it from each other at once', async () => {
		const own = await openTestDatabase();
		const both = [
			await addPerson(own, { role: 'administrator' }),
			await addPerson(own, { role: 'administrator' })
		] as const;
		const takeFrom = (by: UserRecord, from: UserRecord) =>
			setRole(
				{ database: own, clock },
				actorOf(by),
				{ id: from.id, version: 1 },
				{ role: 'member', areas: [] }
			);
		const done = await Promise.allSettled([takeFrom(both[0], both[1]), takeFrom(both[1], both[0])]);
		expect(done.map(({ status }) => status).sort()).toEqual(['fulfilled', 'rejected']);
		expect(await own.models.users.count({ where: { role: 'administrator' } })).toBe(1);
	});

	it('of the first administrator is given at the console', async () => {
		const { id, email } = await addPerson(database);
		await appointAdministrator(ground(), email!);
		expect(await showPerson(ground(), admin(), id)).toMatchObject({ role: 'administrator' });
		expect(await deedsOf(id)).toMatchObject([{ actor: null, detail: { to: 'administrator' } }]);
		await expect(appointAdministrator(ground(), 'nobody@example.org')).rejects.toMatchObject({
			code: 'unknown_person'
		});
	});
});

describe('a pause', () => {
	it('holds until its date with its reason, is listed, and ends before where told', async () => {
		const { id } = await addPerson(database, { name: 'Paul' });
		const until = new Date(clock().getTime() + 7 * DAY);
		await pausePerson(
			ground(),
			admin(),
			{ id, version: 1 },
			{ until, reason: 'Too many at once.' }
		);
		expect(await showPerson(ground(), admin(), id)).toMatchObject({
			pausedUntil: until,
			pauseReason: 'Too many at once.'
		});
		const paused = await listPeople(ground(), admin(), { paused: true });
		expect(paused.people.map(({ name }) => name)).toEqual(['Paul']);
		await resumePerson(ground(), admin(), { id, version: 2 });
		expect(await showPerson(ground(), admin(), id)).toMatchObject({
			pausedUntil: null,
			pauseReason: null
		});
		expect((await deedsOf(id)).map(({ action }) => action)).toEqual([
			'person.paused',
			'person.resumed'
		]);
	});
});

describe('sessions of somebody', () => {
	it('are seen and ended by an administrator, one or all, at once', async () => {
		const first = await join(ground(), 'mia@example.org');
		const second = await signIn(ground(), 'mia@example.org');
		await signIn(ground(), 'mia@example.org');
		const { sessions } = await showPerson(ground(), admin(), first.user_id);
		expect(sessions).toHaveLength(3);

		await endSessionsOf(ground(), admin(), first.user_id, first.actor.session);
		expect(await asking(ground(), first.cookie)).toMatchObject({ role: 'visitor' });
		expect(await asking(ground(), second.cookie)).toMatchObject({ id: first.user_id });
		await endSessionsOf(ground(), admin(), first.user_id, 'all');
		expect(await asking(ground(), second.cookie)).toMatchObject({ role: 'visitor' });
		await endSessionsOf(ground(), admin(), first.user_id, 'all');
		expect((await deedsOf(first.user_id)).map(({ detail }) => detail)).toEqual([
			{ sessions: 1 },
			{ sessions: 2 }
		]);
	});

	it('are not ended through another person', async () => {
		const { actor, cookie } = await join(ground(), 'noa@example.org');
		const other = await addPerson(database);
		await endSessionsOf(ground(), admin(), other.id, actor.session);
		expect(await asking(ground(), cookie)).toMatchObject({ id: actor.id });
	});
});

describe('ids that nobody has', () => {
	it('are not there', async () => {
		const unknown = { code: 'unknown_person' };
		const seen = { id: 'f'.repeat(32), version: 1 };
		await expect(showPerson(ground(), admin(), seen.id)).rejects.toMatchObject(unknown);
		await expect(resumePerson(ground(), admin(), seen)).rejects.toMatchObject(unknown);
		await expect(endSessionsOf(ground(), admin(), seen.id, 'all')).rejects.toMatchObject(unknown);
	});
});
