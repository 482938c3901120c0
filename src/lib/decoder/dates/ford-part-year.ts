/**
 * The first two characters of a Ford part number: B, C, D, E for the 1950s to 1980s and the figure of the year, as C9. It
 * dates the design. Row `ford-part-year` of table `layout` cites what there is.
 */
import { datesText } from '../../text/en/dates';
import type { DateFormat } from './format';
import { yearCodes } from './parts';

const text = datesText.parts;

const DECADES = { B: 1950, C: 1960, D: 1970, E: 1980 } as const;
const decades = (): [string, number][] =>
	Object.entries(DECADES).flatMap(([letter, first]) =>
		Array.from({ length: 10 }, (_, figure): [string, number] => [
			`${letter}${figure}`,
			first + figure
		])
	);

export const fordPartYear = {
	id: 'ford-part-year',
	title: 'Ford part number: decade letter and year',
	maker: 'ford',
	dates: 'designed',
	source: 'From memory',
	years: [1950, 1989],
	parts: [yearCodes(text.designYear, decades())],
	remark: datesText.remarks.designYear,
	example: { text: 'C9', earliest: '1969-01-01', latest: '1969-12-31' }
} as const satisfies DateFormat;
