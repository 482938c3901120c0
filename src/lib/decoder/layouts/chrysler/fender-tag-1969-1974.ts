/**
 * The fender tag of Chrysler Corporation, 1969 to 1974, read from the bottom up: engine, transmission and the serial
 * number; above it paint, trim, the color of the upper door frame, the scheduled date and the order number; above
 * that the options in ascending order, over as many lines, and plates, as they need. Row
 * `chrysler-fender-tag-1969-1974` of table `layout` cites what it rests on: the lower two lines for 1971 on a club's
 * registry, the rest on memory. Lynch Road and some other plants differ in 1969.
 */
import type { LinedLayout } from '../../engine/lined-layout';
import { trim } from './tag-fields';
import { ANY, DIGITS, FIRST_OF_DAY, LETTERS, MONTHS } from './signs';

const SERIALS = ['chrysler-1966-1980'] as const;
const option = {
	name: 'option',
	label: 'Option',
	optional: true,
	repeats: true,
	shape: { chars: [LETTERS, DIGITS, DIGITS], whole: true },
	reads: { by: 'table', table: 'option' }
} as const;
/** Packages, brakes and seats: what stands before the axle, so that the axle is not taken for one of them. */
const beforeAxle = {
	...option,
	shape: { chars: ['ABC', DIGITS, DIGITS], whole: true }
} as const;
/** Axle codes stand among the options, in their order. */
const axle = {
	...option,
	name: 'axle',
	label: 'Axle',
	shape: { chars: ['D', '59', DIGITS], whole: true },
	reads: { by: 'table', table: 'axle' }
} as const;
const stripe = {
	...option,
	label: 'Stripe',
	shape: { chars: ['V', '5689', ANY], whole: true },
	reads: { by: 'table', table: 'stripe' }
} as const;

export const chryslerFenderTag1969: LinedLayout = {
	id: 'chrysler-fender-tag-1969-1974',
	kind: 'body_tag',
	maker: 'chrysler',
	title: 'Fender tag, Chrysler Corporation, 1969–74',
	years: [1969, 1974],
	source: '1971 Charger R/T Registry, Build Sheet Line 1; the upper lines from memory',
	order: 'up',
	lines: [
		{
			label: 'Engine and serial number, the lowest line',
			fields: [
				{
					name: 'engine',
					label: 'Engine',
					shape: { chars: ['E', DIGITS, DIGITS] },
					reads: { by: 'table', table: 'option' }
				},
				{
					name: 'transmission',
					label: 'Transmission',
					shape: { chars: ['D', DIGITS, DIGITS] },
					reads: { by: 'table', table: 'transmission' }
				},
				{
					name: 'partial_serial',
					label: 'Serial number, first four',
					shape: { chars: [LETTERS, LETTERS, DIGITS, DIGITS] },
					reads: { by: 'serial', layouts: SERIALS, places: [1, 2, 3, 4] }
				},
				{
					name: 'partial_serial',
					label: 'Serial number, the rest',
					shape: {
						chars: [ANY, DIGITS, ANY, DIGITS, DIGITS, DIGITS, DIGITS, DIGITS, DIGITS]
					},
					reads: { by: 'serial', layouts: SERIALS, places: [5, 6, 7, 8, 9, 10, 11, 12, 13] }
				}
			]
		},
		{
			label: 'Paint, trim, date and order number',
			fields: [
				{
					name: 'paint',
					label: 'Paint',
					shape: { chars: ANY, length: [2, 3], whole: true },
					reads: { by: 'table', table: 'paint' }
				},
				trim({ chars: ANY, length: [3, 4], whole: true }),
				{
					name: 'paint_upper',
					label: 'Upper door frame',
					optional: true,
					shape: { chars: ['0', '0', '0'], whole: true },
					reads: { by: 'table', table: 'tag_field' }
				},
				{
					name: 'paint_upper',
					label: 'Upper door frame',
					optional: true,
					shape: { chars: ANY, length: [2, 3], whole: true },
					reads: { by: 'table', table: 'paint' }
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
					shape: { chars: [ANY, DIGITS, DIGITS, DIGITS, DIGITS, DIGITS] },
					reads: { by: 'number' }
				}
			]
		},
		{
			label: 'Options',
			optional: true,
			repeats: true,
			fields: [
				beforeAxle,
				axle,
				option,
				{
					name: 'roof',
					label: 'Roof',
					optional: true,
					shape: { chars: ['V', '13', LETTERS], whole: true },
					reads: { by: 'table', table: 'roof' }
				},
				stripe,
				option,
				{
					name: 'option',
					label: 'End',
					optional: true,
					shape: { chars: ['E', 'N', 'D'], whole: true },
					reads: { by: 'table', table: 'option' }
				}
			]
		}
	],
	examples: {
		good: 'V1X Y05 END / C16 J25 N85 / EV2 H6X9 000 B30 E12345 / E74 D32 RM23 R0B123456',
		bad: 'EV2 / B30'
	}
};
