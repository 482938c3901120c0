/**
 * The date of an earlier Rochester carburetor: month letter and last figure of the year. From memory, and whether the
 * letters leave out I is not known; row `rochester-month-year` of table `layout` says so.
 */
import { datesText } from '../../text/en/dates';
import type { DateFormat } from './format';
import { monthLettersInDoubt, yearFigure } from './parts';

export const rochesterMonthYear = {
	id: 'rochester-month-year',
	title: 'Rochester carburetor to about 1968: month letter, year',
	maker: 'gm',
	dates: 'part_made',
	source: 'From memory',
	years: [1960, 1968],
	parts: [monthLettersInDoubt(), yearFigure()],
	remark: datesText.remarks.rochesterLetters,
	example: { text: 'C7', year: 1967, earliest: '1967-03-01', latest: '1967-03-31' }
} as const satisfies DateFormat;
