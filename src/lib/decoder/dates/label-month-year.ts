/**
 * Month and year of manufacture on a certification label, as 02/70. The content is law, the order of the figures custom.
 * Source: 49 CFR Part 567, Certification; row `label-month-year` of table `layout` cites all.
 */
import { datesText } from '../../text/en/dates';
import type { DateFormat } from './format';
import { monthNumber, yearFigures } from './parts';

export const labelMonthYear = {
	id: 'label-month-year',
	title: 'Certification label: month and year',
	maker: null,
	dates: 'label_month',
	source: '49 CFR Part 567',
	years: [1968, 1989],
	parts: [monthNumber(), yearFigures()],
	remark: datesText.remarks.label,
	example: { text: '02/70', earliest: '1970-02-01', latest: '1970-02-28' }
} as const satisfies DateFormat;
