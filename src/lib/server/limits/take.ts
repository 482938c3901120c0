import { createHash } from 'node:crypto';
import { asking } from '../db';
import { counters } from '../db/repositories';
import type { Ground } from '../ground';

/** So many times in a window of so many seconds. Windows are the same for everybody, and do not slide. */
export interface Limit {
	/** What is counted, as `sign_in`. */
	readonly what: string;
	readonly most: number;
	readonly seconds: number;
}

/** It was tried too often; `retryAfterSeconds` is when the window ends. */
export class TooOftenError extends Error {
	readonly code = 'too_often';
	override readonly name = 'TooOftenError';
	constructor(readonly retryAfterSeconds: number) {
		super(`Too many attempts. Try again in ${retryAfterSeconds} seconds.`);
	}
}

/** Keys that are known to be used up, and until when: a flood need not ask the database each time. */
const usedUp = new Map<string, number>();
const MOST_KEYS = 10_000;

/** Addresses of people and machines are counted under a hash, so that no list of them comes about. */
const countedKey = (what: string, who: string): string =>
	`${what}:${createHash('sha256').update(who).digest('base64url').slice(0, 22)}`;

/**
 * Counts one attempt of somebody, in a counter that all processes share.
 * @param who whatever is limited: an address, a person, both
 * @throws {TooOftenError} when that was one too many @throws {DatabaseAwayError}
 */
export async function take(
	{ database, clock }: Ground,
	{ what, most, seconds }: Limit,
	who: string
): Promise<void> {
	const now = clock().getTime();
	const length = seconds * 1000;
	const from = Math.floor(now / length) * length;
	const until = from + length;
	const key = countedKey(what, who);
	const tooOften = () => new TooOftenError(Math.max(1, Math.ceil((until - now) / 1000)));
	if (usedUp.get(key) === until) throw tooOften();
	const used = await asking(() =>
		counters.countOne(database, { key, from: new Date(from), until: new Date(until) })
	);
	if (used <= most) return;
	if (usedUp.size >= MOST_KEYS) usedUp.clear();
	usedUp.set(key, until);
	throw tooOften();
}

/** Takes an attempt back that is not to count, as one that went well. */
export async function giveBack(
	{ database, clock }: Ground,
	{ what, seconds }: Limit,
	who: string
): Promise<void> {
	const length = seconds * 1000;
	const from = new Date(Math.floor(clock().getTime() / length) * length);
	await asking(() => counters.uncountOne(database, { key: countedKey(what, who), from }));
}

/** Counters of windows that have passed. */
export const COUNTER_CLEANERS = [
	({ database, clock }: Ground) => counters.forgetCounters(database, clock())
] as const;
