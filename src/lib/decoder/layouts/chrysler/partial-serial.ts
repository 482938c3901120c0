/**
 * The part of the serial number on engine and transmission of Chrysler Corporation from 1968: the figure of the year,
 * the plant, and the sequence number. Row `chrysler-partial-serial` of table `layout` cites what it rests on.
 */
import type { LinedLayout } from '../../engine/lined-layout';
import { ANY, DIGITS } from './signs';

export const chryslerPartialSerial: LinedLayout = {
	id: 'chrysler-partial-serial',
	kind: 'engine',
	maker: 'chrysler',
	title: 'Part of the serial number, Chrysler Corporation, from 1968',
	years: [1968, 1980],
	source: 'From memory',
	order: 'down',
	lines: [
		{
			label: 'Part of the serial number',
			fields: [
				{
					name: 'partial_serial',
					label: 'Part of the serial number',
					shape: { chars: [DIGITS, ANY, DIGITS, DIGITS, DIGITS, DIGITS, DIGITS, DIGITS] },
					reads: {
						by: 'serial',
						layouts: ['chrysler-1966-1980'],
						places: [6, 7, 8, 9, 10, 11, 12, 13]
					}
				}
			]
		}
	],
	examples: { good: '0B183475', bad: '0B18' }
};
