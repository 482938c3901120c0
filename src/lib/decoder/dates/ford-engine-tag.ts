/**
 * Year and month of production on the steel tag under the coil bracket. That both stand there is published (428CobraJet.org,
 * "Engine identification codes"); that the month is a letter is from memory. Row `ford-engine-tag` of table `layout`.
 */
import { datesText } from '../../text/en/dates';
import type { DateFormat } from './format';
import { monthLetters, yearFigure } from './parts';

export const fordEngineTag = {
	id: 'ford-engine-tag',
	title: 'Ford engine tag: year and month letter',
	maker: 'ford',
	dates: 'unit_assembled',
	unit: 'engine',
	source: 'From memory',
	years: [1963, 1980],
	parts: [yearFigure(), monthLetters('ABCDEFGHJKLM')],
	remark: datesText.remarks.engineTag,
	example: { text: '9 C', year: 1969, earliest: '1969-03-01', latest: '1969-03-31' }
} as const satisfies DateFormat;
