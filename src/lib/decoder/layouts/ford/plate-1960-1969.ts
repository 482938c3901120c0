/**
 * The data plate, later warranty plate, of Ford, Mercury and Lincoln, 1960 to 1969: body, paint, trim, date, district,
 * axle and transmission. Up to 1961 the transmission stands before the axle, from 1962 the axle before the transmission
 * by the Thunderbird Registry; the pages on Lincoln and an article on a Falcon still name the transmission first in
 * 1963. To 1963 both orders are read, and where both make sense both are told. The serial number stands above the codes
 * on some and below them on others, by year and line: rows of table `tag_field` say what is known, and neither is held
 * against a plate. Rows of table `layout` cite what the two forms rest on.
 */
import type { LineField, LinedLayout } from '../../engine/lined-layout';
import {
	axle,
	body,
	dates,
	districts,
	paint,
	serialLine,
	transmission,
	trim
} from './plate-fields';

const atEitherEnd = { ...serialLine, optional: true } as const;
const plate = (...last: readonly LineField[]) =>
	({
		kind: 'body_tag',
		maker: 'ford',
		order: 'down',
		lookFirst: ['body_style'],
		divisionFrom: 'body_style',
		lines: [
			atEitherEnd,
			{ label: 'Codes', fields: [body, paint, trim, ...dates, ...districts, ...last] },
			atEitherEnd
		]
	}) as const;

export const fordPlate1960: LinedLayout = {
	...plate(transmission, axle),
	id: 'ford-plate-1960-1963',
	title: 'Data plate, Ford Motor Company, 1960–63, transmission before axle',
	years: [1960, 1963],
	source: 'Thunderbird Registry, data plates 1955–1970; Automotive Mileposts, 1961 Lincoln',
	examples: { good: '71D M 85 15E 34 5 5 / 3H26U217366', bad: '71D M / 3H26U217366' }
};

export const fordPlate1962: LinedLayout = {
	...plate(axle, transmission),
	id: 'ford-plate-1962-1969',
	title: 'Data or warranty plate, Ford Motor Company, 1962–69, axle before transmission',
	years: [1962, 1969],
	source: 'Thunderbird Registry, data plates 1955–1970; Cougar Club of America, warranty plate',
	examples: { good: '9F94H575103 / 76B P 6A 27E 46 6 X', bad: '9F94H575103 / 76B P' }
};
