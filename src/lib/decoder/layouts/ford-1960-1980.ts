/**
 * Ford Motor Company, model years 1960 to 1980: eleven characters.
 * Ford, Mercury and Lincoln; on a plate at the door, from 1968 also on a tab seen through the windshield.
 * Source: Automotive Mileposts, "1960-1980 Ford, Lincoln and Mercury VIN explanation"; row `ford-1960-1980` of table
 * `layout` cites all. The body serial names division, line and body; the year figure repeats after ten years.
 * The form of 1955 to 1959 has ten characters in another order and is refused.
 */
import { decoderText as text } from '../../text/en/decoder';
import { ANY, DIGITS, LETTERS } from '../engine/characters';
import { lastDigits, yearsByCharacter, type Layout } from '../engine/layout';

export const ford1960: Layout = {
	id: 'ford-1960-1980',
	kind: 'serial',
	maker: 'ford',
	title: 'Ford Motor Company, 11 characters, 1960–80',
	years: [1960, 1980],
	length: 11,
	source: 'Automotive Mileposts, 1960-1980 Ford, Lincoln and Mercury VIN explanation',
	divisionFrom: 'series',
	lineFrom: 'series',
	lookFirst: ['series'],
	divisionInferred: true,
	gap: text.gaps.ford,
	fields: [
		{
			name: 'model_year',
			label: 'Model year',
			from: 1,
			to: 1,
			chars: DIGITS,
			reads: { by: 'year' }
		},
		{
			name: 'assembly_plant',
			label: 'Assembly plant',
			from: 2,
			to: 2,
			chars: LETTERS,
			reads: { by: 'table', table: 'assembly_plant' }
		},
		{
			name: 'series',
			label: 'Body serial',
			from: 3,
			to: 4,
			chars: DIGITS,
			reads: { by: 'table', table: 'body_serial' }
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
			name: 'sequence_number',
			label: 'Unit number',
			from: 6,
			to: 11,
			chars: DIGITS,
			reads: { by: 'sequence' }
		}
	],
	derived: [
		{ name: 'line', label: 'Line', parents: ['series'], reads: { by: 'value', key: 'line' } },
		{
			name: 'body_style',
			label: 'Body style',
			parents: ['series'],
			reads: { by: 'value', key: 'body_style' }
		}
	],
	yearsOf: yearsByCharacter(1, lastDigits(1960, 1980)),
	examples: { good: '7F91S5xxxxx', bad: '7F9IS5xxxxx' }
};
