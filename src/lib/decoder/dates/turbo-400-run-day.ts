/**
 * The plate of a Turbo Hydra-Matic 400: model year, one or two letters of the unit, and days counted from 1 January of
 * the year before the model year, as 70 A 298 for 25 October 1969.
 * Source: ChevelleStuff, "Transmission identification" of 1970; row `turbo-400-run-day` of table `layout` cites all.
 */
import { LETTERS } from '../engine/characters';
import { datesText } from '../../text/en/dates';
import type { DateFormat } from './format';
import { dayOfRunPart, modelYearFigures, otherPart } from './parts';

const text = datesText.parts;

function* unitCodes(): Generator<string> {
	for (const one of LETTERS) {
		yield one;
		for (const two of LETTERS) yield one + two;
	}
}

export const turbo400RunDay = {
	id: 'turbo-400-run-day',
	title: 'Turbo Hydra-Matic 400: model year, code, day of the run',
	maker: 'gm',
	dates: 'unit_assembled',
	unit: 'gearbox',
	source: 'ChevelleStuff, Transmission identification 1970',
	years: [1966, 1980],
	parts: [modelYearFigures(), otherPart(text.unitCode, unitCodes()), dayOfRunPart()],
	remark: datesText.remarks.turboDays,
	example: { text: '70A298', year: 1970, earliest: '1969-10-25', latest: '1969-10-25' }
} as const satisfies DateFormat;
