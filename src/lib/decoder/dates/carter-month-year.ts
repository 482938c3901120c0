/**
 * The date of Carter carburetors and pumps: month letter, I left out from memory, and last figure of the year, as E9.
 * Source: Moparr Motor Detroit, "Understanding Production Date Codes"; row `carter-month-year` of table `layout` cites all.
 */
import type { DateFormat } from './format';
import { monthLetters, yearFigure } from './parts';

export const carterMonthYear = {
	id: 'carter-month-year',
	title: 'Carter: month letter, year',
	maker: null,
	dates: 'part_made',
	source: 'Moparr Motor Detroit, Understanding Production Date Codes',
	years: [1955, 1979],
	parts: [monthLetters('ABCDEFGHJKLM'), yearFigure()],
	example: { text: 'E9', year: 1969, earliest: '1969-05-01', latest: '1969-05-31' }
} as const satisfies DateFormat;
