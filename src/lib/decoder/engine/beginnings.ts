/**
 * Numbers that differ in nothing but the running number and the check digit say the same with all their other
 * places. What those say is worked out once and kept, for so many beginnings of an edition.
 */
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
const kept = new WeakMap<TableSet, Map<string, Beginning>>();

/** The places of a number that settle it, with layout and year. */
function keyOf(prepared: PreparedLayout, whole: string, year: number | null): string {
	let key = `${prepared.layout.id} ${year}`;
	for (const [from, to] of prepared.settling) key += ` ${whole.slice(from - 1, to)}`;
	return key;
}

/** The beginning of a number that is read whole, made by `make` the first time; the oldest goes when there are too many. */
export function beginningOf(
	tables: TableSet,
	prepared: PreparedLayout,
	whole: string,
	year: number | null,
	make: () => Beginning
): Beginning {
	let own = kept.get(tables);
	if (own === undefined) {
		own = new Map();
		kept.set(tables, own);
	}
	const key = keyOf(prepared, whole, year);
	const before = own.get(key);
	if (before !== undefined) return before;
	const beginning = make();
	const [oldest] = own.size < MOST_KEPT ? [] : own.keys();
	if (oldest !== undefined) own.delete(oldest);
	own.set(key, beginning);
	return beginning;
}
