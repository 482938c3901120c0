import { expect, it } from 'vitest';
import { pointersOf } from './pointers';
import type { PlaceViewGroup } from './where-page.server';

const shown = (view: PlaceViewGroup['view'], ...numbers: number[]): PlaceViewGroup => ({
	view,
	groups: numbers.map((number) => ({ zone: 'front', number, name: '', places: [] }))
});

it('points to the first drawing of an area with all its numbers, and to none without any', () => {
	expect(
		pointersOf([
			shown('car', 1),
			shown('engine-front', 2),
			shown('engine-top', 3, 4),
			shown('door', 5)
		])
	).toEqual([
		{ area: 'engine', view: 'engine-front', first: 2, last: 4 },
		{ area: 'door', view: 'door', first: 5, last: 5 }
	]);
});
