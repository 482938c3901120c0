import { describe, expect, it } from 'vitest';
import { invented } from './invented';
import { check } from './scope';

describe('scope', () => {
	it('accepts divisions of the maker, lines that a row names, and the three markets', () => {
		expect(check(invented())).toEqual([]);
	});

	it.each([
		['a division of another maker', 'gm/paint.csv', 'Pontiac', 'Dodge', 'no division of gm'],
		['a line that no row names', 'gm/engine.csv', ',Kestrel,', ',Kestral,', 'names the line'],
		['a market that is none', 'gm/paint.csv', ',US,', ',Mars,', 'no market'],
		['a claim for a line that no row names', 'claims.csv', 'Kestrel', 'Kestral', 'names the line']
	])('refuses %s', (_, file, from, to, message) => {
		expect(check(invented({ [file]: [from, to] }))).toEqual([
			{ file, line: expect.any(Number), message: expect.stringContaining(message) }
		]);
	});
});
