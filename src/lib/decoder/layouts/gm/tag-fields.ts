/** The fields that the body tags of Fisher Body share; their order and their forms differ by year and plant. */
import type { LineField, LineForm, Places } from '../../engine/lined-layout';
import { ANY, DIGITS, LETTERS } from './signs';

/** The same place twice: a color is listed as NN, and stands as one N before or after another code. */
export const twice = (place: number): readonly Places[] => [
	[place, place],
	[place, place]
];

/** Month and week, as 04C. */
export const timeBuilt: LineField = {
	name: 'build_date',
	label: 'Time built',
	shape: { chars: ['01', DIGITS, 'ABCDE'], whole: true },
	reads: { by: 'date', format: 'gm-body-month-week' }
};

/** Option codes, as X33 and WS4. What else stands there is the plant's own, and is left as it is. */
export const options: LineField = {
	name: 'option',
	label: 'Option',
	optional: true,
	repeats: true,
	shape: { chars: [LETTERS, ANY, DIGITS], whole: true },
	reads: { by: 'table', table: 'option' }
};

/** Groups of options to 1967, as 4L and 2LGSR: a figure for the group, letters for what it holds. They differ by plant. */
const groups: LineField = {
	name: 'option',
	label: 'Option group',
	optional: true,
	repeats: true,
	shape: { chars: ['12345', LETTERS, LETTERS, LETTERS, LETTERS, LETTERS], fewest: 2, whole: true },
	reads: { by: 'table', table: 'option' }
};

/** Numbers by which some plants tracked orders and bodies. */
const tracking: LineField = {
	name: 'unknown',
	label: 'Number of the plant’s own',
	optional: true,
	repeats: true,
	shape: { chars: DIGITS, length: [4, 6], whole: true },
	reads: { by: 'unknown' }
};

/** The model year in two figures. */
export function year(from: number, to: number): LineField {
	const years = Array.from({ length: to - from + 1 }, (_, index) => from + index);
	const places = [2, 3].map((place) => [...new Set(years.map((own) => String(own).charAt(place)))]);
	return {
		name: 'model_year',
		label: 'Model year',
		words: ['STYLE', 'ST'],
		shape: { chars: places.map((characters) => characters.join('')) },
		reads: { by: 'year', years: Object.fromEntries(years.map((own) => [String(own % 100), [own]])) }
	};
}

const SERIES = { figures: DIGITS, letters: LETTERS, either: ANY } as const;

/**
 * The style number: division, series, body; from 1973 two letters, for the type of body and the series, in place of the
 * two figures of the series. The series is that of the body and not of the serial number: its last figure does not tell
 * six from eight cylinders, as it does there. `first` and `second` narrow what may stand for the series.
 */
export const style = (
	series: keyof typeof SERIES,
	first: string = SERIES[series],
	second: string = SERIES[series]
): readonly LineField[] => [
	{
		name: 'division',
		label: 'Division',
		shape: { chars: ['123467'] },
		reads: { by: 'table', table: 'division' }
	},
	{
		name: 'line',
		label: 'Series',
		shape: { chars: [first, second] },
		reads: { by: 'table', table: 'style_number' }
	},
	{
		name: 'body_style',
		label: 'Body style',
		shape: { chars: [DIGITS, DIGITS] },
		reads: { by: 'table', table: 'body_style' }
	}
];

/** The plant, by its name cut short or by its letter, and the number that Fisher Body gave the body there. */
export const plantAndNumber: readonly LineField[] = [
	{
		name: 'assembly_plant',
		label: 'Plant',
		shape: { chars: LETTERS, length: [1, 3] },
		reads: { by: 'table', table: 'plant_abbreviation' }
	},
	{
		name: 'body_number',
		label: 'Body number',
		wordsAfter: ['BODY', 'BDY'],
		shape: { chars: [ANY, ANY, ANY, ANY, DIGITS, DIGITS, DIGITS], fewest: 1 },
		reads: { by: 'number' }
	}
];

/** The trim code; on some tags letters follow behind a dash. */
export const trim: LineField = {
	name: 'trim',
	label: 'Trim',
	words: ['TRIM', 'TR'],
	shape: { chars: ANY, length: [2, 5] },
	reads: { by: 'table', table: 'trim', otherwise: [[[1, 3]]] }
};

/** Two letters to 1968: lower and upper body, the same twice for one color, a figure in the second place for a top. */
export const paintInLetters: LineField = {
	name: 'paint',
	label: 'Paint',
	wordsAfter: ['PAINT', 'PNT'],
	shape: { chars: [LETTERS, ANY] },
	reads: {
		by: 'table',
		table: 'paint',
		otherwise: [twice(1)],
		also: [
			{ name: 'roof', label: 'Top', by: 'table', table: 'roof', parts: [[2, 2]] },
			{ name: 'paint_upper', label: 'Upper body', by: 'table', table: 'paint', parts: twice(2) }
		]
	}
};

/** Two figures from 1969, for the lower body; then two for the upper body, or a letter for a vinyl or cloth top. */
export const paintInFigures: readonly LineField[] = [
	{
		name: 'paint',
		label: 'Lower body',
		wordsAfter: ['PAINT', 'PNT'],
		shape: { chars: [DIGITS, DIGITS] },
		reads: { by: 'table', table: 'paint' }
	},
	{
		name: 'paint_upper',
		label: 'Upper body',
		optional: true,
		wordsAfter: ['PAINT', 'PNT'],
		shape: { chars: [DIGITS, DIGITS] },
		reads: { by: 'table', table: 'paint' }
	},
	{
		name: 'roof',
		label: 'Top',
		optional: true,
		wordsAfter: ['PAINT', 'PNT'],
		shape: { chars: LETTERS, length: 1, whole: true },
		reads: { by: 'table', table: 'roof', otherwise: [twice(1)] }
	}
];

/** A seat's option code, which some tags carry on the trim line. */
export const seat: LineField = {
	name: 'option',
	label: 'Seat',
	optional: true,
	shape: { chars: [LETTERS, DIGITS, DIGITS], whole: true },
	reads: { by: 'table', table: 'option' }
};

export const timeLine: LineForm = { label: 'Time built', fields: [timeBuilt, tracking, options] };
export const groupLine: LineForm = {
	label: 'Option groups',
	optional: true,
	fields: [tracking, groups]
};
export const optionLine: LineForm = { label: 'Options', optional: true, fields: [options] };

/** What all of these tags share. */
export const TAG = {
	kind: 'body_tag',
	maker: 'gm',
	order: 'down',
	divisionFrom: 'division',
	lookFirst: ['division', 'line', 'body_style', 'assembly_plant']
} as const;
