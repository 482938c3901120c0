/**
 * A casting of Chrysler Corporation: its number of seven figures and, beside it, the date on which it was cast: month, day
 * and year in plain figures.
 * Source: For C Bodies Only, casting date thread; row `chrysler-casting-number-date` of table `layout` cites all.
 */
import type { LinedLayout } from '../../engine/lined-layout';
import { DIGITS } from './signs';

export const chryslerCastingStamp: LinedLayout = {
	id: 'chrysler-casting-number-date',
	kind: 'casting',
	maker: 'chrysler',
	title: 'Chrysler casting number and date',
	years: [1955, 1980],
	source: 'Casting date question (For C Bodies Only)',
	order: 'down',
	lines: [
		{
			label: 'Number and date',
			fields: [
				{
					name: 'casting_number',
					label: 'Casting number',
					shape: { chars: DIGITS, length: 7 },
					reads: { by: 'table', table: 'casting_number' }
				},
				{
					name: 'casting_date',
					label: 'Cast',
					optional: true,
					shape: { chars: DIGITS, length: [3, 6] },
					reads: { by: 'date', format: 'chrysler-casting' }
				}
			]
		}
	],
	examples: { good: '2536430 12 6 71', bad: '253643' }
};
