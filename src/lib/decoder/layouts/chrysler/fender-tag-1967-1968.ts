/**
 * The fender tag of Chrysler Corporation, 1967 and 1968, read from the bottom up: model and body, engine group, transmission,
 * tires, scheduled date and order number; above it numbered columns, then axle, trim and paint; above that columns of
 * capital and, on top, of small letters. Each column holds one figure, which means something only with its column: it is
 * typed behind it, N8 for an 8 under N.
 * Source: turbinecar.com, a 1968 tag worked through; rows `chrysler-fender-tag-1967` and `chrysler-fender-tag-1968` of table
 * `layout` cite all.
 */
import type { LinedLayout, LineForm } from '../../engine/lined-layout';
import { trim } from './tag-fields';
import { ANY, DIGITS, FIRST_OF_DAY, LETTERS, MONTHS } from './signs';

/** Letters that stand above columns; the figure under Y is struck on the line, not planned. */
const COLUMNS = LETTERS.replace('Y', '');

const lines: readonly LineForm[] = [
	{
		label: 'Model, engine, date and order number, the lowest line',
		fields: [
			{
				name: 'partial_serial',
				label: 'Model and body',
				shape: { chars: [LETTERS, LETTERS, DIGITS, DIGITS] },
				reads: { by: 'serial', layouts: ['chrysler-1966-1980'], places: [1, 2, 3, 4] }
			},
			{
				name: 'engine',
				label: 'Engine group',
				shape: { chars: DIGITS, length: 2, whole: true },
				reads: { by: 'table', table: 'option' }
			},
			{
				name: 'transmission',
				label: 'Transmission',
				shape: { chars: DIGITS, length: 1, whole: true },
				reads: { by: 'table', table: 'transmission' }
			},
			{
				name: 'option',
				label: 'Tires',
				shape: { chars: DIGITS, length: 2, whole: true },
				reads: { by: 'table', table: 'option' }
			},
			{
				name: 'build_date',
				label: 'Scheduled date',
				shape: { chars: [MONTHS, FIRST_OF_DAY, DIGITS], whole: true },
				reads: { by: 'date', format: 'chrysler-punched' }
			},
			{
				name: 'order_number',
				label: 'Order number',
				shape: { chars: DIGITS, length: [5, 6] },
				reads: { by: 'number' }
			}
		]
	},
	{
		label: 'Axle, trim and paint',
		fields: [
			{
				name: 'option',
				label: 'Numbered column',
				optional: true,
				repeats: true,
				shape: { chars: ['12345678', DIGITS], whole: true },
				reads: { by: 'columns', table: 'option' }
			},
			{
				name: 'axle',
				label: 'Axle',
				words: ['AX'],
				optional: true,
				shape: { chars: DIGITS, length: 1, whole: true },
				reads: { by: 'table', table: 'axle' }
			},
			trim({ chars: [LETTERS, DIGITS, LETTERS], whole: true }, ['TRM']),
			{
				name: 'paint',
				label: 'Paint',
				words: ['PNT'],
				shape: { chars: ANY, length: [2, 3], whole: true },
				reads: { by: 'table', table: 'paint' }
			}
		]
	},
	{
		label: 'Columns of capital letters',
		optional: true,
		fields: [
			{
				name: 'option',
				label: 'Option',
				repeats: true,
				shape: { chars: [LETTERS, DIGITS], whole: true },
				reads: { by: 'columns', table: 'option' }
			}
		]
	},
	{
		label: 'Columns of small letters, the top line',
		optional: true,
		fields: [
			{
				name: 'option',
				label: 'Option, small letter',
				repeats: true,
				shape: { chars: [COLUMNS, DIGITS], whole: true },
				// Its row is found under the letter written twice, so that it is not taken for the capital one.
				reads: {
					by: 'table',
					table: 'option',
					parts: [
						[1, 1],
						[1, 1],
						[2, 2]
					]
				}
			},
			{
				name: 'option',
				label: 'Struck on the line, small letter',
				optional: true,
				shape: { chars: ['Y', DIGITS], whole: true },
				reads: {
					by: 'table',
					table: 'option',
					parts: [
						[1, 1],
						[1, 1],
						[2, 2]
					]
				}
			}
		]
	}
];
const shared = { kind: 'body_tag', maker: 'chrysler', order: 'up', lines } as const;

export const chryslerFenderTag1968: LinedLayout = {
	...shared,
	id: 'chrysler-fender-tag-1968',
	title: 'Fender tag, Chrysler Corporation, 1968',
	years: [1968, 1968],
	source: 'turbinecar.com, fender tag of a 1968 Plymouth, worked through',
	examples: {
		good: 'H7 Y8 / N8 R1 X2 / 30 66 78 AX 1 TRM P2F PNT BT2 / PP23 41 5 53 818 193128',
		bad: 'H7 / 818'
	}
};

/** The tag of 1967 has the form of that of 1968; what its columns mean is not known. */
export const chryslerFenderTag1967: LinedLayout = {
	...shared,
	id: 'chrysler-fender-tag-1967',
	title: 'Fender tag, Chrysler Corporation, 1967',
	years: [1967, 1967],
	source: 'From memory: the form of 1968',
	examples: { good: 'AX 1 TRM P2F PNT PP1 / RP23 62 5 53 818 193128', bad: 'H7 / 818' }
};
