/**
 * The serial of a Muncie four-speed of 1967 to 1974: P, year figure, month letter (F, G, I, J, L, N, O and Q left out),
 * day, and from 1969 A, B or C for M20, M21, M22. The figure is the model year: P0R25A is 25 October 1969.
 * Source: ChevelleStuff, "Transmission identification" of 1970; row `muncie-year-month-day` of table `layout` cites all.
 */
import { datesText } from '../../text/en/dates';
import type { DateFormat } from './format';
import { dayFigures, modelYearFigure, monthLetters, otherPart } from './parts';

const text = datesText.parts;

export const muncieYearMonthDay = {
	id: 'muncie-year-month-day',
	title: 'Muncie four-speed 1967–74: P, year, month letter, day',
	maker: 'gm',
	dates: 'unit_assembled',
	unit: 'gearbox',
	source: 'ChevelleStuff, Transmission identification 1970',
	years: [1966, 1975],
	parts: [
		otherPart(text.plantLetter, 'P'),
		modelYearFigure(),
		monthLetters('ABCDEHKMPRST'),
		dayFigures(),
		otherPart(text.gearboxLetters, ['', 'A', 'B', 'C', 'WB', 'WL', 'WO'])
	],
	remark: datesText.remarks.muncieYear,
	example: { text: 'P0R25A', year: 1970, earliest: '1969-10-25', latest: '1969-10-25' }
} as const satisfies DateFormat;
