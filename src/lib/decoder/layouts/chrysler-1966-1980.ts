/**
 * Chrysler Corporation, model years 1966 to 1980: thirteen characters.
 * Plymouth, Dodge, Chrysler and Imperial; on the hinge pillar through 1967, on the dash from 1968.
 * Source: 440 Magnum Network, "1968 13-digit serial number breakdown"; row `chrysler-1966-1980` of table `layout`
 * cites all. The year figure repeats after ten years; line, body and engine tell the decade where rows do.
 * 1980 has a letter A by memory and a figure in one list: both are taken.
 */
import { ANY, DIGITS, LETTERS } from '../engine/characters';
import { lastDigits, yearsByCharacter, type Layout } from '../engine/layout';

export const chrysler1966: Layout = {
	id: 'chrysler-1966-1980',
	kind: 'serial',
	maker: 'chrysler',
	title: 'Chrysler Corporation, 13 characters, 1966–80',
	years: [1966, 1980],
	length: 13,
	source: '440 Magnum Network, 1968 13-digit serial number breakdown',
	divisionFrom: 'line',
	lineFrom: 'line',
	fields: [
		{
			name: 'line',
			label: 'Car line',
			from: 1,
			to: 1,
			chars: LETTERS,
			reads: { by: 'table', table: 'line' }
		},
		{
			name: 'price_class',
			label: 'Price class',
			from: 2,
			to: 2,
			chars: LETTERS,
			reads: { by: 'table', table: 'price_class' }
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
			chars: LETTERS,
			reads: { by: 'table', table: 'engine' }
		},
		{
			name: 'model_year',
			label: 'Model year',
			from: 6,
			to: 6,
			chars: `${DIGITS}A`,
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
		{
			name: 'series',
			label: 'Series',
			parents: ['line', 'price_class'],
			reads: { by: 'table', table: 'series', parts: [[1, 2]] }
		}
	],
	yearsOf: yearsByCharacter(6, { ...lastDigits(1966, 1980), A: [1980] }),
	examples: { good: 'RM23N0Gxxxxxx', bad: 'RMZ3N0Gxxxxxx' }
};
