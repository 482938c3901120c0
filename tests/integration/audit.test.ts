import { spawnSync } from 'node:child_process';
import { beforeAll, describe, expect, it } from 'vitest';
import { VISITOR } from '../../src/lib/server/actor';
import { ownTrail, record, trail, verifyChain } from '../../src/lib/server/audit';
import { inTransaction } from '../../src/lib/server/db';
import type { UserRecord } from '../../src/lib/server/db/models';
import { connectAgain, openTestDatabase, type TestDatabase } from '../fixtures/database';
import { actorOf, addPerson } from '../fixtures/people';

let minute = 0;
const clock = () => new Date(Date.UTC(2026, 11, 1, 10, minute++));
let database: TestDatabase;
let admin: UserRecord;
let member: UserRecord;

beforeAll(async () => {
	database = await openTestDatabase();
	admin = await addPerson(database, { name: 'Ada', role: 'administrator' });
	member = await addPerson(database, { name: 'Max' });
});

const write = (action: string, detail = {}) =>
	inTransaction(database, (transaction) =>
		record({ database, clock }, transaction, {
			actor: admin.id,
			action,
			subject: { kind: 'person', id: member.id },
			detail
		})
	);
const tamper = (statement: string) => database.sequelize.query(statement);
/** Runs with the trail spoiled, and puts it back. */
async function spoiled(statement: string, work: () => Promise<void>): Promise<void> {
	const entries = await database.models.audit.findAll({ order: ['number'] });
	const before = entries.map((one) => one.get({ plain: true }));
	await tamper(statement);
	await work();
	await database.models.audit.destroy({ where: {} });
	await database.models.audit.bulkCreate(before);
	expect(await verifyChain(database)).toMatchObject({ holds: true });
}

/** Runs the command that verifies the trail. */
function verify(...noted: string[]) {
	const { status, stdout, stderr } = spawnSync(
		process.execPath,
		['--import', 'tsx', 'scripts/audit/verify.ts', ...noted],
		{ env: { ...process.env, DATABASE_URL: database.url }, encoding: 'utf8' }
	);
	return { status, stdout, stderr };
}

describe('the audit trail', () => {
	it('is empty and whole at first', async () => {
		expect(await verifyChain(database)).toEqual({
			holds: true,
			entries: 0,
			last: '0'.repeat(64)
		});
	});

	it('ties each entry to the one before, whoever writes at the same time', async () => {
		await write('person.role_changed', { from: 'member', to: 'moderator', areas: ['Ford'] });
		const other = connectAgain(database);
		await Promise.all(
			Array.from({ length: 12 }, (_, n) => {
				const on = n % 2 ? other : database;
				return inTransaction(on, (transaction) =>
					record({ database: on, clock }, transaction, {
						actor: null,
						action: 'person.paused',
						subject: { kind: 'person', id: member.id },
						detail: { n }
					})
				);
			})
		);
		const verdict = await verifyChain(database);
		expect(verdict).toMatchObject({ holds: true, entries: 13 });
	});

	it('leaves no entry behind when what it tells did not happen', async () => {
		const failing = inTransaction(database, async (transaction) => {
			await record({ database, clock }, transaction, {
				actor: admin.id,
				action: 'person.paused',
				subject: { kind: 'person', id: member.id }
			});
			throw new Error('did not happen');
		});
		await expect(failing).rejects.toThrow('did not happen');
		expect(await verifyChain(database)).toMatchObject({ entries: 13 });
	});

	it.each([
		['a detail', `UPDATE audit SET detail = '{"n":99}' WHERE number = 5`, 5, 'changed'],
		['who did it', `UPDATE audit SET actor = NULL WHERE number = 1`, 1, 'changed'],
		['when', `UPDATE audit SET at = at + INTERVAL 1 SECOND WHERE number = 7`, 7, 'changed'],
		['an entry taken out', 'DELETE FROM audit WHERE number = 4', 4, 'missing'],
		['a hash', `UPDATE audit SET hash = REPEAT('a', 64) WHERE number = 3`, 3, 'changed']
	])('shows a tampered trail: %s', async (_, statement, number, why) => {
		await spoiled(statement, async () => {
			expect(await verifyChain(database)).toEqual({ holds: false, number, why });
		});
	});

	it('shows an entry that was changed with its own hash made anew, by the next one', async () => {
		const { hashOf } = await import('../../src/lib/server/audit/hash');
		const found = await database.models.audit.findByPk(6, { rejectOnEmpty: true });
		const entry = { ...found.get({ plain: true }), action: 'person.resumed' };
		await spoiled(
			`UPDATE audit SET action = 'person.resumed', hash = '${hashOf(entry)}' WHERE number = 6`,
			async () => {
				expect(await verifyChain(database)).toEqual({ holds: false, number: 7, why: 'not_after' });
			}
		);
	});

	it('shows what was cut off at its end to whoever noted an entry', async () => {
		const verdict = await verifyChain(database);
		if (!verdict.holds) throw new Error('The trail does not hold.');
		const noted = { number: verdict.entries, hash: verdict.last };
		expect(await verifyChain(database, noted)).toEqual(verdict);
		await spoiled('DELETE FROM audit WHERE number > 10', async () => {
			expect(await verifyChain(database)).toMatchObject({ holds: true, entries: 10 });
			expect(await verifyChain(database, noted)).toEqual({
				holds: false,
				number: 11,
				why: 'missing'
			});
		});
		expect(await verifyChain(database, { number: 2, hash: 'f'.repeat(64) })).toEqual({
			holds: false,
			number: 2,
			why: 'not_as_noted'
		});
	});

	it('is verified by a command, which fails on the entry that was changed', async () => {
		const whole = verify();
		expect(whole).toMatchObject({ status: 0, stderr: '' });
		const [said, noted = ''] = whole.stdout.trim().split('\n');
		expect(said).toBe('The audit trail holds: 13 entries');
		expect(noted).toMatch(/^13:[0-9a-f]{64}$/);
		expect(verify(noted)).toMatchObject({ status: 0 });
		await spoiled(`UPDATE audit SET detail = '{"n":99}' WHERE number = 5`, async () => {
			expect(verify()).toMatchObject({
				status: 1,
				stderr: 'The audit trail is broken: entry 5 was changed.\n'
			});
		});
		expect(verify('13')).toMatchObject({ status: 1, stderr: expect.stringContaining('"13"') });
	});
});

describe('reading the trail', () => {
	it('is for administrators', async () => {
		const ground = { database, clock };
		await expect(trail(ground, VISITOR)).rejects.toMatchObject({ code: 'sign_in_needed' });
		await expect(trail(ground, actorOf(member))).rejects.toMatchObject({ code: 'not_allowed' });
	});

	it('gives names as they are today, newest first, a page at a time', async () => {
		for (let n = 0; n < 40; n += 1) await write('person.paused', { n });
		const ground = { database, clock };
		const first = await trail(ground, actorOf(admin));
		expect(first.entries).toHaveLength(50);
		expect(first.entries[0]).toMatchObject({
			number: 53,
			action: 'person.paused',
			actor: { id: admin.id, name: 'Ada' },
			subject: { name: 'Max' }
		});
		const rest = await trail(ground, actorOf(admin), { below: first.next! });
		expect(rest).toMatchObject({ next: null });
		expect(rest.entries.map(({ number }) => number)).toEqual([3, 2, 1]);
		expect((await trail(ground, actorOf(admin), { about: admin.id })).entries).toHaveLength(41);
		expect(await ownTrail(ground, actorOf(member))).toHaveLength(53);
	});
});
