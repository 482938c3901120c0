/**
 * The serial of Chevrolet's other gearboxes (three-speed, Saginaw, Powerglide, Turbo Hydra-Matic 350): plant letter, year
 * figure, month letter, day, D or N for the shift.
 * Source: the form stands in ChevelleStuff, "Transmission identification 1970"; that the month letters are those of the
 * Muncie is an inference, so row `gm-gearbox-year-month-day` of table `layout` rests on memory.
 */
import { datesText } from '../../text/en/dates';
import type { DateFormat } from './format';
import { dayFigures, modelYearFigure, monthLetters, otherPart } from './parts';

const text = datesText.parts;

export const gmGearboxYearMonthDay = {
	id: 'gm-gearbox-year-month-day',
	title: 'Chevrolet gearbox 1967–75: plant letter, year, month letter, day',
	maker: 'gm',
	dates: 'unit_assembled',
	unit: 'gearbox',
	source: 'ChevelleStuff, Transmission identification 1970',
	years: [1966, 1975],
	parts: [
		otherPart(text.plantLetter, 'BCEJKNRSTY'),
		modelYearFigure(),
		monthLetters('ABCDEHKMPRST'),
		dayFigures(),
		otherPart(text.shiftLetter, ['', 'D', 'N'])
	],
	remark: datesText.remarks.gearboxLetters,
	example: { text: 'B0R25', year: 1970, earliest: '1969-10-25', latest: '1969-10-25' }
} as const satisfies DateFormat;
