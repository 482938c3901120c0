/**
 * Production week and year, of which one figure or two, as 301 or 36-69: manifolds, coils, alternators, distributors.
 * Source: Moparr Motor Detroit, "Understanding Production Date Codes"; row `week-year` of table `layout` cites all. Which
 * days a week holds is common practice.
 */
import { datesText } from '../../text/en/dates';
import type { DateFormat } from './format';
import { weekOfYearPart, yearFigureOrTwo } from './parts';

export const weekYear = {
	id: 'week-year',
	title: 'Week of the year and year',
	maker: null,
	dates: 'part_made',
	source: 'Moparr Motor Detroit, Understanding Production Date Codes',
	years: [1955, 1989],
	parts: [weekOfYearPart(), yearFigureOrTwo()],
	remark: datesText.remarks.weekOfYear,
	example: { text: '301', year: 1972, earliest: '1971-07-23', latest: '1971-07-29' }
} as const satisfies DateFormat;
