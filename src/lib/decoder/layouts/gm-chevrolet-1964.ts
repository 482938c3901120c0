/**
 * Chevrolet, model year 1964: twelve characters, without one for the division: the figure of the year, series, body style,
 * plant, sequence number. On the door pillar; under the glove box on the Corvette. Oakland’s O is a letter here.
 * Source: the book cited by row `gm-chevrolet-1964` of table `layout` for year and series of the Chevelle, the rest from
 * memory. The forms of the other divisions of 1964 are not known well enough, and are refused.
 */
import { DIGITS, LETTERS } from '../engine/characters';
import { yearsByCharacter, type Layout } from '../engine/layout';

export const gmChevrolet1964: Layout = {
	id: 'gm-chevrolet-1964',
	kind: 'serial',
	maker: 'gm',
	title: 'Chevrolet, 12 characters, 1964',
	years: [1964, 1964],
	length: 12,
	source:
		'Chevelle Restoration and Authenticity Guide 1970–1972 (D. McIntosh); the rest from memory',
	divisionFrom: 'series',
	lineFrom: 'series',
	fields: [
		{
			name: 'model_year',
			label: 'Model year',
			from: 1,
			to: 1,
			chars: '4',
			reads: { by: 'year' }
		},
		{
			name: 'series',
			label: 'Series',
			from: 2,
			to: 3,
			chars: DIGITS,
			reads: { by: 'table', table: 'series' }
		},
		{
			name: 'body_style',
			label: 'Body style',
			from: 4,
			to: 5,
			chars: DIGITS,
			reads: { by: 'table', table: 'body_style' }
		},
		{
			name: 'assembly_plant',
			label: 'Assembly plant',
			from: 6,
			to: 6,
			chars: LETTERS,
			reads: { by: 'table', table: 'assembly_plant' }
		},
		{
			name: 'sequence_number',
			label: 'Sequence number',
			from: 7,
			to: 12,
			chars: DIGITS,
			reads: { by: 'sequence' }
		}
	],
	derived: [
		{ name: 'line', label: 'Line', parents: ['series'], reads: { by: 'value', key: 'line' } },
		{
			name: 'cylinder_group',
			label: 'Cylinders',
			parents: ['series'],
			reads: { by: 'value', key: 'cylinders' }
		}
	],
	yearsOf: yearsByCharacter(1, { '4': [1964] }),
	examples: { good: '45837K1xxxxx', bad: '458371xxxxxx' }
};
