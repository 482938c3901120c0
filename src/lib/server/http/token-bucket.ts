import { accountOf } from '../networks';

interface Bucket {
	tokens: number;
	at: number;
}

/**
 * Token buckets by address, in this process alone. A bucket holds a minute's tokens and fills evenly.
 * Bounded: beyond `most` addresses the full buckets go first, then the oldest tenth.
 */
export class TokenBuckets {
	readonly #perMinute: number;
	readonly #now: () => number;
	readonly #most: number;
	readonly #buckets = new Map<string, Bucket>();

	/** @param now milliseconds that only grow */
	constructor(perMinute: number, now: () => number = () => performance.now(), most = 50_000) {
		this.#perMinute = perMinute;
		this.#now = now;
		this.#most = most;
	}

	get size(): number {
		return this.#buckets.size;
	}

	/** Takes tokens. Answers 0 when they were there, else the whole seconds to wait. */
	take(address: string, cost = 1): number {
		const now = this.#now();
		const account = accountOf(address);
		let bucket = this.#buckets.get(account);
		if (bucket === undefined) {
			if (this.#buckets.size >= this.#most) this.#forget(now);
			bucket = { tokens: this.#perMinute, at: now };
			this.#buckets.set(account, bucket);
		} else {
			this.#fill(bucket, now);
		}
		const price = Math.min(cost, this.#perMinute);
		if (bucket.tokens >= price) {
			bucket.tokens -= price;
			return 0;
		}
		return Math.max(1, Math.ceil(((price - bucket.tokens) * 60) / this.#perMinute));
	}

	/** Takes tokens for what is done already; a bucket can owe a minute's tokens at most. */
	charge(address: string, cost: number): void {
		const bucket = this.#buckets.get(accountOf(address));
		if (bucket) bucket.tokens = Math.max(-this.#perMinute, bucket.tokens - cost);
	}

	#fill(bucket: Bucket, now: number): void {
		const gained = ((now - bucket.at) * this.#perMinute) / 60_000;
		bucket.tokens = Math.min(this.#perMinute, bucket.tokens + gained);
		bucket.at = now;
	}

	#forget(now: number): void {
		for (const [account, bucket] of this.#buckets) {
			this.#fill(bucket, now);
			if (bucket.tokens >= this.#perMinute) this.#buckets.delete(account);
		}
		for (const account of this.#buckets.keys()) {
			if (this.#buckets.size <= this.#most * 0.9) break;
			this.#buckets.delete(account);
		}
	}
}
