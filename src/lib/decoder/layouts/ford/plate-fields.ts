/** The fields that the plates and labels of Ford, Mercury and Lincoln share; their order differs by year. */
import type { LineField, LineForm } from '../../engine/lined-layout';
import { ANY, DIGITS, LETTERS, PLATE_MONTHS } from './signs';

export const serial: LineField = {
	name: 'partial_serial',
	label: 'Serial number',
	shape: {
		chars: [DIGITS, LETTERS, DIGITS, DIGITS, ANY, DIGITS, DIGITS, DIGITS, DIGITS, DIGITS, DIGITS]
	},
	reads: { by: 'serial', layouts: ['ford-1960-1980'] }
};

export const serialLine: LineForm = { label: 'Serial number', fields: [serial] };

export const body: LineField = {
	name: 'body_style',
	label: 'Body',
	words: ['BODY', 'BDY'],
	shape: { chars: [DIGITS, DIGITS, LETTERS] },
	reads: { by: 'table', table: 'body_code' }
};

/** One color, or two of a two-tone: where the pair has no row, each character is looked up by itself. */
export const paint: LineField = {
	name: 'paint',
	label: 'Paint',
	words: ['COLOR', 'COL'],
	shape: { chars: ANY, length: [1, 2] },
	reads: {
		by: 'table',
		table: 'paint',
		otherwise: [[[1, 1]]],
		also: [
			{ name: 'paint_upper', label: 'Second color', by: 'table', table: 'paint', parts: [[2, 2]] }
		]
	}
};

export const trim: LineField = {
	name: 'trim',
	label: 'Trim',
	words: ['TRIM'],
	shape: { chars: ANY, length: [2, 3] },
	// Where the whole code has no row, its last character still tells the color.
	reads: { by: 'table', table: 'trim', otherwise: [[[-1, -1]]] }
};

/** The day has two figures; below ten the naught may be left out. */
export const dates: readonly LineField[] = [
	{
		name: 'build_date',
		label: 'Scheduled date',
		words: ['DATE'],
		optional: true,
		shape: { chars: ['0123', DIGITS, PLATE_MONTHS] },
		reads: { by: 'date', format: 'ford-plate' }
	},
	{
		name: 'build_date',
		label: 'Scheduled date',
		words: ['DATE'],
		optional: true,
		shape: { chars: [DIGITS, PLATE_MONTHS], whole: true },
		reads: { by: 'date', format: 'ford-plate' }
	}
];

/** The district, and the number of a special order behind it. */
export const districts: readonly LineField[] = [
	{
		name: 'sales_district',
		label: 'District',
		words: ['DSO'],
		optional: true,
		shape: { chars: [`AB${DIGITS}`, DIGITS] },
		reads: { by: 'table', table: 'sales_district' }
	},
	{
		name: 'sales_district',
		label: 'Special order',
		optional: true,
		shape: { chars: DIGITS, length: 4 },
		reads: { by: 'table', table: 'sales_district' }
	}
];

export const axle: LineField = {
	name: 'axle',
	label: 'Axle',
	words: ['AXLE'],
	shape: { chars: ANY, length: 1 },
	reads: { by: 'table', table: 'axle' }
};

export const transmission: LineField = {
	name: 'transmission',
	label: 'Transmission',
	words: ['TRANS', 'TRNS', 'TR'],
	shape: { chars: ANY, length: 1 },
	reads: { by: 'table', table: 'transmission' }
};
