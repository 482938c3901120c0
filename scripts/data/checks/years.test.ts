import { describe, expect, it } from 'vitest';
import { invented } from './invented';
import { check } from './years';

describe('years', () => {
	it('accepts years inside the life of the division', () => {
		expect(check(invented())).toEqual([]);
	});

	it.each([
		['one end only', '1966,1966', '1966,', 'both or neither'],
		['years that run backwards', '1966,1966', '1967,1966', 'backwards'],
		['cars built after the division ended', '1966,1966', '1966,2012', 'built no cars']
	])('refuses %s', (_, from, to, message) => {
		expect(check(invented({ 'gm/paint.csv': [from, to] }))).toEqual([
			{ file: 'gm/paint.csv', line: 2, message: expect.stringContaining(message) }
		]);
	});

	it('accepts a row of several divisions while one of them lives', () => {
		const data = invented({
			'gm/paint.csv': ['Pontiac,,,,,US,1966,1966', 'Chevrolet|Pontiac,,,,,US,1966,2012']
		});
		expect(check(data)).toEqual([]);
	});
});
