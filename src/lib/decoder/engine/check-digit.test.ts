import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { checkDigitOf, mendingCheckDigit, narrowByCheckDigit, VIN_CHARACTERS } from './check-digit';

const cells = (text: string): string[] => text.split('');
const vin = fc.string({ unit: fc.constantFrom(...VIN_CHARACTERS), minLength: 17, maxLength: 17 });
const set = (text: string, index: number, character: string): string =>
	text.slice(0, index) + character + text.slice(index + 1);

describe('the check digit', () => {
	it('is worked out from the other sixteen characters', () => {
		// 49 CFR 565, federal sample of the rule's appendix as commonly printed.
		expect(checkDigitOf(cells('1G4AH59H?5G118341'))).toBe('4');
	});

	it('is not worked out while a character is unread, not used or missing', () => {
		expect(checkDigitOf(cells('1G4AH59H?5G11834?'))).toBeNull();
		expect(checkDigitOf(cells('1G4AH59H?5G11834O'))).toBeNull();
		expect(checkDigitOf(cells('1G4AH59H'))).toBeNull();
	});

	it('finds every single wrong character of another value', () => {
		fc.assert(
			fc.property(vin, fc.nat(16), fc.constantFrom(...VIN_CHARACTERS), (text, index, other) => {
				fc.pre(index !== 8);
				const before = checkDigitOf(cells(text));
				const after = checkDigitOf(cells(set(text, index, other)));
				const group = ['1AJ', '2BKS', '3CLT', '4DMU', '5ENV', '6FW', '7GPX', '8HY', '9RZ', '0'];
				const same = group.some((own) => own.includes(text.charAt(index)) && own.includes(other));
				expect(after === before).toBe(same);
			})
		);
	});
});

describe('narrowing by the check digit', () => {
	it('allows just what listing all numbers allows', () => {
		fc.assert(
			fc.property(vin, fc.nat(16), fc.nat(16), (text, first, second) => {
				const marked = set(set(text, first, '?'), second, '?');
				const fitting = new Map<number, Set<string>>();
				const places = [...new Set([first, second])];
				const listed = (index: number): string[] =>
					[...VIN_CHARACTERS].filter((one) => index !== 8 || /[0-9X]/.test(one));
				for (const one of listed(first))
					for (const two of first === second ? [one] : listed(second)) {
						const whole = set(set(marked, first, one), second, two);
						if (!/[0-9X]/.test(whole.charAt(8))) continue;
						if (checkDigitOf(cells(whole)) !== whole.charAt(8)) continue;
						for (const place of places)
							fitting.set(place, (fitting.get(place) ?? new Set()).add(whole.charAt(place)));
					}
				const narrowed = narrowByCheckDigit(cells(marked));
				for (const place of places) {
					const expected = listed(place).filter((one) => fitting.get(place)?.has(one));
					if (expected.length === listed(place).length) expect(narrowed.has(place + 1)).toBe(false);
					else expect(narrowed.get(place + 1)).toBe(expected.join(''));
				}
			}),
			{ numRuns: 60 }
		);
	});

	it('takes a place that could be either for those two', () => {
		const whole = '1G4AH59H45G118341';
		const either = cells(whole);
		either[16] = '17';
		expect(narrowByCheckDigit(either).get(17)).toBe('1');
	});
});

describe('mending a check digit by one look-alike', () => {
	it('finds just the exchanges after which it fits', () => {
		fc.assert(
			fc.property(vin, (text) => {
				fc.pre(/[0-9X]/.test(text.charAt(8)));
				const found = mendingCheckDigit(cells(text)).map(({ place, character }) =>
					set(text, place - 1, character)
				);
				const fitting = found.filter((own) => checkDigitOf(cells(own)) === own.charAt(8));
				expect(found).toEqual(fitting);
			}),
			{ numRuns: 500 }
		);
	});

	it('knows ten as X', () => {
		// The worked example of the encyclopaedia, 1M8GDM9AXKP042788, with another check digit.
		const mended = [...'0123456789'].flatMap((digit) => {
			const text = `1M8GDM9A${digit}KP042788`;
			return mendingCheckDigit(cells(text)).map(({ place, character }) =>
				set(text, place - 1, character)
			);
		});
		expect(mended.length).toBeGreaterThan(0);
		for (const own of mended) expect(checkDigitOf(cells(own))).toBe(own.charAt(8));
	});

	it('has nothing to do where the digit fits, is none, or a character is unread', () => {
		expect(mendingCheckDigit(cells('1M8GDM9AXKP042788'))).toEqual([]);
		expect(mendingCheckDigit(cells('1M8GDM9AZKP042788'))).toEqual([]);
		expect(mendingCheckDigit(cells('1M8GDM9A0KP04278?'))).toEqual([]);
	});
});
