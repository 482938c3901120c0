/**
 * The scheduled date of a Chrysler fender tag, and of the order number: 1 to 9, A, B or C for the month, and the day. The
 * model year runs from August to July.
 * Source: 1971 Charger R/T Registry, "Build Sheet Line 1", and the list of Superbird serials at brcook.com; row
 * `chrysler-scheduled` of table `layout` cites all.
 */
import { datesText } from '../../text/en/dates';
import type { DateFormat } from './format';
import { dayFigures, monthLetters } from './parts';
import { fromAugustToJuly } from './years';

export const chryslerScheduled = {
	id: 'chrysler-scheduled',
	title: 'Chrysler scheduled date: month character and day',
	maker: 'chrysler',
	dates: 'scheduled',
	source: '1971 Charger R/T Registry, Build Sheet Line 1',
	years: [1968, 1974],
	parts: [monthLetters('123456789ABC'), dayFigures()],
	remark: datesText.remarks.scheduled,
	yearsOf: fromAugustToJuly,
	example: { text: 'B30', year: 1970, earliest: '1969-11-30', latest: '1969-11-30' }
} as const satisfies DateFormat;
