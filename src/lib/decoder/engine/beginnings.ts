/**
 * Numbers that differ in nothing but the running number and the check digit say the same with all their other
 * places. What those say is worked out once and kept, for so many beginnings of an edition.
 */
import { FIRST_YEAR } from '../../types';
import type { FieldResult } from './field';
import type { Scope } from './look-up';
import type { PreparedLayout } from './plan';
import type { TableSet } from './table-set';

/** The settled part of a reading under one division. */
export interface Settled {
	/** All that its fields tell of the car. */
	readonly scope: Scope;
	/** For each primary field, its result and those derived from it; null where it turns on the rest of the number. */
	readonly results: readonly (readonly FieldResult[] | null)[];
}

export interface Beginning {
	/** The divisions that rows name. */
	readonly named: readonly string[];
	/** By division; the empty text is "none known". */
	readonly settled: Map<string, Settled>;
}

const MOST_KEPT = 4096;
/** By layout, then by the characters that settle a number, then by model year (0: open). */
type Kept = Map<PreparedLayout, Map<string, Beginning[]>>;
const kept = new WeakMap<TableSet, Kept>();

/** The characters in the places that settle a number. */
function settling(prepared: PreparedLayout, whole: string): string {
	let characters = '';
	for (const [from, to] of prepared.settling) characters += whole.slice(from - 1, to);
	return characters;
}

/** The beginning of a number that is read whole, made by `make` the first time; the oldest goes when there are too many. */
export function beginningOf(
	tables: TableSet,
	prepared: PreparedLayout,
	whole: string,
	year: number | null,
	make: () => Beginning
): Beginning {
	let layouts = kept.get(tables);
	if (layouts === undefined) {
		layouts = new Map();
		kept.set(tables, layouts);
	}
	let own = layouts.get(prepared);
	if (own === undefined) {
		own = new Map();
		layouts.set(prepared, own);
	}
	const key = settling(prepared, whole);
	let years = own.get(key);
	if (years === undefined) {
		const [oldest] = own.size < MOST_KEPT ? [] : own.keys();
		if (oldest !== undefined) own.delete(oldest);
		years = [];
		own.set(key, years);
	}
	const at = year === null ? 0 : year - FIRST_YEAR + 1;
	return (years[at] ??= make());
}
