/**
 * The engine number of Chrysler Corporation from 1968: two letters of the engine plant, cubic inches, at times a letter, four
 * figures of the maker's calendar of days, and the number within the day. On the rail of the oil pan of B engines, on
 * the pad of small V8s.
 * Source: For C Bodies Only, casting date thread, for the place and the day count; the rest from memory, as row
 * `chrysler-engine-serial` of table `layout` says.
 */
import type { LinedLayout } from '../../engine/lined-layout';
import { dayCount, displacement, letterAfterSize, partOfSerial, unitOfDay } from './engine-fields';

export const chryslerEngineSerial: LinedLayout = {
	id: 'chrysler-engine-serial',
	kind: 'engine',
	maker: 'chrysler',
	title: 'Engine number with a day count, Chrysler Corporation, from 1968',
	years: [1968, 1980],
	source: 'Casting date question (For C Bodies Only); the order from memory',
	order: 'down',
	lines: [
		{
			label: 'Engine number',
			fields: [
				{
					name: 'assembly_plant',
					label: 'Engine plant',
					shape: { chars: ['P', 'MTW'] },
					reads: { by: 'table', table: 'engine_plant' }
				},
				displacement,
				letterAfterSize,
				dayCount,
				unitOfDay,
				{ ...partOfSerial, optional: true }
			]
		}
	],
	examples: { good: 'PM340 2711 0123', bad: 'PM34' }
};
