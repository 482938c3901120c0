/** How hard it is to change what a statement stands on. */
import type { Maker, StampKind, Weight } from '../../types';

const ORDER: readonly Weight[] = ['heavy', 'middling', 'light'];

/** Words of a place that decide, the lighter first: a copied paper stays a paper wherever it was found. */
const PLACES: readonly (readonly [RegExp, Weight])[] = [
	[
		/\b(copy|copied|paper|sheet|card|invoice|title|registration|sticker price|said|word of)\b/i,
		'light'
	],
	[/\b(bolt(ed)?|badge|emblem)\b/i, 'light'],
	[/\b(label|decal|sticker|screw(ed)?|cast(ing)?)\b/i, 'middling'],
	[/\b(struck|stamped|rivet(ed|s)?|frame|cowl stamping)\b/i, 'heavy']
];

/** Chrysler's tags are held by screws, and plates of American Motors are not known to be riveted. */
const RIVETED: ReadonlySet<Maker> = new Set(['gm', 'ford']);

function byKind(kind: StampKind, maker: Maker | null, ofCar: boolean): Weight {
	switch (kind) {
		case 'serial':
			return 'heavy';
		case 'body_tag':
			return maker !== null && RIVETED.has(maker) ? 'heavy' : 'middling';
		case 'engine':
			return ofCar ? 'heavy' : 'middling';
		case 'casting':
		case 'date':
			return 'middling';
		case 'code':
			return 'light';
	}
}

/**
 * The weight of a statement: what the place says goes before what is usual for the kind of stamp.
 * @param ofCar whether it is part of the car's own number, struck into the part
 */
export function weightOf(
	kind: StampKind,
	place: string | undefined,
	maker: Maker | null,
	ofCar: boolean
): Weight {
	const named = place === undefined ? undefined : PLACES.find(([words]) => words.test(place));
	return named?.[1] ?? byKind(kind, maker, ofCar);
}

/** A line is no heavier than its lighter side. */
export const lighter = (left: Weight, right: Weight): Weight =>
	ORDER.indexOf(left) >= ORDER.indexOf(right) ? left : right;

/** 0 for the heaviest. */
export const weightRank = (weight: Weight): number => ORDER.indexOf(weight);
