import { describe, expect, it } from 'vitest';
import { normalise } from '../engine/characters';
import { compareCharacters } from './characters';

const compare = (left: string, right: string) =>
	compareCharacters(normalise(left).cells, normalise(right).cells);

describe('the same characters in two places', () => {
	it('agree from the end, where one lacks its beginning', () => {
		expect(compare('124379N512345', '512345').truth).toBe(true);
		expect(compare('19N512345', '512346').truth).toBe(false);
	});

	it('need the same length when they are short', () => {
		expect(compare('51', '51').truth).toBe(true);
		expect(compare('51', '5').truth).toBe(null);
	});

	it('stay open while a character is unread, and say what it would have to be', () => {
		expect(compare('51234?', '512345')).toMatchObject({ truth: null, either: null });
		expect(compare('5[17]2345', '512345')).toMatchObject({
			truth: null,
			either: { agrees: '1', others: '7' }
		});
		expect(compare('512345', '5[178]2345').either).toEqual({ agrees: '1', others: '78' });
		expect(compare('5[17]2345', '5[71]2345')).toMatchObject({ truth: null, either: null });
		expect(compare('5[17]234?', '512345')).toMatchObject({ truth: null, either: null });
		expect(compare('5[28]2345', '512345').truth).toBe(false);
	});

	it('name the one place where look-alikes stand', () => {
		expect(compare('5I2345', '512345').lookAlike).toEqual({ place: 2, left: 'I', right: '1' });
		expect(compare('592345', '512345').lookAlike).toBe(null);
		expect(compare('5I2346', '512345').lookAlike).toBe(null);
	});
});
