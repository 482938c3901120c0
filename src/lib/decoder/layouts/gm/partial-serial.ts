/**
 * The part of the serial number that General Motors struck on engines and gearboxes from 1968: division, year figure,
 * plant, sequence number. Row `gm-partial-serial` of table `layout` cites what it rests on.
 */
import type { LinedLayout } from '../../engine/lined-layout';

const DIGITS = '0123456789';
const LETTERS = 'ABCDEFGHIJKLMNOPQRSTUVWXYZ';

export const gmPartialSerial: LinedLayout = {
	id: 'gm-partial-serial',
	kind: 'engine',
	maker: 'gm',
	title: 'Part of the serial number, General Motors, from 1968',
	years: [1968, 1980],
	source:
		'Identification Numbers FAQ (First Gen Firebird), for Pontiac; the general form from memory',
	order: 'down',
	lines: [
		{
			label: 'Part of the serial number',
			fields: [
				{
					name: 'partial_serial',
					label: 'Part of the serial number',
					shape: {
						chars: [DIGITS, DIGITS, LETTERS, DIGITS, DIGITS, DIGITS, DIGITS, DIGITS, DIGITS]
					},
					reads: {
						by: 'serial',
						layouts: ['gm-1965-1971', 'gm-1972-1980'],
						places: [1, 6, 7, 8, 9, 10, 11, 12, 13]
					}
				}
			]
		}
	],
	examples: { good: '29P100123', bad: '29P10' }
};
