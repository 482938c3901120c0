import { setTimeout as pause } from 'node:timers/promises';

/** Longer than any of the work whose length could tell something. */
const STEADY_MS = 250;

/**
 * Does work whose answer is the same for known and unknown addresses, and lets it take the same time:
 * writing a mail or none must not show.
 */
export async function inSteadyTime<T>(work: () => Promise<T>, ms = STEADY_MS): Promise<T> {
	const [done] = await Promise.all([work(), pause(ms)]);
	return done;
}
