import type { z } from 'zod';
import type { Ground } from '../ground';

/** What a piece of work has in hand while it is done. */
export interface JobRun<Payload> extends Ground {
	readonly id: string;
	readonly payload: Payload;
	/** For whom; null for what the product does of its own accord. */
	readonly user_id: string | null;
	/** What was last reported before a break; null at the first run. */
	readonly checkpoint: unknown;
	/** Aborted when the work shall stop, when the worker ends, or when another has taken the work over. */
	readonly signal: AbortSignal;
	/**
	 * Writes how far it is, and where to go on after a break.
	 * @throws {JobBrokenOffError} it shall go no further
	 */
	report(progress: Progress): Promise<void>;
}

export interface Progress {
	readonly done: number;
	/** Left out where it is not known. */
	readonly of?: number;
	/** JSON; kept as it was when left out. */
	readonly checkpoint?: unknown;
}

/** One kind of work and how it is done. Work can be begun again at any point: after a break it is. */
export interface JobKind<Payload = unknown> {
	readonly kind: string;
	readonly payload: z.ZodType<Payload>;
	run(run: JobRun<Payload>): Promise<void>;
	/** Is told when the work has ended before its end: given up after several attempts, or stopped. */
	broken?(
		how: 'failed' | 'stopped',
		run: Pick<JobRun<Payload>, 'database' | 'clock' | 'payload' | 'user_id'>
	): Promise<void>;
}

/** Ends work that shall go no further; what it reported stays. */
export class JobBrokenOffError extends Error {
	readonly code = 'job_broken_off';
	override readonly name = 'JobBrokenOffError';
}

/** Work that is not to be tried again: it would fail the same way. */
export class HopelessJobError extends Error {
	readonly code = 'job_hopeless';
	override readonly name = 'HopelessJobError';
}

/** Something that the work needs is away: it is tried again in a while, as often as it takes. */
export class NotNowError extends Error {
	readonly code = 'job_not_now';
	override readonly name = 'NotNowError';
}

/** There is no such work, or it is somebody else's. */
export class UnknownJobError extends Error {
	readonly code = 'unknown_job';
	override readonly name = 'UnknownJobError';
	constructor(readonly id: string) {
		super('There is no such work.');
	}
}
