/**
 * A casting of General Motors: its number and, beside it, the date on which it was cast: a letter for the month, the
 * day, the last figure of the year. Row `gm-casting` of table `layout` cites the form of the date.
 */
import type { LinedLayout } from '../../engine/lined-layout';

const DIGITS = '0123456789';

export const gmCastingStamp: LinedLayout = {
	id: 'gm-casting-number-date',
	kind: 'casting',
	maker: 'gm',
	title: 'General Motors casting number and date',
	years: [1955, 1980],
	source: 'Engine info 4: casting and date codes (National Nostalgic Nova)',
	order: 'down',
	lines: [
		{
			label: 'Number and date',
			fields: [
				{
					name: 'casting_number',
					label: 'Casting number',
					shape: { chars: DIGITS, length: [5, 8] },
					reads: { by: 'table', table: 'casting_number' }
				},
				{
					name: 'casting_date',
					label: 'Cast',
					optional: true,
					shape: { chars: `ABCDEFGHIJKL${DIGITS}`, length: [3, 5] },
					reads: { by: 'date', format: 'gm-casting' }
				}
			]
		}
	],
	examples: { good: '3914678 F106', bad: '391' }
};
