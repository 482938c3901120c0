/**
 * The date of a Delco-Remy distributor, alternator or starter, after the part number: year figure, month letter without I,
 * day, as 8 L 14. From memory: no published page was seen; row `delco-year-month-day` of table `layout` says so.
 */
import type { DateFormat } from './format';
import { dayNumberPart, monthLetters, yearFigure } from './parts';

export const delcoYearMonthDay = {
	id: 'delco-year-month-day',
	title: 'Delco-Remy: year, month letter, day',
	maker: 'gm',
	dates: 'part_made',
	source: 'From memory',
	years: [1960, 1974],
	parts: [yearFigure(), monthLetters('ABCDEFGHJKLM'), dayNumberPart()],
	example: { text: '8 L 14', year: 1969, earliest: '1968-11-14', latest: '1968-11-14' }
} as const satisfies DateFormat;
