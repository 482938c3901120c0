/**
 * The part of the serial number on engine and gearbox: the figure of the year, the plant and the unit number. From
 * January 1968 on all; before, on high-performance engines. Row `ford-partial-serial` of table `layout` cites what it
 * rests on.
 */
import type { LinedLayout } from '../../engine/lined-layout';
import { DIGITS, LETTERS } from './signs';

export const fordPartialSerial: LinedLayout = {
	id: 'ford-partial-serial',
	kind: 'engine',
	maker: 'ford',
	title: 'Part of the serial number, Ford Motor Company, from 1968',
	years: [1968, 1980],
	source: 'Cars We Remember, for the custom; the form from memory',
	order: 'down',
	lines: [
		{
			label: 'Part of the serial number',
			fields: [
				{
					name: 'partial_serial',
					label: 'Part of the serial number',
					shape: { chars: [DIGITS, LETTERS, DIGITS, DIGITS, DIGITS, DIGITS, DIGITS, DIGITS] },
					reads: {
						by: 'serial',
						layouts: ['ford-1960-1980'],
						places: [1, 2, 6, 7, 8, 9, 10, 11]
					}
				}
			]
		}
	],
	examples: { good: '9Fxxxxxx', bad: '9F57' }
};
