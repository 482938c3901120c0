/**
 * General Motors, model years 1965 to 1971: thirteen characters.
 * Issued by each division; riveted to the door pillar or hinge pillar through 1967, to the dash top from 1968.
 * Source: Camaro Research Group, "VIN, Cowl Tag and other Numbers"; row `gm-1965-1971` of table `layout` cites all.
 * The second place is a figure here and a letter from 1972: that tells the two forms apart.
 * The forms of 1964 are others, one a division: Chevrolet’s is read, those of the other divisions are refused.
 */
import { ANY, DIGITS } from '../engine/characters';
import { lastDigits, yearsByCharacter, type Layout } from '../engine/layout';

export const gm1965: Layout = {
	id: 'gm-1965-1971',
	kind: 'serial',
	maker: 'gm',
	title: 'General Motors, 13 characters, 1965–71',
	years: [1965, 1971],
	length: 13,
	source: 'Camaro Research Group, VIN, Cowl Tag and other Numbers',
	divisionFrom: 'division',
	lineFrom: 'series',
	fields: [
		{
			name: 'division',
			label: 'Division',
			from: 1,
			to: 1,
			chars: '12345679',
			reads: { by: 'table', table: 'division' }
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
			name: 'model_year',
			label: 'Model year',
			from: 6,
			to: 6,
			chars: '5678901',
			reads: { by: 'year' }
		},
		{
			name: 'assembly_plant',
			label: 'Assembly plant',
			from: 7,
			to: 7,
			chars: ANY,
			reads: { by: 'table', table: 'assembly_plant' }
		},
		{
			name: 'sequence_number',
			label: 'Sequence number',
			from: 8,
			to: 13,
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
		},
		{
			name: 'cylinder_group',
			label: 'Cylinders',
			parents: ['sequence_number'],
			reads: { by: 'table', table: 'cylinder_group', parts: [[8, 8]] }
		}
	],
	yearsOf: yearsByCharacter(6, lastDigits(1965, 1971)),
	examples: { good: '124379N6xxxxx', bad: '12437ON6xxxxx' }
};
