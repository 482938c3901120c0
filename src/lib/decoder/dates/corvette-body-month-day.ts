/**
 * The body date of a Corvette trim tag: a letter for the month, counted from August, and the day, as C09. No letter is
 * left out: a car of 1969, whose model year ran to December, has Q 15 for Monday, 15 December 1969.
 * Source: 76vette.com, "Is My C3 Corvette an Early or Late Model?", and a car in the forum of the National Corvette
 * Restorers Society, "1969 door jam labels"; row `corvette-body-month-day` of table `layout` cites all.
 */
import { datesText } from '../../text/en/dates';
import type { DateFormat } from './format';
import { dayFigures, monthLetters } from './parts';
import { fromAugust } from './years';

export const corvetteBodyMonthDay = {
	id: 'corvette-body-month-day',
	title: 'Corvette body date: month letter and day',
	maker: 'gm',
	dates: 'body_finished',
	source: '76vette.com, Is My C3 Corvette an Early or Late Model?',
	years: [1963, 1980],
	parts: [monthLetters('ABCDEFGHIJKLMNOPQ', 8), dayFigures()],
	remark: datesText.remarks.corvetteBody,
	yearsOf: fromAugust,
	example: { text: 'C09', year: 1976, earliest: '1975-10-09', latest: '1975-10-09' }
} as const satisfies DateFormat;
