/**
 * The body tag of Fisher Body, 1969 to 1975, lying on the cowl: year and style number, plant and body number; trim and
 * paint; the time built and option codes. From 1973 the style number has letters for body type and series, and the plant
 * may be the letter of the serial number; Norwood then stamped S for every Firebird of 1974, so that the series is no
 * proof there. Early cars of 1969 have the form of 1968. Row `gm-fisher-tag-1969-1975` of table `layout` cites what it
 * rests on.
 */
import type { LinedLayout } from '../../engine/lined-layout';
import {
	TAG,
	optionLine,
	paintInFigures,
	plantAndNumber,
	seat,
	style,
	timeLine,
	trim,
	year
} from './tag-fields';

export const gmFisherTag1969: LinedLayout = {
	...TAG,
	id: 'gm-fisher-tag-1969-1975',
	title: 'Fisher body tag, General Motors, 1969–75',
	years: [1969, 1975],
	source: 'Firebird Gallery, Authenticate your Firebird; the order of the lines from memory',
	lines: [
		{ label: 'Style line', fields: [year(1969, 1975), ...style('either'), ...plantAndNumber] },
		{ label: 'Trim and paint', fields: [trim, seat, ...paintInFigures] },
		timeLine,
		optionLine
	],
	examples: {
		good: 'ST 69 12437 NOR 123456 BDY / TR 711 72 B PNT / 04C X33 D80',
		bad: 'ST 69 12437 NOR 123456 BDY / 04C X33'
	}
};
