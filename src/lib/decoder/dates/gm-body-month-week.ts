/**
 * The date of a Fisher body tag, and of GM's later body plates: month in two figures, a letter for the week, as 01C.
 * It says when the body was finished or its tag was issued, not when the car left the line. The days of a week are a
 * trade rule (common practice): see `weekOfMonth`.
 * Source: Old Cars Weekly, answer quoted in "True meaning of the cowl tag date code"; row `gm-body-month-week` of table
 * `layout` cites all.
 */
import { datesText } from '../../text/en/dates';
import type { DateFormat } from './format';
import { monthFigures, weekCodes } from './parts';

export const gmBodyMonthWeek = {
	id: 'gm-body-month-week',
	title: 'Fisher body date: month and week',
	maker: 'gm',
	dates: 'body_finished',
	source: 'Old Cars Weekly, quoted in True meaning of the cowl tag date code',
	years: [1958, 1988],
	parts: [monthFigures(), weekCodes('ABCDE')],
	remark: datesText.remarks.fisherWeek,
	example: { text: '07C', year: 1969, earliest: '1969-07-09', latest: '1969-07-21' }
} as const satisfies DateFormat;
