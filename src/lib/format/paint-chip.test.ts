import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { chipTones } from './paint-chip';

const light = (hex = '') =>
	[1, 3, 5].reduce((sum, at) => sum + parseInt(hex.slice(at, at + 2), 16), 0);

describe('a chip by the name of a paint', () => {
	it('takes the last color word, tinted by the one before', () => {
		expect(chipTones('Butternut Yellow')).toEqual(chipTones('Yellow'));
		expect(chipTones('Turquoise Blue')).not.toEqual(chipTones('Blue'));
	});

	it('is lighter for light and darker for dark', () => {
		const [plain, pale, dark] = ['Green', 'Light Green', 'Dark Green Metallic'].map((name) =>
			light(chipTones(name)[0])
		) as [number, number, number];
		expect(pale).toBeGreaterThan(plain);
		expect(dark).toBeLessThan(plain);
	});

	it('has two tones where the name has two, and heeds no second name', () => {
		expect(chipTones('Black over White')).toHaveLength(2);
		expect(chipTones('Vermilion, also called Calypso Coral')).toEqual(chipTones('Vermilion'));
	});

	it('has none where the name does not say a color', () => {
		expect(chipTones('Paint from outside GM')).toEqual([]);
		expect(chipTones('Moulin Rouge')).toEqual([]);
	});

	it('is a color or nothing, whatever the name', () => {
		fc.assert(
			fc.property(fc.string(), (name) => {
				for (const tone of chipTones(name)) expect(tone).toMatch(/^#[0-9a-f]{6}$/);
			})
		);
	});
});
