/**
 * The date under the list number of a Holley carburetor: year figure, 1 to 9, A, B or C for the month, week, as 915. From
 * memory: no published page was seen; row `holley-year-month-week` of table `layout` says so.
 */
import { datesText } from '../../text/en/dates';
import type { DateFormat } from './format';
import { monthLetters, weekCodes, yearFigure } from './parts';

export const holleyYearMonthWeek = {
	id: 'holley-year-month-week',
	title: 'Holley: year, month, week',
	maker: null,
	dates: 'part_made',
	source: 'From memory',
	years: [1960, 1973],
	parts: [yearFigure(), monthLetters('123456789ABC'), weekCodes('12345')],
	remark: datesText.remarks.weekOfMonth,
	example: { text: '915', year: 1969, earliest: '1969-01-23', latest: '1969-01-31' }
} as const satisfies DateFormat;
