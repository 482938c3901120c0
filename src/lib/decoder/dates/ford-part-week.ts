/**
 * The date of Autolite and Motorcraft carburetors and distributors: year figure, month letter, week letter, as 8CB. From
 * memory: no published page was seen; row `ford-part-week` of table `layout` says so.
 */
import { datesText } from '../../text/en/dates';
import type { DateFormat } from './format';
import { monthLetters, weekCodes, yearFigure } from './parts';

export const fordPartWeek = {
	id: 'ford-part-week',
	title: 'Autolite and Motorcraft parts: year, month letter, week',
	maker: 'ford',
	dates: 'part_made',
	source: 'From memory',
	years: [1960, 1979],
	parts: [yearFigure(), monthLetters('ABCDEFGHJKLM'), weekCodes('ABCDE')],
	remark: datesText.remarks.weekOfMonth,
	example: { text: '8CB', year: 1968, earliest: '1968-03-02', latest: '1968-03-14' }
} as const satisfies DateFormat;
