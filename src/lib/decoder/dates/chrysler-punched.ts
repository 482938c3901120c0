/**
 * The scheduled date of Chrysler's punched tags of 1965 to 1968: a character for the month and the day, as 818.
 * Source: turbinecar.com, a worked tag of 1968; that October to December are A, B and C here too is from memory. Row
 * `chrysler-punched` of table `layout` cites all.
 */
import { datesText } from '../../text/en/dates';
import type { DateFormat } from './format';
import { dayFigures, monthLetters } from './parts';
import { fromAugustToJuly } from './years';

export const chryslerPunched = {
	id: 'chrysler-punched',
	title: 'Chrysler scheduled date of punched tags: month and day',
	maker: 'chrysler',
	dates: 'scheduled',
	source: 'turbinecar.com, worked tag of 1968',
	years: [1964, 1968],
	parts: [monthLetters('123456789ABC'), dayFigures()],
	remark: datesText.remarks.scheduled,
	yearsOf: fromAugustToJuly,
	example: { text: '818', year: 1968, earliest: '1967-08-18', latest: '1967-08-18' }
} as const satisfies DateFormat;
