/**
 * The production code of a Buick engine: two letters, the first for the year, the second for the engine; often a number
 * behind them. The car's own number stands on the other side of the block: year, plant and sequence number in 1965, with
 * the division before them from 1968. Row `buick-production-code` of table `layout` cites what it rests on.
 */
import type { LinedLayout } from '../../engine/lined-layout';
import { partialOf, partialWithoutDivision } from './partial-fields';
import { DIGITS, LETTERS } from './signs';

export const buickEngine: LinedLayout = {
	id: 'buick-production-code',
	kind: 'engine',
	maker: 'gm',
	title: 'Buick production code of the engine',
	years: [1963, 1971],
	source: 'Engine codes (65gs.com); Buick Performance Club, GS production',
	order: 'down',
	divisions: ['Buick'],
	lines: [
		{
			label: 'Production code',
			fields: [
				{
					name: 'unit_code',
					label: 'Production code',
					shape: { chars: ['JKLMNPRST', LETTERS] },
					reads: {
						by: 'table',
						table: 'unit_code',
						also: [
							{
								name: 'model_year',
								label: 'Year of the engine',
								by: 'table',
								table: 'date_code',
								parts: [[1, 1]]
							}
						]
					}
				},
				{
					name: 'unknown',
					label: 'Number behind the code',
					optional: true,
					shape: { chars: DIGITS, length: [1, 4] },
					reads: { by: 'number' }
				},
				partialWithoutDivision,
				partialOf('4')
			]
		}
	],
	examples: { good: 'LR305', bad: '305' }
};
