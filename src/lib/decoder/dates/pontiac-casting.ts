/**
 * The date cast into a Pontiac block: month letter, day, last figure of the year, as A249. The source itself leaves open
 * whether K is October or November, so I may have been left out.
 * Source: AC Restorations, "Other significant codes: casting numbers and engine identification"; row `pontiac-casting` of
 * table `layout` cites all.
 */
import { datesText } from '../../text/en/dates';
import type { DateFormat } from './format';
import { dayNumberPart, monthLettersInDoubt, yearFigure } from './parts';

export const pontiacCasting = {
	id: 'pontiac-casting',
	title: 'Pontiac casting date: month letter, day, year',
	maker: 'gm',
	dates: 'cast',
	unit: 'engine',
	source: 'AC Restorations, Other significant codes',
	years: [1955, 1979],
	parts: [monthLettersInDoubt(), dayNumberPart(), yearFigure()],
	remark: datesText.remarks.pontiacLetters,
	example: { text: 'A249', year: 1969, earliest: '1969-01-24', latest: '1969-01-24' }
} as const satisfies DateFormat;
