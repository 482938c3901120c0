import { spawn } from 'node:child_process';
import { once } from 'node:events';
import { beforeAll, beforeEach, describe, expect, it } from 'vitest';
import { z } from 'zod';
import { VISITOR } from '../../src/lib/server/actor';
import type { JobRecord } from '../../src/lib/server/db/models';
import {
	HopelessJobError,
	NotNowError,
	queueJob,
	queueRepeated,
	runNext,
	stopWork,
	workFor,
	type JobKind,
	type JobRun,
	type Work
} from '../../src/lib/server/jobs';
import { DAY, HOUR, MINUTE, standingClock } from '../fixtures/clock';
import { connectAgain, openTestDatabase, type TestDatabase } from '../fixtures/database';
import { actorOf, addPerson } from '../fixtures/people';

let database: TestDatabase;
let { clock, ahead } = standingClock();
let ann: ReturnType<typeof actorOf>;
let bob: ReturnType<typeof actorOf>;

beforeAll(async () => {
	database = await openTestDatabase();
	[ann, bob] = [actorOf(await addPerson(database)), actorOf(await addPerson(database))];
});
beforeEach(async () => {
	({ clock, ahead } = standingClock());
	await database.models.jobs.destroy({ where: {} });
});

/** A kind whose work is told by the test. */
const counting = (
	run: (run: JobRun<{ to: number }>) => Promise<void>,
	more: Partial<JobKind<{ to: number }>> = {}
): JobKind => ({ kind: 'count', payload: z.object({ to: z.number() }), run, ...more });

const queue = (work: Partial<Work> = {}) =>
	queueJob({ database, clock }, { kind: 'count', payload: { to: 10 }, user_id: ann.id, ...work });
const never = new AbortController().signal;
const run = (kind: JobKind, { worker = 'one', signal = never, heartbeatMs = 1_000 } = {}) =>
	runNext({ database, clock, kinds: [kind], worker, signal, heartbeatMs });
const rows = async (): Promise<JobRecord[]> =>
	(await database.models.jobs.findAll()).map((row) => row.get({ plain: true }));
const onlyRow = async () => {
	const all = await rows();
	expect(all).toHaveLength(1);
	return all[0]!;
};
const mine = async () => (await workFor({ database, clock }, ann))[0]!;

/** Work that counts, and waits at a number until it is let go. */
function gated(at: number) {
	let arrive = () => {};
	let open = () => {};
	const arrived = new Promise<void>((done) => (arrive = done));
	const opened = new Promise<void>((done) => (open = done));
	const kind = counting(async ({ report, payload }) => {
		for (let n = 1; n <= payload.to; n += 1) {
			await report({ done: n, of: payload.to });
			if (n === at) {
				arrive();
				await opened;
			}
		}
	});
	return { kind, arrived, open };
}

describe('a job', () => {
	it('is done when it is due, and shows how far it is', async () => {
		await queue({ dueAt: new Date(clock().getTime() + HOUR) });
		const { kind, arrived, open } = gated(3);
		expect(await run(kind)).toBeNull();
		ahead(HOUR);
		const running = run(kind);
		await arrived;
		expect(await mine()).toMatchObject({ state: 'running', done: 3, of: 10, stopping: false });
		open();
		expect(await running).toMatchObject({ result: 'done' });
		expect(await mine()).toMatchObject({ state: 'done', done: 10, finishedAt: clock() });
		expect(await run(kind)).toBeNull();
	});

	it('that fails is tried again after longer and longer, and given up at last', async () => {
		await queue();
		const told: unknown[] = [];
		const broken = counting(
			async () => {
				throw new Error('no luck');
			},
			{ broken: async (how, { payload, user_id }) => void told.push({ how, payload, user_id }) }
		);
		const waits: number[] = [];
		for (let attempt = 1; attempt < 5; attempt += 1) {
			expect(await run(broken)).toMatchObject({ result: 'later' });
			expect(await mine()).toMatchObject({ state: 'due', again: true });
			const { due_at } = await onlyRow();
			waits.push((due_at.getTime() - clock().getTime()) / 1000);
			ahead(due_at.getTime() - clock().getTime());
		}
		expect(waits).toEqual([10, 40, 160, 640]);
		expect(told).toEqual([]);
		expect(await run(broken)).toMatchObject({ result: 'failed' });
		expect(told).toEqual([{ how: 'failed', payload: { to: 10 }, user_id: ann.id }]);
		expect(await onlyRow()).toMatchObject({ state: 'failed', last_error: 'no luck' });
	});

	it('that needs what is away is tried again as often as it takes', async () => {
		await queue();
		const away = counting(async () => {
			throw new NotNowError('the store is away');
		});
		for (let attempt = 1; attempt <= 12; attempt += 1) {
			expect(await run(away)).toMatchObject({ result: 'later' });
			ahead(MINUTE);
		}
		expect(await onlyRow()).toMatchObject({ state: 'due', last_error: 'the store is away' });
	});

	it('that cannot be done is given up at once', async () => {
		await queue();
		const hopeless = counting(async () => {
			throw new HopelessJobError('cannot be done');
		});
		expect(await run(hopeless)).toMatchObject({ result: 'failed' });
	});

	it('whose payload is of another shape is given up and never run', async () => {
		await queue({ payload: { to: 'ten' } });
		for (let attempt = 1; attempt <= 5; attempt += 1) {
			await run(gated(0).kind);
			ahead(HOUR);
		}
		expect(await onlyRow()).toMatchObject({ state: 'failed', progress: 0 });
	});

	it('of a kind that the worker does not know is left to others', async () => {
		await queue({ kind: 'other' });
		expect(await run(gated(0).kind)).toBeNull();
	});
});

