import { randomBytes } from 'node:crypto';
import { hostname } from 'node:os';
import { setTimeout as pause } from 'node:timers/promises';
import { isAway } from './db';
import type { Ground } from './ground';
import { queueRepeated, runNext, type JobKind, type Repeated } from './jobs';
import type { Log } from './log';
import { sendNext, type Post } from './mail';

export interface WorkerParts extends Ground {
	readonly log: Log;
	/** Null: mail waits in the outbox. */
	readonly post: Post | null;
	readonly kinds: readonly JobKind[];
	readonly repeated: readonly Repeated[];
	/** Milliseconds between two looks when there was nothing to do; a second when left out. */
	readonly idleMs?: number;
}

export interface Worker {
	/** Ends it: mail under way is sent, work under way is given back to go on elsewhere. */
	stop(): Promise<void>;
}

const JOBS_AT_ONCE = 2;
const AWAY_MS = 2_000;
const REPEATED_LOOK_MS = 30_000;

/**
 * Sends mail and does jobs until it is stopped. Any number of workers may run, on any machine; each
 * takes what no other has. Does not end with the database: it waits until that is back.
 */
export function startWorker(parts: WorkerParts): Worker {
	const { database, clock, log, post, kinds, repeated, idleMs = 1_000 } = parts;
	const worker = `${hostname().slice(0, 32)}:${process.pid}:${randomBytes(4).toString('hex')}`;
	const end = new AbortController();
	const { signal } = end;
	const failed = (error: unknown) => log.warn({ err: error, worker }, 'heartbeat');

	/** Steps until the end, at once while there is something to do. */
	async function loop(step: () => Promise<boolean>, idle: number): Promise<void> {
		let away = false;
		while (!signal.aborted) {
			let wait = idle;
			try {
				if (await step()) wait = 0;
				away = false;
			} catch (error) {
				wait = AWAY_MS;
				// Said once, and again when it was back in between.
				if (!isAway(error)) log.error({ err: error, worker }, 'worker');
				else if (!away) log.warn({ err: error, worker }, 'database away');
				away = isAway(error);
			}
			// Its end breaks the pause off; the loop sees that by itself.
			if (wait > 0) await pause(wait, undefined, { signal }).catch(() => undefined);
		}
	}

	async function mail(): Promise<boolean> {
		const sent = post && (await sendNext({ database, clock, post, worker }));
		if (sent === null) return false;
		if (sent.result === 'sent') log.info({ mail: sent.id }, 'mail sent');
		else if (sent.result === 'later') log.warn({ mail: sent.id, err: sent.error }, 'mail waits');
		else log.error({ mail: sent.id, err: sent.error }, 'mail given up');
		return true;
	}

	async function job(): Promise<boolean> {
		const done = await runNext({ database, clock, kinds, worker, signal, failed });
		if (done === null) return false;
		const { id, kind, result, error } = done;
		const fields = { job: id, kind, ...(error !== undefined && { err: error }) };
		if (result === 'failed') log.error(fields, 'job given up');
		else if (result === 'later') log.warn(fields, 'job waits');
		else log.info(fields, `job ${result}`);
		return true;
	}

	async function repeat(): Promise<boolean> {
		await queueRepeated({ database, clock }, repeated);
		return false;
	}

	const loops = [
		loop(mail, idleMs),
		...Array.from({ length: JOBS_AT_ONCE }, () => loop(job, idleMs)),
		loop(repeat, REPEATED_LOOK_MS)
	];
	return {
		stop: async () => {
			end.abort();
			await Promise.all(loops);
		}
	};
}
