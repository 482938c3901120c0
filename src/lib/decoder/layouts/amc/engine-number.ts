/**
 * The number of an American Motors engine: the date on which it was finished, with the letter of the engine in its
 * midst. Source: AMC Rambler Club, "AMC engine codes" (Frank Swygert); row `amc-engine-day-build` of table `layout`
 * cites all.
 */
import type { LinedLayout } from '../../engine/lined-layout';

const DIGITS = '0123456789';

export const amcEngineNumber: LinedLayout = {
	id: 'amc-engine-number',
	kind: 'engine',
	maker: 'amc',
	title: 'Engine day build code, American Motors, from 1967',
	years: [1967, 1980],
	source: 'AMC engine codes (Frank Swygert); the order of its parts from memory',
	order: 'down',
	lines: [
		{
			label: 'Engine number',
			fields: [
				{
					name: 'assembly_date',
					label: 'Assembled',
					shape: {
						chars: [DIGITS, '01', DIGITS, 'ABCDEFGHIJKLMNOPQRSTUVWXYZ', '0123', DIGITS]
					},
					reads: { by: 'date', format: 'amc-engine-day-build' }
				}
			]
		}
	],
	examples: { good: '209N15', bad: '209N' }
};
