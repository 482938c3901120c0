/**
 * The assembly stamp of later engines of Chrysler Corporation: the figure of the model year, the letter of the engine plant,
 * cubic inches, at times a letter, month and day, with HP and other marks.
 * Source: For C Bodies Only, a 440 of 1977 that reads 7T440T; row `chrysler-engine-pad-figure` of table `layout` cites
 * all, and says what rests on memory.
 */
import type { LinedLayout } from '../../engine/lined-layout';
import { assembled, displacement, letterAfterSize, marks, partOfSerial } from './engine-fields';

const [FIRST, LAST] = [1973, 1980] as const;
const years = Object.fromEntries(
	Array.from({ length: LAST - FIRST + 1 }, (_, index): [string, readonly number[]] => [
		String((FIRST + index) % 10),
		[FIRST + index]
	])
);

export const chryslerEnginePadFigure: LinedLayout = {
	id: 'chrysler-engine-pad-figure',
	kind: 'engine',
	maker: 'chrysler',
	title: 'Engine pad, Chrysler Corporation, 1973–80',
	years: [FIRST, LAST],
	source: 'Odd 440 block (For C Bodies Only), for 7T440T',
	order: 'down',
	lines: [
		{
			label: 'Assembly stamp',
			fields: [
				{
					name: 'model_year',
					label: 'Model year',
					shape: { chars: Object.keys(years).join(''), length: 1 },
					reads: { by: 'year', years }
				},
				{
					name: 'assembly_plant',
					label: 'Engine plant',
					shape: { chars: 'MTW', length: 1 },
					reads: { by: 'table', table: 'engine_plant' }
				},
				displacement,
				letterAfterSize,
				...marks,
				assembled,
				...marks,
				{ ...partOfSerial, optional: true }
			]
		}
	],
	examples: { good: '4T440 HP 9 28', bad: '4T' }
};