describe('an end', () => {
	it('is asked for by its owner, and comes at the next report', async () => {
		await queue();
		const { kind, arrived, open } = gated(3);
		const running = run(kind);
		await arrived;
		await stopWork({ database, clock }, ann, (await mine()).id);
		expect(await mine()).toMatchObject({ state: 'running', stopping: true });
		open();
		expect(await running).toMatchObject({ result: 'stopped' });
		expect(await mine()).toMatchObject({ state: 'stopped', done: 4 });
		ahead(DAY);
		expect(await run(kind)).toBeNull();
	});

	it('comes at a heartbeat to work that reports nothing', async () => {
		await queue();
		const silent = counting(
			({ signal }) =>
				new Promise((_, reject) => signal.addEventListener('abort', () => reject(signal.reason)))
		);
		const running = run(silent, { heartbeatMs: 20 });
		await expect.poll(async () => (await mine()).state).toBe('running');
		await stopWork({ database, clock }, ann, (await mine()).id);
		expect(await running).toMatchObject({ result: 'stopped' });
	});

	it('comes to work that waits before it has begun, and is told to what hangs on it', async () => {
		await queue({ dueAt: new Date(clock().getTime() + DAY) });
		await stopWork({ database, clock }, ann, (await mine()).id);
		expect(await mine()).toMatchObject({ state: 'due', stopping: true });
		const told: string[] = [];
		const kind = counting(async () => void told.push('run'), {
			broken: async (how) => void told.push(how)
		});
		expect(await run(kind)).toMatchObject({ result: 'stopped' });
		expect(told).toEqual(['stopped']);
		expect(await mine()).toMatchObject({ state: 'stopped', stopping: false });
	});

	it('holds for work whose worker died before it heard of it', async () => {
		await queue();
		const { kind, arrived } = gated(3);
		void run(kind, { worker: 'dead' });
		await arrived;
		await stopWork({ database, clock }, ann, (await mine()).id);
		ahead(2 * MINUTE);
		expect(await run(kind, { worker: 'two' })).toMatchObject({ result: 'stopped' });
	});

	it('is nobody else’s to ask for', async () => {
		const id = (await queue())!;
		await expect(stopWork({ database, clock }, bob, id)).rejects.toMatchObject({
			code: 'unknown_job'
		});
		await expect(stopWork({ database, clock }, ann, 'no such')).rejects.toMatchObject({
			code: 'unknown_job'
		});
		await expect(stopWork({ database, clock }, VISITOR, id)).rejects.toMatchObject({
			code: 'sign_in_needed'
		});
		expect(await workFor({ database, clock }, bob)).toEqual([]);
	});
});

