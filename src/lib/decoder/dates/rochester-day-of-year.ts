/**
 * The date of a Rochester Quadrajet from about 1968: day of the year in three figures, last figure of the year, as 2039.
 * From memory: no published page was seen; row `rochester-day-of-year` of table `layout` says so.
 */
import type { DateFormat } from './format';
import { dayOfYearPart, yearFigure } from './parts';

export const rochesterDayOfYear = {
	id: 'rochester-day-of-year',
	title: 'Rochester carburetor: day of the year, year',
	maker: 'gm',
	dates: 'part_made',
	source: 'From memory',
	years: [1967, 1980],
	parts: [dayOfYearPart(), yearFigure()],
	example: { text: '2039', year: 1969, earliest: '1969-07-22', latest: '1969-07-22' }
} as const satisfies DateFormat;
