/** What a page of tables was asked to show. */
import { divisionNamed, makerNamed } from '$lib/server/readings';
import type { RowFilters } from '$lib/server/reference';
import { tablesText as text } from '$lib/text/en/tables';
import {
	FIRST_YEAR,
	LAST_YEAR,
	MAKER_NAMES,
	MAKERS,
	STRENGTHS,
	TABLE_NAMES,
	type Maker
} from '$lib/types';

/** As it was typed and chosen: goes back into the form. Empty where nothing was. */
export interface AskedFilters {
	readonly q: string;
	readonly table: string;
	readonly division: string;
	readonly year: string;
	readonly strength: string;
}
export interface FilterFault {
	readonly field: keyof AskedFilters;
	readonly message: string;
}
export interface ReadFilters {
	readonly asked: AskedFilters;
	/** What of it can be heeded. */
	readonly filters: RowFilters;
	readonly query: string;
	readonly faults: readonly FilterFault[];
}

/** Longest search, in characters. */
const LONGEST_SEARCH = 100;

type Make = { readonly maker: Maker; readonly division?: string };

/** A make by its name, or a corporation by its full one. A name that is both means the make. */
function makeNamed(name: string): Make | null {
	const whole = MAKERS.find((maker) => MAKER_NAMES[maker].toLowerCase() === name.toLowerCase());
	return whole ? { maker: whole } : (divisionNamed(name) ?? makerNamed(name));
}

/** Reads the parameters of a page; forgiving about case and space, and about what it does not know. */
export function readFilters(parameters: URLSearchParams): ReadFilters {
	const given = (name: string): string => parameters.get(name)?.trim() ?? '';
	const faults: FilterFault[] = [];
	const asked = {
		q: given('q'),
		table: given('table').toLowerCase().replaceAll('-', '_'),
		division: given('division') || given('maker'),
		year: given('year'),
		strength: given('strength').toLowerCase().replaceAll(' ', '_')
	};
	const refuse = (field: keyof AskedFilters, message: string) => faults.push({ field, message });

	const table = TABLE_NAMES.find((name) => name === asked.table);
	if (asked.table && !table) refuse('table', text.faults.table(asked.table));
	// As in the interface: `maker` takes either, and a name that is both means the corporation there.
	const make = (given('division') ? makeNamed : makerNamed)(asked.division);
	if (asked.division && !make) refuse('division', text.faults.division(asked.division));
	const number = Number(asked.year);
	const isYear = Number.isInteger(number) && number >= FIRST_YEAR && number <= LAST_YEAR;
	if (asked.year && !isYear) refuse('year', text.faults.year(FIRST_YEAR, LAST_YEAR));
	const strength = STRENGTHS.find((name) => name === asked.strength);
	if (asked.strength && !strength) refuse('strength', text.faults.strength(asked.strength));
	const isLong = [...asked.q].length > LONGEST_SEARCH;
	if (isLong) refuse('q', text.faults.search(LONGEST_SEARCH));
	return {
		asked: {
			...asked,
			division: make ? (make.division ?? MAKER_NAMES[make.maker]) : asked.division
		},
		filters: {
			...make,
			...(table && { table }),
			...(isYear && { year: number }),
			...(strength && { strength })
		},
		query: isLong ? '' : asked.q,
		faults
	};
}
