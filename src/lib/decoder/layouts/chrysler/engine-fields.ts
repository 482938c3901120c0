/** Fields that several forms of this maker's engine stamps share. */
import type { LineField } from '../../engine/lined-layout';
import { ANY, DIGITS, LETTERS } from './signs';

/** The size in cubic inches, by which the stamp names the engine. */
export const displacement: LineField = {
	name: 'engine',
	label: 'Cubic inches',
	shape: { chars: ['1234', DIGITS, DIGITS] },
	reads: { by: 'table', table: 'unit_code' }
};

/**
 * High performance, low compression and the like: stamped after the size or after the date. Those without a figure come
 * first, so that HP 2 10 is not taken for HP2 10.
 */
export const marks: readonly LineField[] = [
	{
		name: 'option',
		label: 'Mark',
		optional: true,
		shape: { chars: 'CEHILMPS', length: [2, 4] },
		reads: { by: 'table', table: 'unit_code' }
	},
	{
		name: 'option',
		label: 'Mark',
		optional: true,
		shape: { chars: ['H', 'P', '2'] },
		reads: { by: 'table', table: 'unit_code' }
	}
];

/** A letter that may follow the size; what it says is not known. */
export const letterAfterSize: LineField = {
	name: 'option',
	label: 'Letter after the size',
	optional: true,
	shape: { chars: LETTERS, length: 1 },
	reads: { by: 'unknown' }
};

/** Month and day of assembly, without a year. */
export const assembled: LineField = {
	name: 'assembly_date',
	label: 'Assembled',
	optional: true,
	shape: { chars: DIGITS, length: [2, 4] },
	reads: { by: 'date', format: 'chrysler-pad' }
};

/** The day of assembly in the maker's own calendar. */
export const dayCount: LineField = {
	name: 'assembly_date',
	label: 'Assembled',
	shape: { chars: DIGITS, length: 4 },
	reads: { by: 'date', format: 'chrysler-day-count' }
};

/** Which unit of the day it was. */
export const unitOfDay: LineField = {
	name: 'option',
	label: 'Number within the day',
	optional: true,
	shape: { chars: DIGITS, length: [1, 4] },
	reads: { by: 'number' }
};

/** The car's own number from its sixth place on, which stands on a pad of its own from 1968. */
export const partOfSerial: LineField = {
	name: 'partial_serial',
	label: 'Part of the serial number',
	shape: { chars: [DIGITS, ANY, DIGITS, DIGITS, DIGITS, DIGITS, DIGITS, DIGITS] },
	reads: {
		by: 'serial',
		layouts: ['chrysler-1966-1980'],
		places: [6, 7, 8, 9, 10, 11, 12, 13]
	}
};
