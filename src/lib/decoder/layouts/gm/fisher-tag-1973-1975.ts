/**
 * The body tag of Fisher Body, 1973 to 1975: as before it, but the style number has letters for body type and series,
 * and the plant may be the letter of the serial number. Row `gm-fisher-tag-1973-1975` of table `layout` cites what it
 * rests on. Norwood stamped S for every Firebird of 1974, so that the series is no proof there.
 */
import type { LineField, LinedLayout } from '../../engine/lined-layout';
import { LETTERS } from './signs';
import {
	TAG,
	optionLine,
	paintInFigures,
	plantAndNumber,
	seat,
	styleWithLetters,
	timeLine,
	trim,
	year
} from './tag-fields';

/** The plant as one letter or by its name cut short, then the body number. */
export const plantLetterAndNumber: readonly LineField[] = plantAndNumber.map((field) =>
	field.name === 'assembly_plant'
		? { ...field, shape: { chars: LETTERS, length: [1, 3] } as const }
		: field
);

export const gmFisherTag1973: LinedLayout = {
	...TAG,
	id: 'gm-fisher-tag-1973-1975',
	title: 'Fisher body tag, General Motors, 1973–75',
	years: [1973, 1975],
	source: 'From memory, for the Firebird of 1974; the other lines as in 1972',
	lines: [
		{
			label: 'Style line',
			fields: [year(1973, 1974, 1975), ...styleWithLetters, ...plantLetterAndNumber]
		},
		{ label: 'Trim and paint', fields: [trim, seat, ...paintInFigures] },
		timeLine,
		optionLine
	],
	examples: {
		good: 'ST 74 2FS87 N 12345 BDY / TR 594 26 26 PNT / 03C',
		bad: 'ST 74 2FS87 N 12345 BDY / 03C'
	}
};
