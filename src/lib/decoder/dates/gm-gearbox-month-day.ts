/**
 * The serial of Chevrolet's gearboxes to 1966: plant letter, month, day, D or N for the shift; no year.
 * Source: ChevelleStuff, "Transmission identification" of 1966; row `gm-gearbox-month-day` of table `layout` cites all.
 */
import { datesText } from '../../text/en/dates';
import type { DateFormat } from './format';
import { dayFigures, monthFigures, otherPart } from './parts';

const text = datesText.parts;

export const gmGearboxMonthDay = {
	id: 'gm-gearbox-month-day',
	title: 'Chevrolet gearbox to 1966: plant letter, month, day',
	maker: 'gm',
	dates: 'unit_assembled',
	unit: 'gearbox',
	source: 'ChevelleStuff, Transmission identification 1966',
	years: [1955, 1967],
	parts: [
		otherPart(text.plantLetter, 'CEHKMRSTW'),
		monthFigures(),
		dayFigures(),
		otherPart(text.shiftLetter, ['', 'D', 'N'])
	],
	remark: datesText.remarks.noYear,
	example: { text: 'T1109D', year: 1966, earliest: '1965-11-09', latest: '1965-11-09' }
} as const satisfies DateFormat;
