import { setImmediate as nextTurn } from 'node:timers/promises';

/** Requests wait no longer than this for a step of background work, and the step under way. */
const SLICE_MS = 3;

/** Runs work that comes in small steps, and lets the event loop turn every few milliseconds. */
export async function inSlices<T>(steps: Generator<void, T, void>): Promise<T> {
	for (;;) {
		const until = performance.now() + SLICE_MS;
		do {
			const step = steps.next();
			if (step.done === true) return step.value;
		} while (performance.now() < until);
		await nextTurn();
	}
}
