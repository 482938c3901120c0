/**
 * The serial of a Muncie four-speed of 1963 to 1966: P, month, day, N for the night shift; no year.
 * Source: 2nd Gen Camaro Owners Group, "Muncie 4-speed text"; row `muncie-month-day` of table `layout` cites all.
 */
import { datesText } from '../../text/en/dates';
import type { DateFormat } from './format';
import { dayFigures, monthFigures, otherPart } from './parts';

const text = datesText.parts;

export const muncieMonthDay = {
	id: 'muncie-month-day',
	title: 'Muncie four-speed 1963–66: P, month, day',
	maker: 'gm',
	dates: 'unit_assembled',
	unit: 'gearbox',
	source: '2nd Gen Camaro Owners Group, Muncie 4-speed text',
	years: [1963, 1967],
	parts: [
		otherPart(text.plantLetter, 'P'),
		monthFigures(),
		dayFigures(),
		otherPart(text.shiftLetter, ['', 'D', 'N'])
	],
	remark: datesText.remarks.noYear,
	example: { text: 'P0503N', year: 1966, earliest: '1966-05-03', latest: '1966-05-03' }
} as const satisfies DateFormat;
