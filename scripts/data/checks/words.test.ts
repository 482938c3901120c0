import { describe, expect, it } from 'vitest';
import { invented } from './invented';
import { check, hashOf } from './words';

describe('words', () => {
	it('accepts a folder without the words', () => {
		expect(check(invented())).toEqual([]);
	});

	it.each([
		['a word', 'kestrel'],
		['two words', 'shop manual']
	])('finds %s by its hash alone, in any case', (_, word) => {
		const hits = check(invented(), new Set([hashOf(word)]));
		expect(hits).toContainEqual({
			file: 'sources.csv',
			line: 2,
			message: 'holds a word that must not be there'
		});
	});
});
