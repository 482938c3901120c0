/**
 * Characters as they are struck. A cell is the set of characters that may stand in one place:
 * one character when read, several for "could be either", `?` for unread.
 */
import type { StampKind } from '../../types';
import { MAX_TEXT } from '../../types';

export const DIGITS = '0123456789';
export const LETTERS = 'ABCDEFGHIJKLMNOPQRSTUVWXYZ';
export const ANY = LETTERS + DIGITS;
/** The mark for a character that cannot be read. */
export const UNREAD = '?';

/** A sorted set of characters, or `?`. */
export type Cell = string;

export interface Characters {
	readonly cells: readonly Cell[];
	/** Canonical text: upper case, no dividers, `?` for unread, `[38]` for either. Normalising it again changes nothing. */
	readonly normalised: string;
	/** For each cell, the index in the typed text (UTF-16) at which it begins. */
	readonly origins: readonly number[];
}

type Token = { readonly cell: Cell; readonly at: number };

const STRUCK = /[A-Z0-9]/;
const OTHER_LETTER = /[\p{L}\p{N}]/u;

/** Turns what stands between brackets into a cell; null when nothing in it can be struck. */
function either(inside: string): Cell | null {
	const upper = inside.toUpperCase();
	if (/[?_*]/.test(upper)) return UNREAD;
	const set = [...new Set([...upper].filter((character) => STRUCK.test(character)))].sort();
	return set.length === 0 ? null : set.join('');
}

/** One pass over the text; `*` stays a token of its own until the ends are known. */
function tokenise(text: string): Token[] {
	const tokens: Token[] = [];
	let at = 0;
	while (at < text.length) {
		// Most characters are what they seem: only others need a closer look.
		const own = text.charAt(at);
		if (own === ' ' || STRUCK.test(own)) {
			if (own !== ' ') tokens.push({ cell: own, at });
			at += 1;
			continue;
		}
		const rest = text.slice(at);
		const run = /^(?:x{2,}|#{2,})/.exec(rest)?.[0];
		if (run !== undefined) {
			for (let index = 0; index < run.length; index += 1)
				tokens.push({ cell: UNREAD, at: at + index });
			at += run.length;
			continue;
		}
		const bracket = /^\[([^[\]]*)\]/.exec(rest);
		if (bracket?.[1] !== undefined) {
			const cell = either(bracket[1].normalize('NFKC'));
			if (cell !== null) tokens.push({ cell, at });
			at += bracket[0].length;
			continue;
		}
		const point = String.fromCodePoint(rest.codePointAt(0) as number);
		for (const character of point.normalize('NFKC')) {
			const upper = /[a-z]/.test(character) ? character.toUpperCase() : character;
			if (STRUCK.test(upper)) tokens.push({ cell: upper, at });
			else if (upper === '?' || upper === '_') tokens.push({ cell: UNREAD, at });
			else if (upper === '*') tokens.push({ cell: '*', at });
			else if (OTHER_LETTER.test(upper)) tokens.push({ cell: UNREAD, at });
		}
		at += point.length;
	}
	return tokens;
}

const PLAIN = /^[A-Z0-9]+$/;
const IN_PLACE: number[][] = [];
/** 0, 1, 2 … for a text in which nothing is folded; made once for each length that is likely. */
function inPlace(length: number): readonly number[] {
	const known = IN_PLACE[length];
	if (known !== undefined) return known;
	const origins = Array.from({ length }, (_, index) => index);
	if (length <= 64) IN_PLACE[length] = origins;
	return origins;
}

/**
 * Folds a typed stamp to its characters.
 * Stars and emblems at either end are the plate's own end marks and are dropped; a star inside, `?`, `_`,
 * and runs of two or more lower-case x or # are unread; spaces, dots, dashes and other signs inside divide.
 * A letter that no die set has (é, Я) is kept as unread, so that the places after it stay where they are.
 * @example normalise('*rh23-L?e9041xx*').normalised // 'RH23L?E9041??'
 */
export function normalise(text: string): Characters {
	if (PLAIN.test(text)) {
		return { cells: text.split(''), normalised: text, origins: inPlace(text.length) };
	}
	const tokens = tokenise(text);
	const first = tokens.findIndex((token) => token.cell !== '*');
	const last = tokens.findLastIndex((token) => token.cell !== '*');
	const kept = first < 0 ? [] : tokens.slice(first, last + 1);
	const cells = kept.map((token) => (token.cell === '*' ? UNREAD : token.cell));
	return { cells, normalised: textOf(cells), origins: kept.map((token) => token.at) };
}

/** Writes cells as text: `?` for unread, `[38]` for either. */
export function textOf(cells: readonly Cell[]): string {
	return cells.map((cell) => (cell.length > 1 ? `[${cell}]` : cell)).join('');
}

/** Whether a cell is one known character. */
export const isRead = (cell: Cell): boolean => cell.length === 1 && cell !== UNREAD;

/** Whether a cell may hold a character. */
export const mayBe = (cell: Cell, character: string): boolean =>
	cell === UNREAD || cell.includes(character);

export type TextFault = 'empty' | 'too_long' | 'nothing_struck';

/** What divides the lines of a body tag. */
const SEVERAL_LINES = /[\r\n]|\s\/+\s/;

/**
 * Most characters that a text may have: those of its kind; when none is given, those of a body tag for several lines and
 * of a serial for one.
 */
export const mostCharacters = (text: string, kind?: StampKind): number =>
	MAX_TEXT[kind ?? (SEVERAL_LINES.test(text) ? 'body_tag' : 'serial')];

/** Why a text cannot be read at all, or null; see `mostCharacters` for the limits. */
export function examineText(text: string, kind?: StampKind): TextFault | null {
	if (text.trim() === '') return 'empty';
	if ([...text].length > mostCharacters(text, kind)) return 'too_long';
	if (!normalise(text).cells.some((cell) => cell !== UNREAD)) return 'nothing_struck';
	return null;
}
