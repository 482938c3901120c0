/**
 * The body tag of Fisher Body, 1964 to 1968, to 1967 upright on the firewall: the time built; year and style number, plant
 * and body number; trim and paint; option groups, as letters and figures that differ by plant. The style number of 1964
 * has four figures, without one for the division; paint has figures or one letter then, a pair of letters from 1965.
 * Rows of table `layout` cite what the two forms rest on.
 */
import type { LinedLayout } from '../../engine/lined-layout';
import { ANY } from './signs';
import {
	TAG,
	groupLine,
	options,
	paintInLetters,
	plantAndNumber,
	style,
	timeLine,
	trim,
	year
} from './tag-fields';

export const gmFisherTag1964: LinedLayout = {
	...TAG,
	id: 'gm-fisher-tag-1964',
	title: 'Fisher body tag, General Motors, 1964',
	years: [1964, 1964],
	source: 'From memory',
	lines: [
		timeLine,
		{
			label: 'Style line',
			fields: [year(1964, 1964), ...style('figures').slice(1), ...plantAndNumber]
		},
		{
			label: 'Trim and paint',
			fields: [
				trim,
				{
					name: 'paint',
					label: 'Paint',
					wordsAfter: ['PAINT', 'PNT'],
					shape: { chars: ANY, length: [1, 3] },
					reads: { by: 'table', table: 'paint', otherwise: [[[1, 1]]] }
				}
			]
		},
		groupLine
	],
	examples: {
		good: '03B / ST 64 2237 PON 1234 BODY / TR 214 R PAINT',
		bad: 'ST 64 2237 PON 1234 BODY / 03B'
	}
};

export const gmFisherTag1965: LinedLayout = {
	...TAG,
	id: 'gm-fisher-tag-1965-1968',
	title: 'Fisher body tag, General Motors, 1965–68',
	years: [1965, 1968],
	source: 'Fisher Body plates: Kansas City (macswebs.com), for the Chevelle of 1966 and 1967',
	lines: [
		timeLine,
		{ label: 'Style line', fields: [year(1965, 1968), ...style('figures'), ...plantAndNumber] },
		{ label: 'Trim and paint', fields: [trim, options, paintInLetters] },
		groupLine
	],
	examples: {
		good: '09D 1234 / ST 66-13667 KAN 233 BODY / TR 763-B C-2 PAINT',
		bad: '09D / TR 763-B C-2 PAINT'
	}
};
