/** Fields that the fender tags of several years share. */
import type { LineField, Places, TokenShape } from '../../engine/lined-layout';

/** The last characters of a trim code: its color, one letter to 1969, two characters from 1970. */
const COLOR: readonly Places[] = [[3, -1]];

/**
 * Trim: class, seat, color. A whole code that is not listed is told by its color, and the seat by the second place,
 * since the parts keep their meaning through the years.
 */
export const trim = (shape: TokenShape, words: readonly string[] = []): LineField => ({
	name: 'trim',
	label: 'Trim',
	words,
	shape,
	reads: {
		by: 'table',
		table: 'trim',
		otherwise: [COLOR],
		also: [{ name: 'trim', label: 'Seat', by: 'table', table: 'trim', parts: [[2, 2]] }]
	}
});
