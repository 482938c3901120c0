/**
 * General Motors, model years 1972 to 1980: thirteen characters, with a series letter and an engine character.
 * Issued by each division; on the dash top, seen through the windshield.
 * Source: row `gm-1972-1980` of table `layout` cites it. 1980 carries the letter A for the year.
 */
import { ANY, DIGITS, LETTERS } from '../engine/characters';
import { lastDigits, yearsByCharacter, type Layout } from '../engine/layout';

export const gm1972: Layout = {
	id: 'gm-1972-1980',
	kind: 'serial',
	maker: 'gm',
	title: 'General Motors, 13 characters, 1972–80',
	years: [1972, 1980],
	length: 13,
	source: 'Published serial explanations of the divisions, 1972 to 1980',
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
			to: 2,
			chars: LETTERS,
			reads: { by: 'table', table: 'series' }
		},
		{
			name: 'body_style',
			label: 'Body style',
			from: 3,
			to: 4,
			chars: DIGITS,
			reads: { by: 'table', table: 'body_style' }
		},
		{
			name: 'engine',
			label: 'Engine',
			from: 5,
			to: 5,
			chars: ANY,
			reads: { by: 'table', table: 'engine' }
		},
		{
			name: 'model_year',
			label: 'Model year',
			from: 6,
			to: 6,
			chars: '23456789A',
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
		{ name: 'line', label: 'Line', parents: ['series'], reads: { by: 'value', key: 'line' } }
	],
	yearsOf: yearsByCharacter(6, { ...lastDigits(1972, 1979), A: [1980] }),
	examples: { good: '2W87W6N5xxxxx', bad: '2W87W6N5xxxx' }
};
