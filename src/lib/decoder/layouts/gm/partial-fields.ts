/** The part of the car's number that stands on engines and gearboxes, as a field of other stamps. */
import type { LineField } from '../../engine/lined-layout';
import { ANY, DIGITS } from './signs';

const figures = (count: number): string[] => new Array<string>(count).fill(DIGITS);

/** From 1968: division, year, plant, sequence. */
export const partialOf = (division: string): LineField => ({
	name: 'partial_serial',
	label: 'Part of the serial number',
	optional: true,
	shape: { chars: [division, DIGITS, ANY, ...figures(6)] },
	reads: {
		by: 'serial',
		layouts: ['gm-1965-1971', 'gm-1972-1980'],
		places: [1, 6, 7, 8, 9, 10, 11, 12, 13]
	}
});

/** Before, without the division: year, plant, sequence. */
export const partialWithoutDivision: LineField = {
	name: 'partial_serial',
	label: 'Part of the serial number',
	optional: true,
	shape: { chars: ['567', ANY, ...figures(6)] },
	reads: { by: 'serial', layouts: ['gm-1965-1971'], places: [6, 7, 8, 9, 10, 11, 12, 13] }
};
