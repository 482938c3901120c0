/** The same characters read from two places: no row is needed to hold them against each other. */
import { isRead, UNREAD, type Cell } from '../engine/characters';
import { alike } from '../engine/look-alikes';
import { all, type Truth } from './three-valued';

/** Where one is longer, fewer characters than this in common say nothing. */
const FEWEST = 4;

function same(left: Cell, right: Cell): Truth {
	if (left === UNREAD || right === UNREAD) return null;
	const common = [...left].filter((character) => right.includes(character));
	if (common.length === 0) return false;
	return isRead(left) && isRead(right) ? true : null;
}

export interface Comparison {
	readonly truth: Truth;
	/** One place that could be either, while all others agree: read as one it is the same, as another it is not. */
	readonly either: { readonly agrees: string; readonly others: string } | null;
	/** The one place, 1-based from the left, where look-alikes stand and all others agree. */
	readonly lookAlike: {
		readonly place: number;
		readonly left: string;
		readonly right: string;
	} | null;
}

/** Holds two numbers against each other, from their ends: a partial one lacks its beginning. */
export function compareCharacters(left: readonly Cell[], right: readonly Cell[]): Comparison {
	const length = Math.min(left.length, right.length);
	if (left.length !== right.length && length < FEWEST)
		return { truth: null, either: null, lookAlike: null };
	const [a, b] = [left.slice(-length), right.slice(-length)];
	const truths = a.map((cell, index) => same(cell, b[index] as Cell));
	const doubtful = truths.flatMap((truth, index) => (truth === true ? [] : [index]));
	const [place] = doubtful;
	const only = place !== undefined && doubtful.length === 1 ? place : null;
	if (only === null) return { truth: all(truths), either: null, lookAlike: null };
	const [one, two] = [a[only] as Cell, b[only] as Cell];
	const truth = truths[only] as Truth;
	return {
		truth,
		either: truth === null ? eitherOf(one, two) : null,
		lookAlike:
			truth === false && isRead(one) && isRead(two) && alike(one).includes(two)
				? { place: only + 1, left: one, right: two }
				: null
	};
}

/** What a doubtful place must be read as to agree with a read one. */
function eitherOf(one: Cell, two: Cell): Comparison['either'] {
	const [read, doubtful] = isRead(one) ? [one, two] : [two, one];
	if (!isRead(read) || doubtful === UNREAD) return null;
	return {
		agrees: read,
		others: [...doubtful].filter((character) => character !== read).join('')
	};
}
