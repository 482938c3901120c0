import { describe, expect, it } from 'vitest';
import { readStamp, type Faults } from './request';

const faultsOf = (given: Parameters<typeof readStamp>[0]): string[] => {
	const faults: Faults = [];
	readStamp(given, faults);
	return faults.map(({ field, code, message }) => `${field} ${code} ${/\d+/.exec(message) ?? ''}`);
};

describe('a text that is too long', () => {
	it.each([
		[{ text: '1'.repeat(65) }, 'text too_long 64'],
		[{ text: '1'.repeat(121), kind: 'casting' }, 'text too_long 120'],
		[{ text: '1'.repeat(601), kind: 'body_tag' }, 'text too_long 600'],
		[{ text: 'A1 / '.repeat(121) }, 'text too_long 600'],
		[{ fields: { paint: 'C'.repeat(601) } }, 'fields too_long 600']
	])('is told the limit that it passed', (given, told) => {
		expect(faultsOf(given)).toEqual([told]);
	});

	it('is none while a body tag may be as long, with or without its kind', () => {
		for (const kind of [undefined, 'body_tag'])
			expect(faultsOf({ fields: { paint: 'C'.repeat(65) }, kind })).toEqual([]);
		expect(faultsOf({ text: 'A1 / '.repeat(100) })).toEqual([]);
	});
});
