import { jobs } from '../db/repositories';
import type { Ground } from '../ground';
import { JobBrokenOffError, type Progress } from './kinds';

/** Work is another's when its worker was not heard of for so long. */
export const LEASE_MS = 60_000;
const HEARTBEAT_MS = LEASE_MS / 4;

/** Why work goes no further. */
export type Ended = 'stopped' | 'worker_ends' | 'taken_over';

/**
 * A worker's hold on one piece of work. Beats until it is let go, and aborts the work when somebody
 * has asked for its end, when the worker ends, or when another has taken it over.
 */
export class HeldLease {
	readonly #abort = new AbortController();
	readonly #timer: NodeJS.Timeout;
	#beating: Promise<void> = Promise.resolve();
	#ended: Ended | null = null;

	constructor(
		private readonly held: Ground & {
			readonly id: string;
			readonly worker: string;
			/** Aborted when the worker ends. */
			readonly signal: AbortSignal;
			readonly failed: (error: unknown) => void;
			readonly heartbeatMs?: number;
		}
	) {
		this.#timer = setInterval(() => {
			this.#beating = this.#beat({}).catch(held.failed);
		}, held.heartbeatMs ?? HEARTBEAT_MS);
		held.signal.addEventListener('abort', this.#workerEnds);
		if (held.signal.aborted) this.#workerEnds();
	}

	get signal(): AbortSignal {
		return this.#abort.signal;
	}

	/** Why the work was broken off; null while it may go on. */
	get ended(): Ended | null {
		return this.#ended;
	}

	/** @throws {JobBrokenOffError} */
	report = async ({ done, of, checkpoint }: Progress): Promise<void> => {
		await this.#beat({
			progress: done,
			...(of !== undefined && { total: of }),
			...(checkpoint !== undefined && { checkpoint })
		});
		this.signal.throwIfAborted();
	};

	/** Beats no more; waits for a beat under way, so that none follows the end of the work. */
	async release(): Promise<void> {
		clearInterval(this.#timer);
		this.held.signal.removeEventListener('abort', this.#workerEnds);
		await this.#beating;
	}

	#workerEnds = (): void => this.#end('worker_ends');

	#end(why: Ended): void {
		if (this.#ended !== null) return;
		this.#ended = why;
		this.#abort.abort(new JobBrokenOffError(why));
	}

	async #beat(report: Parameters<typeof jobs.reportJob>[3]): Promise<void> {
		const { database, clock, id, worker } = this.held;
		const taken_until = new Date(clock().getTime() + LEASE_MS);
		const answer = await jobs.reportJob(database, id, worker, { ...report, taken_until });
		if (answer === null) this.#end('taken_over');
		else if (answer.stop) this.#end('stopped');
	}
}
