/**
 * The date cast into Chrysler iron: plain month, day and year, of which one figure or two, as 12 6 71.
 * Source: Moparr Motor Detroit, "Understanding Production Date Codes"; row `chrysler-casting` of table `layout` cites all.
 */
import type { DateFormat } from './format';
import { dayNumberPart, monthNumber, yearFigureOrTwo } from './parts';

export const chryslerCasting = {
	id: 'chrysler-casting',
	title: 'Chrysler casting date: month, day, year',
	maker: 'chrysler',
	dates: 'cast',
	source: 'Moparr Motor Detroit, Understanding Production Date Codes',
	years: [1955, 1989],
	parts: [monthNumber(), dayNumberPart(), yearFigureOrTwo()],
	example: { text: '12 6 71', earliest: '1971-12-06', latest: '1971-12-06' }
} as const satisfies DateFormat;
