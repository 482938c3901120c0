/**
 * American Motors, model years 1968 to 1979: thirteen characters that begin with A.
 * Issued at Kenosha and Brampton in the order of the purchase orders, over all car lines; on the instrument panel, seen
 * through the windshield.
 * Source for 1974 to 1979: the page "Vehicle identification: AMC and Eagle" of a repair data manual; row `amc-1974-1979` of
 * table `layout` cites it. For 1968 to 1973 the same places are from memory, with the length of 1973 published: row
 * `amc-1968-1973`. The form of 1966 and 1967 is not known to us and is refused. The year figure repeats after ten years.
 */
import { DIGITS, LETTERS } from '../engine/characters';
import {
	lastDigits,
	yearsByCharacter,
	type DerivedField,
	type Layout,
	type PrimaryField
} from '../engine/layout';

/** The places of every number of 1968 to 1980; only the year's characters and two words differ. */
export const amcFields = (words: {
	readonly years: string;
	readonly body: string;
	readonly series: string;
}): readonly PrimaryField[] => [
	{
		name: 'division',
		label: 'Maker',
		from: 1,
		to: 1,
		chars: 'A',
		reads: { by: 'table', table: 'division' }
	},
	{
		name: 'model_year',
		label: 'Model year',
		from: 2,
		to: 2,
		chars: words.years,
		reads: { by: 'year' }
	},
	{
		name: 'transmission',
		label: 'Transmission',
		from: 3,
		to: 3,
		chars: LETTERS,
		reads: { by: 'table', table: 'serial_transmission' }
	},
	{
		name: 'line',
		label: 'Car line',
		from: 4,
		to: 4,
		chars: DIGITS,
		reads: { by: 'table', table: 'line' }
	},
	{
		name: 'body_style',
		label: words.body,
		from: 5,
		to: 5,
		chars: DIGITS,
		reads: { by: 'table', table: 'body_style' }
	},
	{
		name: 'series',
		label: words.series,
		from: 6,
		to: 6,
		chars: DIGITS,
		reads: { by: 'table', table: 'series' }
	},
	{
		name: 'engine',
		label: 'Engine',
		from: 7,
		to: 7,
		chars: LETTERS,
		reads: { by: 'table', table: 'engine' }
	},
	{
		name: 'sequence_number',
		label: 'Sequence number',
		from: 8,
		to: 13,
		chars: DIGITS,
		reads: { by: 'sequence' }
	}
];

export const amcCommon = {
	kind: 'serial',
	maker: 'amc',
	length: 13,
	divisionFrom: 'division',
	lineFrom: 'line',
	lookFirst: ['line'],
	derived: [] as readonly DerivedField[]
} as const satisfies Partial<Layout>;

const fields = amcFields({ years: DIGITS, body: 'Body type', series: 'Series' });

export const amc1968: Layout = {
	...amcCommon,
	id: 'amc-1968-1973',
	title: 'American Motors, 13 characters, 1968–73',
	years: [1968, 1973],
	source: 'From memory; the length of 1973: javelinamx.com, Wynn’s Maxi-Blue ’73 AMC Hornet X',
	fields,
	yearsOf: yearsByCharacter(2, lastDigits(1968, 1973)),
	examples: { good: 'A8M397Xxxxxxx', bad: '8AM397Xxxxxxx' }
};

export const amc1974: Layout = {
	...amcCommon,
	id: 'amc-1974-1979',
	title: 'American Motors, 13 characters, 1974–79',
	years: [1974, 1979],
	source: 'Vehicle identification: AMC and Eagle, section of a repair data manual',
	fields,
	yearsOf: yearsByCharacter(2, lastDigits(1974, 1979)),
	examples: { good: 'A9S055A100001', bad: 'A9S0S5A100001' }
};
