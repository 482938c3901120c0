import { describe, expect, it } from 'vitest';
import { check } from './colors';
import { invented } from './invented';

describe('colors', () => {
	it('accepts six capital figures', () => {
		expect(check(invented())).toEqual([]);
	});

	it.each([
		['small letters', '""#8A8D8F""', '""#8a8d8f""'],
		['three figures', '""#8A8D8F""', '""#8AF""'],
		['a color in another place', '""hex_approximate""', '""part""']
	])('refuses %s', (_, from, to) => {
		expect(check(invented({ 'gm/paint.csv': [from, to] }))).toHaveLength(1);
	});
});
