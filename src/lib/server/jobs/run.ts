import { jobs } from '../db/repositories';
import type { Ground } from '../ground';
import { HopelessJobError, NotNowError, type JobKind } from './kinds';
import { HeldLease, LEASE_MS, type Ended } from './lease';

const MOST_ATTEMPTS = 5;
const FIRST_WAIT_MS = 10_000;
const NOT_NOW_MS = 30_000;
const ERROR_LENGTH = 500;

type JobRecord = NonNullable<Awaited<ReturnType<typeof jobs.takeJob>>>;

/** How long work waits after so many attempts in vain: 10 s, 40 s, 160 s and so on. */
export const waitAfter = (attempts: number): number => FIRST_WAIT_MS * 4 ** (attempts - 1);

export interface Working extends Ground {
	readonly kinds: readonly JobKind[];
	/** Names this worker among all others. */
	readonly worker: string;
	/** Aborted when the worker ends: work under way is given back, to go on elsewhere. */
	readonly signal: AbortSignal;
	/** Is told of a heartbeat that failed; the work goes on. */
	readonly failed?: (error: unknown) => void;
	/** Milliseconds between two heartbeats; a quarter of the lease when left out. */
	readonly heartbeatMs?: number;
}

/** What became of one piece of work. */
export interface Done {
	readonly id: string;
	readonly kind: string;
	readonly result: 'done' | 'stopped' | 'given_back' | 'taken_over' | 'later' | 'failed';
	readonly error?: unknown;
}

/**
 * Does the work that has been due longest.
 * @returns null when nothing is due that this worker knows how to do
 */
export async function runNext(working: Working): Promise<Done | null> {
	const { database, clock, kinds, worker } = working;
	if (kinds.length === 0) return null;
	const now = clock();
	const job = await jobs.takeJob(
		database,
		kinds.map(({ kind }) => kind),
		now,
		{ worker, until: new Date(now.getTime() + LEASE_MS) }
	);
	if (job === null) return null;
	const kind = kinds.find((one) => one.kind === job.kind)!;
	const told = await work(working, job, kind);
	return { id: job.id, kind: job.kind, ...told };
}

type Told = Omit<Done, 'id' | 'kind'>;

async function work(working: Working, job: JobRecord, kind: JobKind): Promise<Told> {
	const { database, clock, worker, signal, failed = () => {}, heartbeatMs } = working;
	const { id, user_id, checkpoint } = job;
	if (job.stop_asked_at !== null) return endEarly(working, job, kind, 'stopped');
	// Nobody reported how the last attempts ended: the work may be what its workers died of.
	if (job.attempts > MOST_ATTEMPTS)
		return endEarly(working, job, kind, 'failed', new Error('Every attempt was broken off.'));
	const lease = new HeldLease({ database, clock, id, worker, signal, failed, heartbeatMs });
	try {
		const payload = kind.payload.parse(job.payload);
		const { report } = lease;
		await kind.run({
			database,
			clock,
			id,
			payload,
			user_id,
			checkpoint,
			signal: lease.signal,
			report
		});
		await lease.release();
	} catch (error) {
		await lease.release();
		return broken(working, job, kind, lease.ended, error);
	}
	await giveBack(working, job, { state: 'done', finished_at: clock(), last_error: null });
	return { result: 'done' };
}

/** What becomes of work that did not come to its end. */
async function broken(
	working: Working,
	job: JobRecord,
	kind: JobKind,
	ended: Ended | null,
	error: unknown
): Promise<Told> {
	const now = working.clock().getTime();
	if (ended === 'taken_over') return { result: 'taken_over' };
	if (ended === 'stopped') return endEarly(working, job, kind, 'stopped');
	if (ended === 'worker_ends') {
		// It did nothing wrong, so that the attempt does not count.
		await giveBack(working, job, { state: 'due', attempts: job.attempts - 1 });
		return { result: 'given_back' };
	}
	const notNow = error instanceof NotNowError;
	if (error instanceof HopelessJobError || (job.attempts >= MOST_ATTEMPTS && !notNow))
		return endEarly(working, job, kind, 'failed', error);
	await giveBack(working, job, {
		state: 'due',
		attempts: notNow ? job.attempts - 1 : job.attempts,
		due_at: new Date(now + (notNow ? NOT_NOW_MS : waitAfter(job.attempts))),
		last_error: messageOf(error)
	});
	return { result: 'later', error };
}

const messageOf = (error: unknown): string =>
	String(error instanceof Error ? error.message : error).slice(0, ERROR_LENGTH);

const giveBack = (
	{ database, worker }: Working,
	{ id }: JobRecord,
	outcome: Parameters<typeof jobs.giveBackJob>[3]
): Promise<boolean> => jobs.giveBackJob(database, id, worker, outcome);

async function endEarly(
	working: Working,
	job: JobRecord,
	kind: JobKind,
	how: 'failed' | 'stopped',
	error?: unknown
): Promise<Told> {
	const { database, clock } = working;
	// First whoever waits for it: a worker that dies in between leaves the work to be ended again.
	const payload = kind.payload.safeParse(job.payload);
	if (payload.success)
		await kind.broken?.(how, { database, clock, payload: payload.data, user_id: job.user_id });
	const last_error = error === undefined ? job.last_error : messageOf(error);
	await giveBack(working, job, { state: how, finished_at: clock(), last_error });
	return { result: how, ...(error !== undefined && { error }) };
}
