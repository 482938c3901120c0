/**
 * The trim plate of the Corvette, 1965 to 1977: date of the body as a letter and two figures, style number, body number,
 * trim and paint. It says nothing of engine and gearbox. Row `gm-corvette-plate` of table `layout` cites what it rests
 * on; where the date stands differs, and neither place is held against a plate.
 */
import type { LineField, LineForm, LinedLayout } from '../../engine/lined-layout';
import { ANY, DIGITS } from './signs';
import { TAG, style, trim, year } from './tag-fields';

const date: LineField = {
	name: 'build_date',
	label: 'Body built',
	shape: { chars: ['ABCDEFGHIJKLMNOPQ', '0123', DIGITS], whole: true },
	reads: { by: 'date', format: 'corvette-body-month-day' }
};
const dateLine: LineForm = { label: 'Date', optional: true, fields: [date] };
const bodyNumber: LineField = {
	name: 'body_number',
	label: 'Body number',
	words: ['BODY', 'BDY', 'STL'],
	wordsAfter: ['BODY', 'BDY'],
	shape: { chars: [ANY, DIGITS, DIGITS, DIGITS, DIGITS, DIGITS], fewest: 2 },
	reads: { by: 'number' }
};
const trimAndPaint: LineForm = {
	label: 'Trim and paint',
	fields: [
		{ ...trim, shape: { chars: ANY, length: [3, 4], whole: true } },
		{
			name: 'paint',
			label: 'Paint',
			words: ['PAINT', 'PNT'],
			wordsAfter: ['PAINT', 'PNT'],
			shape: { chars: [ANY, ANY, DIGITS], fewest: 2 },
			reads: { by: 'table', table: 'paint' }
		}
	]
};

export const corvettePlate: LinedLayout = {
	...TAG,
	divisions: ['Chevrolet'],
	id: 'gm-corvette-plate-1965-1977',
	title: 'Trim plate, Corvette, 1965–77',
	years: [1965, 1977],
	source:
		'76vette.com, Is My C3 Corvette an Early or Late Model?, for the date; the rest from memory',
	lines: [
		dateLine,
		{
			label: 'Style and body',
			fields: [year(1965, 1977), ...style('either', '9Y', '4Z'), bodyNumber]
		},
		trimAndPaint,
		dateLine
	],
	examples: {
		good: 'STYLE 67-19437 BODY S1234 / TRIM STD PAINT 984 / H12',
		bad: 'STYLE 67-19437 BODY S1234 / H12'
	}
};
