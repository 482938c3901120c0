/** Splits a stamp of several lines into lines, tokens and cells. */
import { MAX_LINES, MAX_TEXT } from '../../types';
import { normalise, textOf, UNREAD, type Cell } from './characters';

/** One line as typed that holds a character; places are those of the whole normalised text. */
export interface Line {
	/** 1-based from the top; blank lines do not count. */
	readonly number: number;
	readonly cells: readonly Cell[];
	/** Before which cells a divider stands or the line begins, and the end. */
	readonly edges: readonly boolean[];
	/** For each cell, its first and last place in the normalised text, 1-based. */
	readonly places: readonly (readonly [from: number, to: number])[];
}

export interface Lines {
	readonly lines: readonly Line[];
	/** Tokens joined by one space, lines by " / ". Splitting it again changes nothing. */
	readonly normalised: string;
	/** How many lines and characters were typed beyond what is read. */
	readonly beyond: { readonly lines: number; readonly characters: number };
}

const LINE_BREAK = /\s*[\r\n\u2028\u2029]\s*|\s+\/+(?=\s|$)\s*|^\/+\s+/u;
const DIVIDER = /[^\p{L}\p{N}?_*[\]#]/u;

/** Whether a text is of several lines. */
export const hasLines = (text: string): boolean =>
	text.split(LINE_BREAK).filter((line) => normalise(line).cells.length > 0).length > 1;

/** Before which cells something stands that divides. */
function edgesOf(text: string, origins: readonly number[]): boolean[] {
	const edges = origins.map((origin, index) => {
		if (index === 0) return true;
		const before = origins[index - 1] as number;
		const bracket = text.charAt(before) === '[' ? text.indexOf(']', before) : before;
		// A sign may be two code units long: what is its second half divides nothing.
		return origin > bracket + 1 && DIVIDER.test(text.slice(bracket, origin).replace(/^./su, ''));
	});
	return [...edges, true];
}

/** The tokens of a line, as spans of its cells. */
export function tokensOf({ cells, edges }: Line): (readonly [from: number, to: number])[] {
	const tokens: (readonly [number, number])[] = [];
	for (let from = 0; from < cells.length;) {
		const to = edges.indexOf(true, from + 1);
		tokens.push([from, to]);
		from = to;
	}
	return tokens;
}

/** Whether nothing divides a text. */
export const isOneToken = (text: string): boolean =>
	linesOf(text, true).lines.every((line) => tokensOf(line).length <= 1);

/** The text of a span of a line, tokens joined by a space. */
export function spanText({ cells, edges }: Line, from: number, to: number): string {
	let text = '';
	for (let index = from; index < to; index += 1) {
		if (index > from && edges[index] === true) text += ' ';
		text += textOf([cells[index] as Cell]);
	}
	return text;
}

export const lineText = (line: Line): string => spanText(line, 0, line.cells.length);
export const isUnread = ({ cells }: Line): boolean => cells.every((cell) => cell === UNREAD);

/** Splits a text; with `asOne` all of it is one line. What is longer than a stamp can be is not read, and counted. */
export function linesOf(typed: string, asOne = false): Lines {
	const points = [...typed];
	const text = points.slice(0, MAX_TEXT.body_tag).join('');
	const whole = text.split(LINE_BREAK);
	const parts = (asOne ? [whole.join(' ')] : whole)
		.map((part) => ({ part, characters: normalise(part) }))
		.filter(({ characters }) => characters.cells.length > 0);
	const kept = parts.slice(0, MAX_LINES);
	let at = 0;
	const lines = kept.map(({ part, characters: { cells, origins } }, index): Line => {
		const edges = edgesOf(part, origins);
		if (index > 0) at += ' / '.length;
		const places = cells.map((cell, place): readonly [number, number] => {
			if (place > 0 && edges[place] === true) at += 1;
			const from = at + 1;
			at += textOf([cell]).length;
			return [from, at];
		});
		return { number: index + 1, cells, edges, places };
	});
	return {
		lines,
		normalised: lines.map(lineText).join(' / '),
		beyond: {
			lines: parts.length - kept.length,
			characters: Math.max(0, points.length - MAX_TEXT.body_tag)
		}
	};
}
