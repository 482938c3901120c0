/** Which layouts a text fits, and how the nearest one fails. */
import { DIGITS, LETTERS, UNREAD, type Cell } from './characters';
import type { PreparedLayout } from './plan';

const allows = (mask: Uint8Array, cell: Cell): boolean => {
	if (cell.length === 1) return cell === UNREAD || mask[cell.charCodeAt(0)] === 1;
	return [...cell].some((character) => mask[character.charCodeAt(0)] === 1);
};

/** Whether the cells may be this layout, or the beginning of it. Lengths are the caller's business. */
export function fits(prepared: PreparedLayout, cells: readonly Cell[]): boolean {
	const { masks } = prepared;
	for (let index = 0; index < cells.length; index += 1)
		if (!allows(masks[index] as Uint8Array, cells[index] as Cell)) return false;
	return true;
}

/** A place where a character stands that the layout does not allow. */
export interface Break {
	/** 1-based. */
	readonly position: number;
	readonly found: string;
	readonly allowed: string;
}

export interface Miss {
	readonly prepared: PreparedLayout;
	readonly breaks: readonly Break[];
	/** Characters typed less characters needed. */
	readonly difference: number;
}

/** How far a text is from a layout: the places that break, and the difference in length. */
export function missOf(prepared: PreparedLayout, cells: readonly Cell[]): Miss {
	const breaks: Break[] = [];
	cells.slice(0, prepared.layout.length).forEach((cell, index) => {
		if (!allows(prepared.masks[index] as Uint8Array, cell))
			breaks.push({
				position: index + 1,
				found: cell,
				allowed: prepared.allowed[index] as string
			});
	});
	return { prepared, breaks, difference: cells.length - prepared.layout.length };
}

/** Nearest first: a broken place counts as much as a missing character; ties by layout id. */
export function nearest(misses: readonly Miss[]): Miss | undefined {
	const cost = (miss: Miss): number => miss.breaks.length + Math.abs(miss.difference);
	return [...misses].sort(
		(a, b) => cost(a) - cost(b) || (a.prepared.layout.id < b.prepared.layout.id ? -1 : 1)
	)[0];
}

export type Expected = 'figure' | 'letter' | 'one_of';
/** How to name a set of allowed characters. */
export function expectedOf(allowed: string): Expected {
	const only = (set: string): boolean => [...allowed].every((character) => set.includes(character));
	if (allowed.length > 6 && only(DIGITS)) return 'figure';
	return allowed.length > 6 && only(LETTERS) ? 'letter' : 'one_of';
}
