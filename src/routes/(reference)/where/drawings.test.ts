import { describe, expect, it } from 'vitest';
import { VIEW_ZONES, VIEWS } from '$lib/text/en/where';
import { drawingOf, eraOf, POINTERS, type Era } from './drawings';

const ERAS: readonly Era[] = ['early', 'middle', 'late'];
const apart = (a: readonly [number, number], b: readonly [number, number]): number =>
	Math.max(Math.abs(a[0] - b[0]), Math.abs(a[1] - b[1]));

describe('a drawing', () => {
	it.each(VIEWS.flatMap((view) => ERAS.map((era) => ({ view, era }))))(
		'of $view, $era, marks each of its places, inside its frame and apart from the others',
		({ view, era }) => {
			const { width, height, marks } = drawingOf(view, era);
			expect(Object.keys(marks).sort()).toEqual([...VIEW_ZONES[view]].sort());
			const own = [...Object.values(marks), ...(view === 'car' ? Object.values(POINTERS) : [])];
			for (const { spot, number } of own) {
				for (const [x, y] of [spot, number]) {
					expect(x).toBeGreaterThan(0);
					expect(x).toBeLessThan(width);
					expect(y).toBeGreaterThan(0);
					expect(y).toBeLessThan(height);
				}
				for (const other of own)
					if (other.number !== number) {
						expect(apart(number, other.number)).toBeGreaterThanOrEqual(38);
						expect(apart(number, other.spot)).toBeGreaterThan(14);
					}
			}
		}
	);

	it('takes the shape of the car from the year', () => {
		expect([1960, 1964, 1965, 1973, 1974, undefined].map(eraOf)).toEqual([
			'early',
			'early',
			'middle',
			'middle',
			'late',
			'middle'
		]);
	});
});
