import { requireMember, type Actor } from '../actor';
import { asking } from '../db';
import { jobs } from '../db/repositories';
import type { Ground } from '../ground';
import type { JobState } from '../../types';
import { UnknownJobError } from './kinds';

/** Work that is done for somebody, as they see it. */
export interface WorkInHand {
	readonly id: string;
	readonly kind: string;
	readonly state: JobState;
	/** Its end was asked for, and its worker has not come to it yet. */
	readonly stopping: boolean;
	readonly done: number;
	/** Null where it is not known. */
	readonly of: number | null;
	/** Has failed before, and will be tried again at `dueAt`. */
	readonly again: boolean;
	readonly dueAt: Date;
	readonly createdAt: Date;
	readonly finishedAt: Date | null;
}

const MOST = 50;

/** What is done for the one who asks, newest first. @throws {SignInNeededError} @throws {DatabaseAwayError} */
export async function workFor({ database }: Ground, actor: Actor): Promise<WorkInHand[]> {
	requireMember(actor);
	const found = await asking(() => jobs.jobsFor(database, actor.id, MOST));
	return found.map((job) => ({
		id: job.id,
		kind: job.kind,
		state: job.state,
		stopping: job.stop_asked_at !== null && (job.state === 'running' || job.state === 'due'),
		done: job.progress,
		of: job.total,
		again: job.state === 'due' && job.attempts > 0,
		dueAt: job.due_at,
		createdAt: job.created_at,
		finishedAt: job.finished_at
	}));
}

/**
 * Asks for an end of work that is done for the one who asks. Work that has ended stays as it is.
 * @throws {SignInNeededError} @throws {UnknownJobError} @throws {DatabaseAwayError}
 */
export async function stopWork(
	{ database, clock }: Ground,
	actor: Actor,
	id: string
): Promise<void> {
	requireMember(actor);
	await asking(async () => {
		const job = await jobs.jobById(database, id);
		if (job === null || job.user_id !== actor.id) throw new UnknownJobError(id);
		await jobs.askJobToStop(database, id, clock());
	});
}
