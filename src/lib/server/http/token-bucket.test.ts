import { describe, expect, it } from 'vitest';
import { TokenBuckets } from './token-bucket';

describe('a token bucket', () => {
	it('gives a minute’s tokens at once, then says how long to wait', () => {
		let now = 0;
		const buckets = new TokenBuckets(3, () => now);
		expect([1, 2, 3].map(() => buckets.take('192.0.2.1'))).toEqual([0, 0, 0]);
		expect(buckets.take('192.0.2.1')).toBe(20);
		now = 19_999;
		expect(buckets.take('192.0.2.1')).toBe(1);
		now = 20_000;
		expect(buckets.take('192.0.2.1')).toBe(0);
	});

	it('never holds more than a minute’s tokens', () => {
		let now = 0;
		const buckets = new TokenBuckets(2, () => now);
		buckets.take('192.0.2.1');
		now = 3_600_000;
		expect([1, 2].map(() => buckets.take('192.0.2.1'))).toEqual([0, 0]);
		expect(buckets.take('192.0.2.1')).toBeGreaterThan(0);
	});

	it('counts each address by itself', () => {
		const buckets = new TokenBuckets(1, () => 0);
		expect(buckets.take('192.0.2.1')).toBe(0);
		expect(buckets.take('192.0.2.2')).toBe(0);
		expect(buckets.take('192.0.2.1')).toBe(60);
	});

	it('takes no more than a whole bucket for a dear request', () => {
		const buckets = new TokenBuckets(5, () => 0);
		expect(buckets.take('192.0.2.1', 20)).toBe(0);
		expect(buckets.take('192.0.2.1')).toBe(12);
	});

	it('takes tokens afterwards, and lets nobody owe more than a minute', () => {
		let now = 0;
		const buckets = new TokenBuckets(60, () => now);
		buckets.take('192.0.2.1');
		buckets.charge('192.0.2.1', 58);
		expect(buckets.take('192.0.2.1')).toBe(0);
		buckets.charge('192.0.2.1', 1_000_000);
		expect(buckets.take('192.0.2.1')).toBe(61);
		now = 61_000;
		expect(buckets.take('192.0.2.1')).toBe(0);
		buckets.charge('192.0.2.9', 1);
		expect(buckets.size).toBe(1);
	});

	it('stays bounded, and forgets full buckets before empty ones', () => {
		let now = 0;
		const buckets = new TokenBuckets(10, () => now, 10);
		buckets.take('192.0.2.99', 10);
		for (let n = 0; n < 9; n += 1) buckets.take(`192.0.2.${n}`);
		now = 6_000;
		buckets.take('198.51.100.1');
		expect(buckets.size).toBe(2);
		expect(buckets.take('192.0.2.99', 10)).toBeGreaterThan(0);
		for (let n = 0; n < 100; n += 1) buckets.take(`203.0.113.${n}`, 10);
		expect(buckets.size).toBeLessThanOrEqual(10);
	});
});
