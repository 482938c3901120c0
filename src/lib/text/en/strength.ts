import type { LineMark } from '../../format/strength-line';

/** The word beside each strength mark, and what the drawing says. */
export const strengthText = {
	words: {
		firm: 'firm',
		fair: 'fair',
		thin: 'thin',
		contested: 'contested',
		not_rated: 'not rated',
		no_row: 'no row'
	} satisfies Record<LineMark, string>,
	unread: 'unread',
	drawn: {
		firm: 'closed at both ends',
		fair: 'closed at one end',
		thin: 'a bare hairline',
		contested: 'two halves out of line',
		not_rated: 'dotted',
		no_row: 'ends without a line'
	} satisfies Record<LineMark, string>,
	results: {
		tallies: 'Tallies',
		does_not_tally: 'Does not tally',
		cannot_be_told: 'Cannot be told',
		not_looked_at: 'Not looked at'
	},
	screenApproximation: 'screen approximation'
} as const;
