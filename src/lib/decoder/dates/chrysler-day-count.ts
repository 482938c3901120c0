/**
 * Chrysler's count of days in four figures, on gearboxes, stamped engine serials and many parts. That 0001 is 1 August 1961
 * is from memory and not checked against a dated part; row `chrysler-day-count` of table `layout` says so, and that row is
 * where a correction would be argued.
 */
import { datesText } from '../../text/en/dates';
import { dayNumber } from './days';
import type { DateFormat } from './format';
import { dayCountPart } from './parts';

export const chryslerDayCount = {
	id: 'chrysler-day-count',
	title: 'Chrysler ten-thousand-day calendar',
	maker: 'chrysler',
	dates: 'unit_assembled',
	source: 'From memory',
	years: [1961, 1988],
	parts: [dayCountPart()],
	dayZero: dayNumber(1961, 7, 31),
	remark: datesText.remarks.dayCount,
	example: { text: '3076', earliest: '1970-01-01', latest: '1970-01-01' }
} as const satisfies DateFormat;
