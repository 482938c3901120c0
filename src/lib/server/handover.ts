import type { Config } from './config';
import type { Log, maskAddress } from './log';

/**
 * What the own server (scripts/server) takes from the application. It runs outside the bundle, so
 * that both would otherwise read the environment and open the log on their own.
 */
export interface Handover {
	readonly config: Config;
	readonly log: Log;
	readonly maskAddress: typeof maskAddress;
	/** What pages are made from now: what was made from something else is out of date. */
	readonly present: () => string;
	/** Closes what the application holds open; waits until it is. */
	readonly stop: () => Promise<void>;
}

const HANDOVER = Symbol.for('tallyplate.handover');

/** Leaves the parts where the own server looks for them. */
export function handOver(parts: Handover): void {
	Object.defineProperty(globalThis, HANDOVER, { value: parts, configurable: true });
}
