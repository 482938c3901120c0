/**
 * The tag of a Ford gearbox: three letters that name it, a dash, the letters of the change level.
 * From memory; row `ford-transmission-tag` of table `layout` says so.
 */
import type { LinedLayout } from '../../engine/lined-layout';
import { LETTERS } from './signs';

export const fordTransmissionTag: LinedLayout = {
	id: 'ford-transmission-tag',
	kind: 'casting',
	maker: 'ford',
	title: 'Transmission tag, Ford Motor Company, 1964–80',
	years: [1964, 1980],
	source: 'From memory',
	order: 'down',
	lines: [
		{
			label: 'Transmission tag',
			fields: [
				{
					name: 'transmission',
					label: 'Transmission',
					shape: { chars: ['HPR', LETTERS, LETTERS], whole: true },
					reads: { by: 'table', table: 'transmission' }
				},
				{
					name: 'option',
					label: 'Change level',
					shape: { chars: LETTERS, length: [1, 2], whole: true },
					reads: { by: 'number' }
				}
			]
		}
	],
	examples: { good: 'RUG-E', bad: 'RUG' }
};