describe('workers', () => {
	it('never do a job twice, however many there are', async () => {
		const jobs = 24;
		for (let n = 0; n < jobs; n += 1) await queue({ payload: { to: n } });
		const done: number[] = [];
		const kind = counting(async ({ payload }) => {
			await new Promise((later) => setTimeout(later, 5));
			done.push(payload.to);
		});
		const work = async (worker: string) => {
			const own = connectAgain(database);
			const working = { database: own, clock, kinds: [kind], worker, signal: never };
			while (await runNext(working));
		};
		await Promise.all(['one', 'two', 'three', 'four'].map(work));
		expect(done.sort((a, b) => a - b)).toEqual(Array.from({ length: jobs }, (_, n) => n));
	});

	it('that are killed leave their job to the next, which goes on where they were', async () => {
		await queue();
		const child = spawn(
			process.execPath,
			['--import', 'tsx', 'tests/fixtures/dying-worker.ts', database.url, clock().toISOString()],
			{ stdio: ['ignore', 'inherit', 'inherit'] }
		);
		const [, signal] = await once(child, 'exit');
		expect(signal).toBe('SIGKILL');
		expect(await mine()).toMatchObject({ state: 'running', done: 4, of: 10 });
		const begunAt: unknown[] = [];
		const kind = counting(async ({ checkpoint }) => void begunAt.push(checkpoint));
		expect(await run(kind)).toBeNull();
		ahead(2 * MINUTE);
		expect(await run(kind)).toMatchObject({ result: 'done' });
		expect(begunAt).toEqual([{ next: 4 }]);
	});

	it('that all die of one job give it up', async () => {
		await queue();
		const told: unknown[] = [];
		const deadly = counting(() => new Promise(() => {}), {
			broken: async (_how, { payload }) => void told.push(payload)
		});
		for (let attempt = 1; attempt <= 5; attempt += 1) {
			void run(deadly, { worker: `dead ${attempt}`, heartbeatMs: HOUR });
			await expect.poll(async () => (await onlyRow()).attempts).toBe(attempt);
			ahead(2 * MINUTE);
		}
		expect(await run(deadly)).toMatchObject({ result: 'failed' });
		expect(told).toEqual([{ to: 10 }]);
	});

	it('lose a job that was taken over, and change nothing about it any more', async () => {
		await queue();
		const { kind, arrived, open } = gated(3);
		const slow = run(kind, { worker: 'slow', heartbeatMs: HOUR });
		await arrived;
		ahead(2 * MINUTE);
		expect(
			await run(
				counting(async () => {}),
				{ worker: 'two' }
			)
		).toMatchObject({
			result: 'done'
		});
		open();
		expect(await slow).toMatchObject({ result: 'taken_over' });
		expect(await onlyRow()).toMatchObject({ state: 'done', progress: 3, attempts: 2 });
	});

	it('keep a job for as long as they beat', async () => {
		await queue();
		const { kind, arrived, open } = gated(1);
		const running = run(kind, { heartbeatMs: 20 });
		await arrived;
		ahead(50_000);
		const until = clock().getTime() + 60_000;
		await expect.poll(async () => (await onlyRow()).taken_until?.getTime()).toBe(until);
		ahead(50_000);
		expect(await run(kind, { worker: 'two' })).toBeNull();
		open();
		expect(await running).toMatchObject({ result: 'done' });
	});

	it('that end give their job back, and its attempt does not count', async () => {
		await queue();
		const end = new AbortController();
		const { kind, arrived, open } = gated(3);
		const running = run(kind, { signal: end.signal });
		await arrived;
		end.abort();
		open();
		expect(await running).toMatchObject({ result: 'given_back' });
		expect(await onlyRow()).toMatchObject({ state: 'due', attempts: 0, taken_by: null });
	});
});

describe('what is done again and again', () => {
	const daily = { kind: 'count', every: DAY, at: 7 * HOUR };

	it('is queued once each time, whoever asks', async () => {
		const ground = { database, clock };
		await Promise.all([queueRepeated(ground, [daily]), queueRepeated(ground, [daily])]);
		expect(await onlyRow()).toMatchObject({
			user_id: null,
			due_at: new Date('2026-06-12T07:00:00.000Z')
		});
		ahead(22 * HOUR);
		await queueRepeated(ground, [daily]);
		expect(await rows()).toHaveLength(1);
		ahead(HOUR);
		await queueRepeated(ground, [daily]);
		expect(await rows()).toHaveLength(2);
	});

	it('is made up for once when it was missed many times', async () => {
		const ground = { database, clock };
		await queueRepeated(ground, [daily]);
		ahead(9 * DAY);
		await queueRepeated(ground, [daily]);
		expect(await rows()).toHaveLength(2);
	});
});
