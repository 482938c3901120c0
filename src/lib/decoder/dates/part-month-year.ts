/**
 * Month and last figure of the year, as 71 for July 1971: mirrors, glass, wheels, sending units.
 * Source: Moparr Motor Detroit, "Understanding Production Date Codes"; row `part-month-year` of table `layout` cites all.
 */
import type { DateFormat } from './format';
import { monthNumber, yearFigure } from './parts';

export const partMonthYear = {
	id: 'part-month-year',
	title: 'Month figure and year figure',
	maker: null,
	dates: 'part_made',
	source: 'Moparr Motor Detroit, Understanding Production Date Codes',
	years: [1955, 1989],
	parts: [monthNumber(), yearFigure()],
	example: { text: '71', year: 1972, earliest: '1971-07-01', latest: '1971-07-31' }
} as const satisfies DateFormat;
