/**
 * The stamp on the front of a Pontiac engine, right bank: the running number of the engine plant, which has nothing to do
 * with the car's own number, and below it the code of two characters, three in 1964, that says which engine it is. The
 * same code is another engine in another year. From 1968 a part of the serial number stands near by. Row
 * `pontiac-engine-stamp` of table `layout` cites what it rests on.
 */
import type { LinedLayout } from '../../engine/lined-layout';
import { partialOf } from './partial-fields';
import { ANY, DIGITS } from './signs';

export const pontiacEngine: LinedLayout = {
	id: 'pontiac-engine-stamp',
	kind: 'engine',
	maker: 'gm',
	title: 'Pontiac engine stamp: unit number, code',
	years: [1964, 1979],
	source: 'Pontiac engine codes as published for GTO, Firebird and full-size cars',
	order: 'down',
	divisions: ['Pontiac'],
	lines: [
		{
			label: 'Engine stamp',
			fields: [
				{
					name: 'unknown',
					label: 'Engine unit number',
					optional: true,
					shape: { chars: DIGITS, length: [6, 7] },
					reads: { by: 'number' }
				},
				{
					name: 'unit_code',
					label: 'Engine code',
					shape: { chars: ANY, length: [2, 3], whole: true },
					reads: { by: 'table', table: 'unit_code' }
				},
				partialOf('2')
			]
		}
	],
	examples: { good: '123456 WS 29P100123', bad: '123456' }
};
