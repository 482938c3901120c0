/** Holds what is stamped against the parts of a format. */
import { isRead, mayBe, normalise, textOf, type Cell } from '../engine/characters';
import type { DateFault, DateFormat, DatePart } from './format';
import { datesText as text } from '../../text/en/dates';

/** For one way to split the characters: what each part can stand for. */
export type Match = ReadonlyMap<DatePart, readonly number[]>;

export interface Matches {
	readonly matches: readonly Match[];
	readonly fault: { readonly code: DateFault; readonly message: string } | null;
}

const DIVIDER = /[\s.,/–—-]/;

interface Stamped {
	readonly cells: readonly Cell[];
	/** Places before which a divider was typed. */
	readonly divided: ReadonlySet<number>;
}

function stamped(typed: string): Stamped {
	const { cells, origins } = normalise(typed);
	const divided = new Set<number>();
	for (const [index, origin] of origins.entries())
		if (index > 0 && DIVIDER.test(typed.charAt(origin - 1))) divided.add(index);
	return { cells, divided };
}

/** Lengths of the parts that add up to the number of characters. */
function splits(parts: readonly DatePart[], left: number): number[][] {
	const [first, ...rest] = parts;
	if (first === undefined) return left === 0 ? [[]] : [];
	return first.lengths
		.filter((length) => length <= left)
		.flatMap((length) => splits(rest, left - length).map((others) => [length, ...others]));
}

const heldBy = (split: readonly number[], divided: ReadonlySet<number>): boolean => {
	const edges = new Set<number>();
	let at = 0;
	for (const length of split) edges.add((at += length));
	return [...divided].every((place) => edges.has(place));
};

function valuesOf(part: DatePart, cells: readonly Cell[]): readonly number[] {
	if (cells.every(isRead)) return part.codes.get(cells.join('')) ?? [];
	const values = new Set<number>();
	for (const [code, own] of part.codes)
		if (
			code.length === cells.length &&
			cells.every((cell, index) => mayBe(cell, code.charAt(index)))
		)
			for (const value of own) values.add(value);
	return [...values];
}

const formOf = (format: DateFormat): string => format.parts.map(({ label }) => label).join(', ');

function faultOf(part: DatePart, cells: readonly Cell[]): NonNullable<Matches['fault']> {
	const code = textOf(cells);
	return part.skipped.includes(code)
		? { code: 'skipped_letter', message: text.faults.skipped(code, part.label) }
		: { code: 'no_such_code', message: text.faults.noSuchCode(code, part.label) };
}

/** Every way in which a text can be split into the parts of a format; typed dividers decide where they can. */
export function matchesOf(format: DateFormat, typed: string): Matches {
	const { cells, divided } = stamped(typed);
	const all = splits(format.parts, cells.length);
	const held = all.filter((split) => heldBy(split, divided));
	const matches: Match[] = [];
	let furthest = -1;
	let fault: Matches['fault'] = {
		code: 'shape',
		message: text.faults.shape(formOf(format))
	};
	for (const split of held.length > 0 ? held : all) {
		const match = new Map<DatePart, readonly number[]>();
		let at = 0;
		for (const [index, part] of format.parts.entries()) {
			const own = cells.slice(at, (at += split[index] as number));
			const values = valuesOf(part, own);
			if (values.length === 0) {
				if (index > furthest) fault = faultOf(part, own);
				furthest = Math.max(furthest, index);
				break;
			}
			match.set(part, values);
		}
		if (match.size === format.parts.length) matches.push(match);
	}
	return { matches, fault: matches.length > 0 ? null : fault };
}
