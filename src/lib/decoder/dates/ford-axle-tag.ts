/**
 * The date of a Ford axle tag: year figure, month letter, day. One article runs the letters from A to L without a gap, an
 * owner leaves out I: from J on both months stand.
 * Source: Reference.com, "How do you identify a Ford rear axle assembly"; row `ford-axle-tag` of table `layout` cites all.
 */
import { datesText } from '../../text/en/dates';
import type { DateFormat } from './format';
import { dayNumberPart, monthLettersInDoubt, yearFigure } from './parts';

export const fordAxleTag = {
	id: 'ford-axle-tag',
	title: 'Ford axle tag: year, month letter, day',
	maker: 'ford',
	dates: 'unit_assembled',
	unit: 'axle',
	source: 'Reference.com, How do you identify a Ford rear axle assembly',
	years: [1960, 1980],
	parts: [yearFigure(), monthLettersInDoubt(), dayNumberPart()],
	remark: datesText.remarks.axleLetters,
	example: { text: '9C15', year: 1969, earliest: '1969-03-15', latest: '1969-03-15' }
} as const satisfies DateFormat;
