/** Names of the typed facts of rows, with their units written out. */
import type { Facts } from '../../types';
import { grouped } from './counts';

const MONTHS = [
	'January',
	'February',
	'March',
	'April',
	'May',
	'June',
	'July',
	'August',
	'September',
	'October',
	'November',
	'December'
];

type Words = { readonly [Name in keyof Facts]-?: readonly [label: string, unit: string] };

/** `#` stands where the value goes. */
export const valueWords: Words = {
	division: ['Make', '#'],
	line: ['Line', '#'],
	series: ['Series', '#'],
	body_style: ['Body style', '#'],
	model_year: ['Model year', '#'],
	displacement_cuin: ['Displacement', '# cubic inches'],
	displacement_l: ['Displacement', '# liters'],
	horsepower_gross: ['Power', '# horsepower, gross'],
	horsepower_net: ['Power', '# horsepower, net'],
	compression_ratio: ['Compression', '# to 1'],
	bore_in: ['Bore', '# inches'],
	stroke_in: ['Stroke', '# inches'],
	carburetor_barrels: ['Carburetor barrels', '#'],
	carburetors: ['Carburetors', '#'],
	cylinders: ['Cylinders', '#'],
	doors: ['Doors', '#'],
	plant_city: ['Plant', '#'],
	plant_region: ['State or province', '#'],
	plant_code: ['The plant’s other code', '#'],
	country: ['Country', '#'],
	maker_name: ['Maker', '#'],
	hex_approximate: ['Color', '#'],
	first_sequence: ['First sequence number', '#'],
	last_sequence: ['Last sequence number', '#'],
	ratio: ['Ratio', '# to 1'],
	locking: ['Differential', '#'],
	transmission: ['Transmission', '#'],
	speeds: ['Speeds', '#'],
	month: ['Month', '#'],
	units_built: ['Built', '# cars'],
	part: ['Part', '#']
};

/** Facts of items, packages, rules, constraints, lead times and plant years. */
export const otherValueWords: Readonly<Record<string, string>> = {
	place: 'Where it sits',
	added_later: 'Added later',
	look_for: 'Look for',
	requires: 'Requires',
	brings: 'Brings',
	excludes: 'Excludes',
	when: 'When',
	then: 'Then',
	left: 'This',
	right: 'stands beside',
	against: 'Held against',
	days_min: 'Days, least',
	days_max: 'Days, most'
};

export const valueText = {
	locking: (locks: boolean): string => (locks ? 'locking or limited slip' : 'conventional'),
	month: (n: number): string => MONTHS[n - 1] ?? String(n),
	built: (n: number): string => grouped(n),
	anyOf: (attribute: string, values: readonly string[]): string =>
		`${attribute} is ${values.join(' or ')}`,
	noneOf: (attribute: string, values: readonly string[]): string =>
		`${attribute} is not ${values.join(' or ')}`,
	is: (attribute: string): string => `${attribute} is told`,
	addedLater: {
		bolted: 'bolted on: easily added',
		trimmed: 'fitted under trim: with some work',
		structural: 'part of the structure: hardly'
	} as Readonly<Record<string, string>>
} as const;
