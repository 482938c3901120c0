import { describe, expect, it } from 'vitest';
import { stampPlaceText, type StampPlace } from '../../text/en/stamp-places';
import { planLabels } from './plan';

const makers: Readonly<Record<string, readonly StampPlace[]>> = stampPlaceText.places;

describe('planLabels', () => {
	it('shows the place that holds in a year, and says the years when none is given', () => {
		const names = (year: number | null) =>
			planLabels(makers.gm!, year)
				.items.filter(({ name }) => name === 'Serial plate')
				.map(({ where }) => where);
		expect(names(1966)).toEqual(['front door pillar, door open']);
		expect(names(1969)).toEqual(['dash top, through the glass']);
		expect(names(null).join(' ')).toContain('1968–80');
	});

	it('numbers labels from 1 and keeps them inside the drawing, apart from each other', () => {
		for (const [maker, places] of Object.entries(makers))
			for (const year of [null, 1962, 1967, 1970, 1978]) {
				const { items } = planLabels(places, year);
				expect(items.map(({ number }) => number)).toEqual(items.map((_, index) => index + 1));
				for (const a of items) {
					expect(a.textX, maker).toBeGreaterThanOrEqual(0);
					expect(a.textX, maker).toBeLessThanOrEqual(440);
					for (const b of items)
						if (a !== b && a.textY > 200 === b.textY > 200)
							expect(Math.abs(a.textX - b.textX), maker).toBeGreaterThan(130);
				}
			}
	});
});
