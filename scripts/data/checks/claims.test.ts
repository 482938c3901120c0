import { describe, expect, it } from 'vitest';
import { check } from './claims';
import { invented } from './invented';

describe('claims', () => {
	it('accepts a claim that a published work supports', () => {
		expect(check(invented())).toEqual([]);
	});

	it.each([
		['memory', 'kestrel-manual', 'memory', 1],
		['a table that is not there', 'gm,paint', 'gm,roof', 1],
		['a Ford table, which is not there either', 'gm,paint', 'ford,paint', 2]
	])('refuses a claim on %s', (_, from, to, count) => {
		expect(check(invented({ 'claims.csv': [from, to] }))).toHaveLength(count);
	});
});
