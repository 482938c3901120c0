/**
 * The tag under a nut of the rear axle, from 1963: axle model code with its suffix and a date above; below them the
 * ratio, with an L for limited slip in place of the point, and the diameter of the ring gear in inches.
 * Source: Ford Differentials (J. Palazzolo), section on the identification tag; row `ford-axle-tag-1963` of table
 * `layout` cites all.
 */
import type { LinedLayout } from '../../engine/lined-layout';
import { DIGITS, LETTERS } from './signs';

export const fordAxleTagStamp: LinedLayout = {
	id: 'ford-axle-tag-1963',
	kind: 'casting',
	maker: 'ford',
	title: 'Axle tag, Ford Motor Company, from 1963',
	years: [1963, 1980],
	source: 'Ford Differentials (J. Palazzolo), identification tag',
	order: 'down',
	lines: [
		{
			label: 'Axle tag',
			fields: [
				{
					name: 'unit_code',
					label: 'Axle model',
					optional: true,
					shape: { chars: ['W', LETTERS, LETTERS] },
					reads: { by: 'number' }
				},
				{
					name: 'option',
					label: 'Suffix',
					optional: true,
					shape: { chars: LETTERS + DIGITS, length: [1, 2], whole: true },
					reads: { by: 'number' }
				},
				{
					name: 'assembly_date',
					label: 'Assembled',
					optional: true,
					shape: { chars: [DIGITS, LETTERS, '0123', DIGITS] },
					reads: { by: 'date', format: 'ford-axle-tag' }
				},
				{
					name: 'axle',
					label: 'Ratio',
					shape: { chars: ['23456', 'L', DIGITS, DIGITS], whole: true },
					reads: { by: 'table', table: 'axle' }
				},
				{
					name: 'option',
					label: 'Ring gear, inches',
					optional: true,
					shape: { chars: DIGITS, length: 1, whole: true },
					reads: { by: 'number' }
				}
			]
		}
	],
	examples: { good: '4L11 9', bad: '4L' }
};
