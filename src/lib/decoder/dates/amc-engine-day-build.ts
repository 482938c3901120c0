/**
 * The number of an American Motors engine: year figure, month, engine letter, day, as 209N15. That it holds the date and the
 * engine is published (AMC Rambler Club, "AMC engine codes", Frank Swygert); the order of its parts is from memory. Row
 * `amc-engine-day-build` of table `layout` cites all.
 */
import { LETTERS } from '../engine/characters';
import { datesText } from '../../text/en/dates';
import type { DateFormat } from './format';
import { dayFigures, monthFigures, otherPart, yearFigure } from './parts';

const text = datesText.parts;

export const amcEngineDayBuild = {
	id: 'amc-engine-day-build',
	title: 'American Motors engine day build code',
	maker: 'amc',
	dates: 'unit_assembled',
	unit: 'engine',
	source: 'From memory',
	years: [1967, 1981],
	parts: [yearFigure(), monthFigures(), otherPart(text.engineLetter, LETTERS), dayFigures()],
	remark: datesText.remarks.amcEngine,
	example: { text: '209N15', year: 1973, earliest: '1972-09-15', latest: '1972-09-15' }
} as const satisfies DateFormat;
