import type { Strength } from '../types';

/** What a strength mark can say: a strength, or that there is no row to be strong or weak. */
export type LineMark = Strength | 'no_row';

/** A stroke of a dimension line. Across in percent of the width, so that a bracket of any width is the same line; down in px of 12. */
export interface LineStroke {
	readonly from: readonly [across: number, down: number];
	readonly to: readonly [across: number, down: number];
	/** px to the right, so that end strokes stand inside the box. */
	readonly shift: number;
}
export interface StrengthLine {
	readonly strokes: readonly LineStroke[];
	/** Stroke width in px. */
	readonly weight: 1 | 2;
	readonly dotted: boolean;
}

const stroke = (
	from: readonly [number, number],
	to: readonly [number, number],
	shift = 0
): LineStroke => ({ from, to, shift });
const left = stroke([0, 1], [0, 11], 1);
const right = stroke([100, 1], [100, 11], -1);
const through = stroke([0, 6], [100, 6]);
const line = (...strokes: LineStroke[]): StrengthLine => ({ strokes, weight: 2, dotted: false });

const LINES: Readonly<Record<LineMark, StrengthLine>> = {
	firm: line(left, through, right),
	fair: line(left, through),
	thin: { strokes: [stroke([0, 6.5], [100, 6.5])], weight: 1, dotted: false },
	contested: line(
		stroke([0, 1], [0, 7], 1),
		stroke([0, 3], [54, 3]),
		stroke([46, 9], [100, 9]),
		stroke([100, 5], [100, 11], -1)
	),
	not_rated: { strokes: [through], weight: 2, dotted: true },
	no_row: line(left, right)
};

/**
 * The dimension line of a strength: closed at both ends for firm, at one for fair, a bare hairline for thin,
 * two halves out of line for contested, dotted for not rated, ends without a line where there is no row.
 * The mark beside the word and the bracket under the cells are the same line.
 */
export const strengthLine = (mark: LineMark): StrengthLine => LINES[mark];

/** The mark of a field: where nothing was found, there is no row to rate. */
export function markOf(field: {
	readonly outcome: string;
	readonly strength: Strength | null;
}): LineMark {
	if (field.outcome === 'contested') return 'contested';
	if (field.outcome === 'found') return field.strength ?? 'not_rated';
	return 'no_row';
}
