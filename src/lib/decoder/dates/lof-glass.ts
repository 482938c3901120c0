/**
 * The two letters in glass of Libbey-Owens-Ford: month, then calendar year; the year letters return every twelve years.
 * From memory: rows of tables `date_code` and `glass` hold the letters, row `lof-glass` of table `layout` the form.
 */
import { datesText } from '../../text/en/dates';
import type { DateFormat } from './format';
import { monthLetters, yearLetters } from './parts';

export const lofGlass = {
	id: 'lof-glass',
	title: 'Libbey-Owens-Ford glass: month letter, year letter',
	maker: 'gm',
	dates: 'part_made',
	source: 'From memory',
	years: [1960, 1980],
	parts: [monthLetters('NXLGJIUTAYCV'), yearLetters('NXLGJIUTAYCV', 1960)],
	remark: datesText.remarks.glass,
	example: { text: 'NY', year: 1969, earliest: '1969-01-01', latest: '1969-01-31' }
} as const satisfies DateFormat;
