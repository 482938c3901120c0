import type { Ground } from '../ground';
import { queueJob } from './queue';

/** Work that is done again and again, at even distances. */
export interface Repeated {
	readonly kind: string;
	/** Milliseconds from one time to the next. */
	readonly every: number;
	/** Milliseconds after midnight UTC, for what is done at an hour of the day. */
	readonly at?: number;
}

/** When something repeated was last due, up to now. */
export function lastDue({ every, at = 0 }: Repeated, now: Date): Date {
	return new Date(Math.floor((now.getTime() - at) / every) * every + at);
}

/**
 * Queues what is due again, once for all workers. What was missed while no worker ran is made up for
 * once, not as often as it was missed.
 */
export async function queueRepeated(ground: Ground, repeated: readonly Repeated[]): Promise<void> {
	for (const one of repeated) {
		const due = lastDue(one, ground.clock());
		await queueJob(ground, {
			kind: one.kind,
			payload: { due: due.toISOString() },
			user_id: null,
			dueAt: due,
			onceKey: `${one.kind}@${due.toISOString()}`
		});
	}
}
