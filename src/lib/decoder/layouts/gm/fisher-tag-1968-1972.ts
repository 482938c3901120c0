/**
 * The body tag of Fisher Body, 1968 to 1972, lying on the cowl: year and style number, plant and body number; trim and
 * paint; the time built, in 1968 and on early cars of 1969 above the others, later below them and before the option
 * codes, of which some stand on the trim line. To 1968 paint has letters, from 1969 figures. Rows of table `layout` cite
 * what the two forms rest on.
 */
import type { LinedLayout } from '../../engine/lined-layout';
import {
	TAG,
	optionLine,
	options,
	paintInFigures,
	paintInLetters,
	plantAndNumber,
	seat,
	styleInFigures,
	timeBuilt,
	timeLine,
	trim,
	year
} from './tag-fields';

export const gmFisherTag1968: LinedLayout = {
	...TAG,
	id: 'gm-fisher-tag-1968',
	title: 'Fisher body tag, General Motors, 1968',
	years: [1968, 1968],
	source: 'ChevelleStuff, Fisher Body Number Plate, 1968; the order of the lines from memory',
	lines: [
		{ ...timeLine, optional: true },
		{ label: 'Style line', fields: [year(1968), ...styleInFigures, ...plantAndNumber] },
		{ label: 'Trim and paint', fields: [trim, options, paintInLetters] },
		{
			label: 'Time built and options',
			optional: true,
			fields: [{ ...timeBuilt, optional: true }, options]
		}
	],
	examples: {
		good: '04C / ST 68 12437 NOR 123456 BDY / TR 712 UU PNT',
		bad: '04C / TR 712 UU PNT'
	}
};

export const gmFisherTag1969: LinedLayout = {
	...TAG,
	id: 'gm-fisher-tag-1969-1972',
	title: 'Fisher body tag, General Motors, 1969–72',
	years: [1969, 1972],
	source: 'Firebird Gallery, Authenticate your Firebird; the order of the lines from memory',
	lines: [
		{
			label: 'Style line',
			fields: [year(1969, 1970, 1971, 1972), ...styleInFigures, ...plantAndNumber]
		},
		{ label: 'Trim and paint', fields: [trim, seat, ...paintInFigures] },
		timeLine,
		optionLine
	],
	examples: {
		good: 'ST 69 12437 NOR 123456 BDY / TR 711 72 B PNT / 04C X33 D80',
		bad: 'ST 69 12437 NOR 123456 BDY / 04C X33'
	}
};
