/**
 * A Ford number of prefix, basic number and suffix, as cast into a part or printed on its box, and a casting date beside
 * it. The prefix gives the year of design, the line and, in its fourth place, the engineering group of an engineering
 * number (A, B, E) or the division of a service number (Z, Y, X, M): which of the two it is follows from that letter.
 * Source: SBFTech Forum, "How to read Ford casting numbers"; row `ford-part-number` of table `layout` cites all.
 */
import type { LineField, LinedLayout } from '../../engine/lined-layout';
import { DIGITS, LETTERS, MONTHS } from './signs';

const DECADES = 'BCDE';

const cast: LineField = {
	name: 'casting_date',
	label: 'Cast',
	optional: true,
	shape: { chars: DIGITS + MONTHS, length: [3, 4] },
	reads: { by: 'date', format: 'ford-casting' }
};

export const fordPartNumber: LinedLayout = {
	id: 'ford-part-number',
	kind: 'casting',
	maker: 'ford',
	title: 'Ford part number, engineering or service, with a casting date',
	years: [1955, 1980],
	source: 'How to read Ford casting numbers (SBFTech Forum)',
	order: 'down',
	lines: [
		{
			label: 'Number and date',
			fields: [
				{
					name: 'model_year',
					label: 'Year of design',
					shape: { chars: [DECADES, DIGITS] },
					reads: { by: 'date', format: 'ford-part-year' }
				},
				{
					name: 'unit_code',
					label: 'Line and group',
					shape: { chars: [LETTERS, LETTERS] },
					reads: {
						by: 'table',
						table: 'part_number',
						parts: [
							[1, 1],
							[2, 2]
						]
					}
				},
				{
					name: 'casting_number',
					label: 'Basic number',
					shape: { chars: DIGITS, length: [4, 5] },
					reads: { by: 'table', table: 'part_number' }
				},
				{
					name: 'option',
					label: 'Suffix',
					optional: true,
					shape: { chars: LETTERS, length: [1, 2] },
					reads: { by: 'number' }
				},
				cast
			]
		}
	],
	examples: { good: 'C5AE-6015-A', bad: 'C5A' }
};

/** The short form, without the basic number: what the part is follows from the whole. */
export const fordCastingNumber: LinedLayout = {
	id: 'ford-casting-number',
	kind: 'casting',
	maker: 'ford',
	title: 'Ford casting number without basic number, with a casting date',
	years: [1955, 1980],
	source: '428CobraJet.org and Ford Classics for the date; the numbers as their rows say',
	order: 'down',
	lines: [
		{
			label: 'Number and date',
			fields: [
				{
					name: 'casting_number',
					label: 'Casting number',
					shape: { chars: [DECADES, DIGITS, LETTERS, LETTERS] },
					reads: { by: 'table', table: 'casting_number' }
				},
				cast
			]
		}
	],
	examples: { good: 'C9OE', bad: 'C9' }
};
