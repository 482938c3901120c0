/**
 * The assembly stamp on the pad of an engine of Chrysler Corporation, to 1974: the letter of the model year, cubic inches,
 * month and day, with HP and other marks after the size or after the date.
 * Source: For C Bodies Only, casting date thread (B440 is of 1966), and Moparr Motor Detroit, "Understanding Production
 * Date Codes" (G is 1971); row `chrysler-engine-pad` of table `layout` cites all, and says what rests on memory.
 */
import type { LinedLayout } from '../../engine/lined-layout';
import { assembled, displacement, marks, partOfSerial } from './engine-fields';

const FIRST = 1965;
/** One letter a model year; I is left out. */
const LETTERS = 'ABCDEFGHJK';
const years = Object.fromEntries(
	[...LETTERS].map((letter, index): [string, readonly number[]] => [letter, [FIRST + index]])
);

export const chryslerEnginePad: LinedLayout = {
	id: 'chrysler-engine-pad',
	kind: 'engine',
	maker: 'chrysler',
	title: 'Engine pad, Chrysler Corporation, 1965–74',
	years: [FIRST, 1974],
	source: 'Casting date question (For C Bodies Only); Understanding Production Date Codes',
	order: 'down',
	lines: [
		{
			label: 'Assembly stamp',
			fields: [
				{
					name: 'model_year',
					label: 'Model year',
					shape: { chars: LETTERS, length: 1 },
					reads: { by: 'year', years }
				},
				displacement,
				...marks,
				assembled,
				...marks,
				{ ...partOfSerial, optional: true }
			]
		}
	],
	examples: { good: 'F383 9 28 HP', bad: 'F38' }
};
