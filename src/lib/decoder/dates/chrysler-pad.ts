/**
 * The assembly date on the pad of a Chrysler engine, after year letter and displacement: month and day. From memory; the
 * same order is published for wheels. Row `chrysler-pad` of table `layout` says so.
 */
import { datesText } from '../../text/en/dates';
import type { DateFormat } from './format';
import { dayNumberPart, monthNumber } from './parts';
import { fromAugustToJuly } from './years';

export const chryslerPad = {
	id: 'chrysler-pad',
	title: 'Chrysler engine pad: month and day',
	maker: 'chrysler',
	dates: 'unit_assembled',
	unit: 'engine',
	source: 'From memory',
	years: [1955, 1980],
	parts: [monthNumber(), dayNumberPart()],
	remark: datesText.remarks.noYear,
	yearsOf: fromAugustToJuly,
	example: { text: '12 6', year: 1970, earliest: '1969-12-06', latest: '1969-12-06' }
} as const satisfies DateFormat;
