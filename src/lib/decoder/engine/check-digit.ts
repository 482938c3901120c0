/**
 * The check digit of the 17-character number: value times weight, summed, modulo 11, ten written X.
 * Source: 49 CFR 565.15(c), tables III to VI.
 */
import { ANY, isRead, UNREAD, type Cell } from './characters';
import { alike } from './look-alikes';

/** What each character counts. */
export const VALUES: ReadonlyMap<string, number> = new Map([
	...[...'0123456789'].map((character, index): [string, number] => [character, index]),
	...[...'ABCDEFGH'].map((character, index): [string, number] => [character, index + 1]),
	...[...'JKLMN'].map((character, index): [string, number] => [character, index + 1]),
	['P', 7],
	['R', 9],
	...[...'STUVWXYZ'].map((character, index): [string, number] => [character, index + 2])
]);
/** What each place counts. */
export const WEIGHTS = [8, 7, 6, 5, 4, 3, 2, 10, 0, 9, 8, 7, 6, 5, 4, 3, 2] as const;
const LENGTH = 17;
const CHECK = 8;

/** The characters that a 17-character number may hold: all but I, O and Q. */
export const VIN_CHARACTERS = [...ANY].filter((character) => VALUES.has(character)).join('');

/** WMIs that begin 1 to 5: North America (ISO 3780). */
export const isNorthAmerican = (cell: string): boolean => /^[1-5]$/.test(cell);

const written = (residue: number): string => (residue === 10 ? 'X' : String(residue));

/**
 * The check digit that seventeen characters call for; null when one of them is unread or never used.
 * @example checkDigitOf([...'1M8GDM9AXKP042788']) // 'X'
 */
export function checkDigitOf(cells: readonly Cell[]): string | null {
	if (cells.length !== LENGTH) return null;
	let sum = 0;
	for (let index = 0; index < LENGTH; index += 1) {
		if (index === CHECK) continue;
		const value = VALUES.get(cells[index] as Cell);
		if (value === undefined) return null;
		sum += value * (WEIGHTS[index] as number);
	}
	return written(sum % 11);
}

const candidates = (cell: Cell): string => (cell === UNREAD ? VIN_CHARACTERS : cell);

/** Residues that the places before (or, reversed, after) each place can add up to, as bit sets of eleven. */
function reachable(additions: readonly (readonly number[])[]): number[] {
	const sets = [1];
	for (const list of additions) {
		const before = sets[sets.length - 1] as number;
		let after = 0;
		for (let residue = 0; residue < 11; residue += 1) {
			if ((before & (1 << residue)) === 0) continue;
			for (const addition of list) after |= 1 << ((residue + addition) % 11);
		}
		sets.push(after);
	}
	return sets;
}

/**
 * What each unread or doubtful place may hold if the check digit stands, by position (1-based).
 * Works place by place over residues, never by listing numbers; places that the rule does not narrow are left out.
 */
export function narrowByCheckDigit(cells: readonly Cell[]): ReadonlyMap<number, string> {
	const narrowed = new Map<number, string>();
	const addition = (index: number, character: string): number =>
		index === CHECK
			? 11 - (character === 'X' ? 10 : Number(character))
			: ((VALUES.get(character) as number) * (WEIGHTS[index] as number)) % 11;
	const sets = cells.map((cell, index) =>
		[...candidates(cell)].filter((character) =>
			index === CHECK ? /[0-9X]/.test(character) : VALUES.has(character)
		)
	);
	const additions = sets.map((set, index) => set.map((character) => addition(index, character)));
	const before = reachable(additions);
	const after = reachable([...additions].reverse()).reverse();
	sets.forEach((set, index) => {
		if (isRead(cells[index] as Cell)) return;
		const fitting = set.filter((character) => {
			const own = addition(index, character);
			for (let residue = 0; residue < 11; residue += 1) {
				const needed = (22 - residue - own) % 11;
				if (
					((before[index] as number) & (1 << residue)) !== 0 &&
					((after[index + 1] as number) & (1 << needed)) !== 0
				)
					return true;
			}
			return false;
		});
		if (fitting.length < set.length) narrowed.set(index + 1, fitting.join(''));
	});
	return narrowed;
}

/**
 * Single look-alikes that would make a check digit fit that does not; empty when it fits, or when a character is unread.
 * Each is tried by what it would add to the sum, without working the sum out again.
 */
export function mendingCheckDigit(
	cells: readonly Cell[]
): { readonly place: number; readonly character: string }[] {
	const digit = cells[CHECK] as Cell;
	const expected = checkDigitOf(cells);
	if (expected === null || expected === digit || !/^[0-9X]$/.test(digit)) return [];
	const residue = expected === 'X' ? 10 : Number(expected);
	return cells.flatMap((cell, index) =>
		[...alike(cell)]
			.filter((character) => {
				if (index === CHECK) return character === expected;
				const value = VALUES.get(character);
				if (value === undefined) return false;
				const added = (value - (VALUES.get(cell) as number)) * (WEIGHTS[index] as number);
				return written((((residue + added) % 11) + 11) % 11) === digit;
			})
			.map((character) => ({ place: index + 1, character }))
	);
}
