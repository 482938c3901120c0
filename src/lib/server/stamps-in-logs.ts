/** What stands in a log where characters of a stamp stood. */
const MASK = '******';
const LAST = MASK.length;
/** As much as may stay of any stamp; further on in a body tag other numbers follow. */
const FIRST = 11;
/** No one serial that we read is longer; beyond it a text holds several numbers, and any of them may be the serial. */
const LONGEST = 17;
/** What a running number is made of: figures, and what could not be read. */
const FIGURE = /^(?:\p{N}|[?_*x]|\[)/u;
/** The shortest full serial that we read has eleven characters. */
const SHORTEST = 11;

/** One position of a stamp: a character, or "one of these" in brackets. */
const POSITION = /\[[^[\]]*\]|[\p{L}\p{N}?_*]/gu;
const PIECE = /(?:\[[^[\]\s]*\]|[\p{L}\p{N}?_*])+/gu;
/** What may stand between two pieces of one stamp: the plate's dividers, and a tag's line breaks. */
const DIVIDER = /^(?:[\s.\-‐-―·,+]{1,3}|\s+\/\s+|\s*[\r\n]\s*)$/u;
/** Prose, and not a piece of a stamp. A run of x stands for what cannot be read. */
const WORD = /^(?!x+$)(?:[A-Za-z]*[a-z]{2,}|[A-Z]{6,})$/;

interface Run {
	readonly from: number;
	readonly to: number;
}

/** Stretches of a text that could be one stamp: pieces held together by dividers, words left out. */
function runs(text: string): Run[] {
	const found: Run[] = [];
	let open: Run | null = null;
	for (const { 0: piece, index } of text.matchAll(PIECE)) {
		if (WORD.test(piece)) {
			open = null;
			continue;
		}
		const to = index + piece.length;
		if (open && DIVIDER.test(text.slice(open.to, index))) {
			open = { from: open.from, to };
			found[found.length - 1] = open;
		} else {
			open = { from: index, to };
			found.push(open);
		}
	}
	return found;
}

const decoded = (text: string) =>
	text.replace(/(?:%[0-9a-f]{2})+/gi, (bytes) => {
		try {
			return decodeURIComponent(bytes);
		} catch {
			return bytes; // not UTF-8: shown as it came
		}
	});

const withoutEndMarks = (positions: readonly RegExpExecArray[]) => {
	const isMark = ([character]: RegExpExecArray) => character === '*';
	const first = positions.findIndex((position) => !isMark(position));
	const last = positions.findLastIndex((position) => !isMark(position));
	return first < 0 ? [] : positions.slice(first, last + 1);
};

/** How many positions stand before the first six figures in a row; all when there are none. */
function beforeRunningNumber(positions: readonly RegExpExecArray[]): number {
	let figures = 0;
	for (const [index, [position]] of positions.entries()) {
		figures = FIGURE.test(position) ? figures + 1 : 0;
		if (figures === LAST) return index + 1 - LAST;
	}
	return positions.length;
}

/**
 * A text with the last six positions of one stamp struck out, and all that stands between them or
 * behind them. Of a shorter stamp nothing is left, of a longer one no more than eleven, and of a text
 * that holds several numbers nothing from its first running number on.
 */
export function maskStamp(stamp: string): string {
	const positions = withoutEndMarks([...stamp.matchAll(POSITION)]);
	if (positions.length === 0) return stamp;
	const kept = positions.length > LONGEST ? beforeRunningNumber(positions) : FIRST;
	const cut = positions[Math.min(FIRST, kept, positions.length - LAST)];
	return stamp.slice(0, cut?.index ?? 0) + MASK;
}

/**
 * A text in which nothing of eleven or more positions that could be a stamp keeps its last six.
 * A run counts when it holds a figure, so that prose stays readable. Percent signs are decoded.
 */
export function maskStamps(text: string): string {
	const plain = decoded(text);
	let masked = '';
	let done = 0;
	for (const { from, to } of runs(plain)) {
		const run = plain.slice(from, to);
		if ([...run.matchAll(POSITION)].length < SHORTEST || !/\p{N}/u.test(run)) continue;
		masked += plain.slice(done, from) + maskStamp(run);
		done = to;
	}
	return masked + plain.slice(done);
}

/** Parameters that hold what somebody typed off a car, however short. */
const STAMP_PARAMETERS: ReadonlySet<string> = new Set(['text', 'stamp', 'serial', 'q']);

/**
 * Path and query of a request, decoded, for a log.
 * @param address as it stands in the request line
 */
export function maskAddress(address: string): string {
	const [path = '', ...rest] = address.split('?');
	const query = rest.join('?');
	if (query === '') return maskStamps(path);
	const parameters = [...new URLSearchParams(query)].map(([name, value]) => {
		const shown = STAMP_PARAMETERS.has(name) ? maskStamp(value) : maskStamps(value);
		return `${maskStamps(name)}=${shown}`;
	});
	return `${maskStamps(path)}?${parameters.join('&')}`;
}
