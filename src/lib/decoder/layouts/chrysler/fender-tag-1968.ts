/**
 * The fender tag of Chrysler Corporation, 1968, read from the bottom up: model and body, engine group, transmission,
 * tires, scheduled date and order number; above it numbered columns with axle, trim and paint; above that columns of
 * capital and of small letters with one figure under each, where a figure means something only with its column: it is
 * typed behind it, N8 for an 8 under N.
 * Source: turbinecar.com, a 1968 tag worked through; row `chrysler-fender-tag-1968` of table `layout`.
 */
import type { LinedLayout } from '../../engine/lined-layout';
import { ANY, DIGITS, FIRST_OF_DAY, LETTERS, MONTHS } from './signs';

export const chryslerFenderTag1968: LinedLayout = {
	id: 'chrysler-fender-tag-1968',
	kind: 'body_tag',
	maker: 'chrysler',
	title: 'Fender tag, Chrysler Corporation, 1968',
	years: [1968, 1968],
	source: 'turbinecar.com, fender tag of a 1968 Plymouth, worked through',
	order: 'up',
	lines: [
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
					reads: { by: 'date', format: 'chrysler-scheduled' }
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
					name: 'axle',
					label: 'Axle',
					words: ['AX'],
					optional: true,
					shape: { chars: DIGITS, length: 1, whole: true },
					reads: { by: 'table', table: 'axle' }
				},
				{
					name: 'trim',
					label: 'Trim',
					words: ['TRM'],
					shape: { chars: [LETTERS, DIGITS, LETTERS], whole: true },
					reads: { by: 'table', table: 'trim' }
				},
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
			label: 'Lettered columns',
			optional: true,
			repeats: true,
			fields: [
				{
					name: 'option',
					label: 'Option',
					repeats: true,
					shape: { chars: [LETTERS, DIGITS], whole: true },
					reads: { by: 'table', table: 'option' }
				}
			]
		}
	],
	examples: {
		good: 'H7 Y8 / N8 R1 X2 / AX 1 TRM P2F PNT BT2 / PP23 41 5 53 818 193128',
		bad: 'H7 / 818'
	}
};
