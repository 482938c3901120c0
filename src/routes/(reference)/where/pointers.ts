/** Where the drawing of the car points on: numbers that other drawings show. */
import type { View } from '$lib/text/en/where';
import type { PlaceViewGroup } from './where-page.server';

export type Area = 'engine' | 'cowl' | 'door';
export interface Pointer {
	readonly area: Area;
	/** The first of the drawings that show it. */
	readonly view: View;
	readonly first: number;
	readonly last: number;
}

const AREAS: readonly Area[] = ['engine', 'cowl', 'door'];

/** @example pointersOf(views) // [{ area: 'engine', view: 'engine-front', first: 2, last: 5 }, …] */
export function pointersOf(views: readonly PlaceViewGroup[]): Pointer[] {
	return AREAS.flatMap((area) => {
		const own = views.filter(({ view }) => view.startsWith(area));
		const numbers = own.flatMap(({ groups }) => groups.map(({ number }) => number));
		const [first] = own;
		if (first === undefined || numbers.length === 0) return [];
		return [{ area, view: first.view, first: Math.min(...numbers), last: Math.max(...numbers) }];
	});
}
