/** Whether the facts of two rows can be of one car. */
import type { Facts, RowValues, TallyAttribute } from '../../types';
import { all, type Truth } from './three-valued';

/** What two facts are compared with: the edition's words for lines, and pairs that can stand beside each other. */
export interface Company {
	/** Whether a line's name is one that serials of this edition use: other words for a line tell nothing. */
	readonly isLine: (name: string) => boolean;
	/** Keys of rows that let two values of a fact stand beside each other; empty when none does. */
	readonly beside: (fact: string, left: string, right: string) => readonly string[];
}

/** The facts that tell an attribute, in the order in which a side is described. */
export const FACTS_OF = {
	division: ['division'],
	/** `unit_year` is the model year that a part was made for. */
	model_year: ['model_year', 'unit_year'],
	line: ['line'],
	series: ['series'],
	body_style: ['doors', 'body_style'],
	assembly_plant: ['plant_code', 'plant_city'],
	engine: [
		'displacement_cuin',
		'cylinders',
		'carburetor_barrels',
		'carburetors',
		'horsepower_gross',
		'horsepower_net'
	],
	transmission: ['transmission', 'speeds'],
	axle: ['ratio', 'locking']
} as const satisfies Partial<Record<TallyAttribute, readonly (keyof Facts | 'unit_year')[]>>;
/** Attributes that are told by facts of rows; the others are the characters themselves, or dates. */
export type FactAttribute = keyof typeof FACTS_OF;

/** Equal, different, or null where a side does not say. */
function equal(left: RowValues, right: RowValues, key: string): Truth {
	const [a, b] = [left[key], right[key]];
	if (a === undefined || b === undefined) return null;
	return String(a).toLowerCase() === String(b).toLowerCase();
}

/** True when something agrees and nothing differs, false when something differs, null when nothing can be compared. */
function told(truths: readonly Truth[]): Truth {
	const said = truths.filter((truth) => truth !== null);
	return said.length === 0 ? null : all(said);
}

/** Words for one thing differ between works: equal words agree, different words tell nothing. */
const byWord = (left: RowValues, right: RowValues, key: string): Truth =>
	equal(left, right, key) === true ? true : null;

/** Barrels count by carburetor, and one carburetor is not written. */
function carburetors(left: RowValues, right: RowValues): Truth {
	const barrels = equal(left, right, 'carburetor_barrels');
	if (barrels !== true) return barrels;
	return (left.carburetors ?? 1) === (right.carburetors ?? 1);
}

function engines(left: RowValues, right: RowValues, company: Company): Truth {
	const [a, b] = [String(left.displacement_cuin), String(right.displacement_cuin)];
	const size = equal(left, right, 'displacement_cuin');
	const beside = size === false && company.beside('displacement_cuin', a, b).length > 0;
	const hard = told([
		beside ? true : size,
		equal(left, right, 'cylinders'),
		carburetors(left, right)
	]);
	if (hard !== true) return hard;
	// Works rate one engine differently: another figure of power alone tells nothing.
	return equal(left, right, 'horsepower_gross') === false ||
		equal(left, right, 'horsepower_net') === false
		? null
		: true;
}

function lines(left: RowValues, right: RowValues, company: Company): Truth {
	const same = equal(left, right, 'line');
	if (same !== false) return same;
	return company.isLine(String(left.line)) && company.isLine(String(right.line)) ? false : null;
}

/** Cars of GM of Canada carry the names of other divisions. */
function divisions(left: RowValues, right: RowValues): Truth {
	const same = equal(left, right, 'division');
	return same === false && [left.division, right.division].includes('GM of Canada') ? null : same;
}

/** One city can have several plants, and one plant several codes over the years. */
function plants(left: RowValues, right: RowValues): Truth {
	const code = equal(left, right, 'plant_code');
	const city = equal(left, right, 'plant_city');
	if (city === false) return false;
	if (code === true) return true;
	return code === false && city === true ? null : city;
}

/** A part for a later year cannot be the car's first; one for an earlier year may have lain in store. */
function years(left: RowValues, right: RowValues): Truth {
	const cars = equal(left, right, 'model_year');
	if (cars !== null) return cars;
	if (equal(left, right, 'unit_year') !== null) return byWord(left, right, 'unit_year');
	const car = left.model_year ?? right.model_year;
	const part = left.model_year === undefined ? left.unit_year : right.unit_year;
	if (car === undefined || part === undefined || Number(part) < Number(car)) return null;
	return part === car;
}

const NAMED = ['powerglide', 'turbo hydra-matic 350', 'turbo hydra-matic 400', 'muncie', 'saginaw'];
const AUTOMATIC = /automatic|powerglide|hydra-matic|torqueflite|cruise-o-matic/;
const MANUAL = /manual|muncie|saginaw|toploader/;

function family(words: string): 'automatic' | 'manual' | null {
	if (AUTOMATIC.test(words)) return 'automatic';
	return MANUAL.test(words) ? 'manual' : null;
}

function gearboxes(left: RowValues, right: RowValues): Truth {
	const speeds = equal(left, right, 'speeds');
	if (left.transmission === undefined || right.transmission === undefined) return speeds;
	const [a, b] = [
		String(left.transmission).toLowerCase(),
		String(right.transmission).toLowerCase()
	];
	const [one, two] = [family(a), family(b)];
	const named = NAMED.find((name) => a.includes(name));
	const other = NAMED.find((name) => b.includes(name));
	return told([
		one === null || two === null ? null : one === two,
		named === undefined || other === undefined ? null : named === other,
		speeds
	]);
}

/**
 * Whether two sides can be of one car: true when they agree, false when they cannot, null when it cannot be told.
 * Symmetric. Another wording of body or series never makes two cars of one.
 */
export function agree(
	attribute: TallyAttribute,
	left: RowValues,
	right: RowValues,
	company: Company
): Truth {
	switch (attribute) {
		case 'engine':
			return engines(left, right, company);
		case 'line':
			return lines(left, right, company);
		case 'division':
			return divisions(left, right);
		case 'assembly_plant':
			return plants(left, right);
		case 'transmission':
			return gearboxes(left, right);
		case 'model_year':
			return years(left, right);
		case 'series':
			return byWord(left, right, 'series');
		case 'body_style':
			return equal(left, right, 'doors') ?? byWord(left, right, 'body_style');
		case 'axle':
			return told([equal(left, right, 'ratio'), equal(left, right, 'locking')]);
		default:
			return equal(left, right, attribute);
	}
}
