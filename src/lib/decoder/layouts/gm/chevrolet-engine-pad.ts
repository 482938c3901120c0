/**
 * The assembly stamp on the pad of a Chevrolet engine: plant letter, month and day, and the suffix that says which
 * engine it was built as; no year. From 1968 a part of the car's serial number stands beside it or under it.
 * Source: Drivin’ It Home, Engine codes; row `chevrolet-engine-pad` of table `layout` cites all.
 */
import type { LinedLayout } from '../../engine/lined-layout';

const DIGITS = '0123456789';
const LETTERS = 'ABCDEFGHIJKLMNOPQRSTUVWXYZ';

export const chevroletEnginePad: LinedLayout = {
	id: 'chevrolet-engine-pad',
	kind: 'engine',
	maker: 'gm',
	title: 'Chevrolet engine stamp: plant, month, day, suffix',
	years: [1955, 1980],
	source: 'Engine codes (Drivin’ It Home)',
	order: 'down',
	divisions: ['Chevrolet'],
	lines: [
		{
			label: 'Assembly stamp',
			fields: [
				{
					name: 'assembly_plant',
					label: 'Engine plant',
					shape: { chars: 'FKMSTV', length: 1 },
					reads: { by: 'table', table: 'engine_plant' }
				},
				{
					name: 'assembly_date',
					label: 'Assembled',
					// A one may be struck as I, and a naught typed as O.
					shape: { chars: `${DIGITS}IO`, length: 4 },
					reads: { by: 'date', format: 'gm-assembly-month-day' }
				},
				{
					name: 'unit_code',
					label: 'Suffix',
					shape: { chars: LETTERS, length: [1, 3] },
					reads: { by: 'table', table: 'unit_code' }
				},
				{
					name: 'partial_serial',
					label: 'Part of the serial number',
					optional: true,
					shape: {
						chars: ['1', DIGITS, LETTERS, DIGITS, DIGITS, DIGITS, DIGITS, DIGITS, DIGITS]
					},
					reads: {
						by: 'serial',
						layouts: ['gm-1965-1971', 'gm-1972-1980'],
						places: [1, 6, 7, 8, 9, 10, 11, 12, 13]
					}
				}
			]
		}
	],
	examples: { good: 'V0525CNR', bad: 'V05' }
};
