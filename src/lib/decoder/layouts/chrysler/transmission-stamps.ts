/**
 * The numbers stamped on the gearboxes of Chrysler Corporation from 1968. An automatic has PK, the part number of seven
 * figures, four figures of the maker's calendar of days and the number within the day; a four-speed of New Process has
 * PP833, the day and the number within it. From memory; their rows of table `layout` say so. The part of the car's
 * number may stand beside both.
 */
import type { LineField, LinedLayout } from '../../engine/lined-layout';
import { dayCount, partOfSerial, unitOfDay } from './engine-fields';
import { DIGITS } from './signs';

const gearbox = (chars: readonly string[]): LineField => ({
	name: 'transmission',
	label: 'Transmission',
	shape: { chars },
	reads: { by: 'table', table: 'transmission' }
});
const shared = {
	kind: 'casting',
	maker: 'chrysler',
	years: [1968, 1980],
	source: 'From memory',
	order: 'down'
} as const;
const beside: readonly LineField[] = [dayCount, unitOfDay, { ...partOfSerial, optional: true }];

export const chryslerAutomaticStamp: LinedLayout = {
	...shared,
	id: 'chrysler-automatic-stamp',
	title: 'TorqueFlite number, Chrysler Corporation, from 1968',
	lines: [
		{
			label: 'Transmission number',
			fields: [
				gearbox(['P', 'K']),
				{
					name: 'casting_number',
					label: 'Part number',
					shape: { chars: DIGITS, length: 7 },
					reads: { by: 'number' }
				},
				...beside
			]
		}
	],
	examples: { good: 'PK 2801547 2711 0123', bad: 'PK 2801' }
};

export const chryslerFourSpeedStamp: LinedLayout = {
	...shared,
	id: 'chrysler-four-speed-stamp',
	title: 'Four-speed number, Chrysler Corporation, from 1968',
	lines: [
		{
			label: 'Transmission number',
			fields: [gearbox(['P', 'P', '8', '3', '3']), ...beside]
		}
	],
	examples: { good: 'PP833 2711 0123', bad: 'PP833' }
};
