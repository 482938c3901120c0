/**
 * The steel tag under the coil bracket: displacement, two figures of the model year, change level, year figure and month
 * letter of production, and the engine code of three figures with a letter. Often only the code can be read, so that
 * all else may be missing.
 * Source: 428CobraJet.org, "Engine identification codes"; row `ford-engine-tag-1964` of table `layout` cites all.
 */
import type { LinedLayout } from '../../engine/lined-layout';
import { DIGITS, LETTERS, MONTHS } from './signs';

const FIRST = 1964;
const years = Object.fromEntries(
	Array.from({ length: 17 }, (_, index): [string, readonly number[]] => [
		String(FIRST - 1900 + index),
		[FIRST + index]
	])
);

export const fordEngineTagStamp: LinedLayout = {
	id: 'ford-engine-tag-1964',
	kind: 'engine',
	maker: 'ford',
	title: 'Engine tag, Ford Motor Company, from 1964',
	years: [FIRST, 1980],
	source: '428CobraJet.org, Engine identification codes',
	order: 'down',
	lines: [
		{
			label: 'Engine tag',
			fields: [
				{
					name: 'engine',
					label: 'Cubic inches',
					optional: true,
					shape: { chars: ['1234', DIGITS, DIGITS], whole: true },
					reads: { by: 'number' }
				},
				{
					name: 'model_year',
					label: 'Model year',
					optional: true,
					shape: { chars: ['678', DIGITS], whole: true },
					reads: { by: 'year', years }
				},
				{
					name: 'option',
					label: 'Change level',
					optional: true,
					shape: { chars: DIGITS, length: [1, 2], whole: true },
					reads: { by: 'number' }
				},
				{
					name: 'assembly_date',
					label: 'Assembled',
					optional: true,
					shape: { chars: [DIGITS, MONTHS] },
					reads: { by: 'date', format: 'ford-engine-tag' }
				},
				{
					name: 'unit_code',
					label: 'Engine code',
					shape: { chars: [DIGITS, DIGITS, DIGITS, LETTERS] },
					reads: { by: 'table', table: 'engine_tag', parts: [[1, 3]] }
				}
			]
		}
	],
	examples: { good: '428 68 8D 407J', bad: '428' }
};
