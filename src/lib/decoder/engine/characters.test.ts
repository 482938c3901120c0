import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { examineText, isRead, mayBe, normalise, textOf } from './characters';

describe('folding a stamp to its characters', () => {
	it.each([
		['rm23-n0g 100123', 'RM23N0G100123'],
		['*242379P914117*', '242379P914117'],
		['★ 9F91H5xxxxx ★', '9F91H5?????'],
		['24237*P914117', '24237?P914117'],
		['RM23N0G1___23', 'RM23N0G1???23'],
		['RM23N0G######', 'RM23N0G??????'],
		['#12437', '12437'],
		['1x2', '1X2'],
		['9F9[83]H', '9F9[38]H'],
		['9F9[8]H', '9F98H'],
		['9F9[?8]H', '9F9?H'],
		['9F9[]H', '9F9H'],
		['9F9[38H', '9F938H'],
		['ＲＭ２３', 'RM23'],
		['RÉ23', 'R?23'],
		['🚗 RM23 🚗', 'RM23'],
		['***', '']
	])('reads %j as %j', (typed, normalised) => {
		expect(normalise(typed).normalised).toBe(normalised);
	});

	it('keeps the way back to what was typed', () => {
		expect(normalise(' r-M xx').origins).toEqual([1, 3, 5, 6]);
	});

	it('changes nothing when it is done again', () => {
		fc.assert(
			fc.property(fc.string({ unit: 'binary', maxLength: 60 }), (text) => {
				const once = normalise(text).normalised;
				expect(normalise(once).normalised).toBe(once);
			}),
			{ numRuns: 2000 }
		);
	});

	it('changes nothing when it is done again, on texts of marks', () => {
		const unit = fc.constantFrom('x', 'X', '*', '?', '_', '#', '[', ']', '3', '8', ' ', '-', 'é');
		fc.assert(
			fc.property(fc.string({ unit, maxLength: 20 }), (text) => {
				const once = normalise(text).normalised;
				expect(normalise(once).normalised).toBe(once);
			}),
			{ numRuns: 5000 }
		);
	});

	it('keeps every place inside the typed text, in order', () => {
		fc.assert(
			fc.property(fc.string({ unit: 'binary', maxLength: 60 }), (text) => {
				const { cells, origins } = normalise(text);
				expect(origins).toHaveLength(cells.length);
				origins.forEach((origin, index) => {
					expect(origin).toBeGreaterThanOrEqual(origins[index - 1] ?? 0);
					expect(origin).toBeLessThan(text.length);
				});
			})
		);
	});
});

describe('cells', () => {
	it('tells read from unread and doubtful', () => {
		expect([isRead('A'), isRead('?'), isRead('38')]).toEqual([true, false, false]);
		expect([mayBe('?', 'A'), mayBe('38', '8'), mayBe('38', '5')]).toEqual([true, true, false]);
		expect(textOf(['A', '?', '38'])).toBe('A?[38]');
	});
});

describe('what cannot be read at all', () => {
	it.each([
		['', 'empty'],
		['   ', 'empty'],
		['1'.repeat(65), 'too_long'],
		['---', 'nothing_struck'],
		['????', 'nothing_struck'],
		['RM23', null]
	] as const)('says of %j: %s', (text, fault) => {
		expect(examineText(text)).toBe(fault);
	});

	it('knows the longer limits of other kinds', () => {
		expect(examineText('1'.repeat(600), 'body_tag')).toBeNull();
		expect(examineText('1'.repeat(601), 'body_tag')).toBe('too_long');
	});
});
