/** Paint chips by make and model year. */
import { counted } from './counts';

export const paintText = {
	title: 'Paint codes',
	intro: 'The codes of a make and model year as they stand on body tags, with the names they had.',
	caution:
		'A chip follows the color word in the name. It is a screen approximation and no match: compare paint with paint, under daylight, never with a screen.',
	codeOnly:
		'A code says what the body was ordered in. It does not say what the car wears now, nor that the tag belongs to it.',
	division: 'Make',
	year: 'Model year',
	choose: 'Choose a make',
	anyYear: 'all years',
	show: 'Show',
	heading: (division: string, year: number): string => `${division}, ${year}`,
	count: (codes: number): string => counted(codes, 'code', 'codes'),
	nothing: (division: string, year: number): string =>
		`No paint code of ${division} for ${year} is in the tables. That says nothing against a car.`,
	noMake: (name: string): string =>
		`No paint code of ${name} is in the tables. That says nothing against a car.`,
	near: 'Years that have some',
	allYears: 'Makes and years with paint codes',
	cell: (year: number, codes: number): string => `${year}: ${counted(codes, 'code', 'codes')}`,
	asTable: 'The same as a table, with sources',
	chip: {
		by: (name: string): string => `Screen approximation by the name ${name}`,
		none: 'No color word in the name, so no chip'
	},
	names: (names: number): string => `${counted(names, 'name', 'names')} for one code`,
	source: (number: number): string => `Source ${number}`,
	sources: 'Sources of these rows',
	open: 'Row'
} as const;
