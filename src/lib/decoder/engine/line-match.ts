/** Lays the fields of a line form over the cells of a line. */
import { isRead, mayBe, UNREAD, type Cell } from './characters';
import type { LineField, LineForm } from './lined-layout';
import { tokensOf, type Line } from './lines';

/** A field and the cells of a line that it takes; `to` is the first cell after it. */
export interface Placed {
	readonly field: LineField;
	readonly line: Line;
	readonly from: number;
	readonly to: number;
}
export interface LineMatch {
	readonly line: Line;
	/** How badly the line fits: 0 is a line whose every character has its field. */
	readonly cost: number;
	readonly placed: readonly Placed[];
	/** Spans of cells that no field takes. */
	readonly unplaced: readonly (readonly [from: number, to: number])[];
	/** Fields that every such line has, and this one lacks. */
	readonly missing: readonly LineField[];
}

/** What speaks against a match. A field that is lacking weighs as much as two tokens that nothing takes. */
export const COSTS = {
	missingField: 40,
	token: 20,
	withinToken: 6,
	unreadField: 4,
	optionalField: 1
} as const;

interface Step {
	readonly cost: number;
	readonly next: readonly [state: number, at: number];
	readonly takes?: readonly [from: number, to: number];
	readonly drops?: readonly [from: number, to: number];
	readonly lacks?: true;
}

const END: Step = { cost: 0, next: [-1, -1] };

/** The place after a printed word that begins at a place, or null. */
function afterWord(words: readonly string[], { cells, edges }: Line, at: number): number | null {
	if (edges[at] !== true) return null;
	for (const word of words)
		if (word.length <= cells.length - at && [...word].every((own, n) => cells[at + n] === own))
			return at + word.length;
	return null;
}

const lengthsOf = ({ shape }: LineField): readonly [number, number] => {
	const { chars, length } = shape;
	if (typeof chars !== 'string') return [chars.length, chars.length];
	if (length === undefined) return [1, 1];
	return typeof length === 'number' ? [length, length] : length;
};

/** Whether a cell may hold one of the characters allowed. */
const allows = (chars: string, cell: Cell): boolean =>
	isRead(cell)
		? chars.includes(cell)
		: cell === UNREAD || [...chars].some((own) => mayBe(cell, own));

/** How many cells from a place on are such as the field has. */
function reach({ shape: { chars } }: LineField, cells: readonly Cell[], at: number, most: number) {
	let length = 0;
	while (length < most && at + length < cells.length) {
		const allowed = typeof chars === 'string' ? chars : (chars[length] as string);
		if (!allows(allowed, cells[at + length] as Cell)) break;
		length += 1;
	}
	return length;
}

/** The cheapest way to lay the fields over the line; of equally cheap ones the one with the longer fields. */
export function matchLine(form: LineForm, line: Line): LineMatch {
	const { fields } = form;
	const { cells, edges } = line;
	const width = cells.length + 1;
	// Two states a field: not yet taken, and taken once and free to repeat.
	const known = new Array<Step | undefined>((fields.length * 2 + 1) * width);

	const edgeCost = (at: number): number => (edges[at] === true ? 0 : COSTS.withinToken);
	const tokenEnd = (at: number): number => edges.indexOf(true, at + 1);

	function* takings(state: number, begin: number): Generator<Step> {
		const field = fields[state >> 1] as LineField;
		const after = field.words === undefined ? null : afterWord(field.words, line, begin);
		const [fewest, most] = lengthsOf(field);
		for (const from of after === null ? [begin] : [after, begin])
			for (let length = reach(field, cells, from, most); length >= fewest; length -= 1) {
				const to = from + length;
				const whole = edges[to] === true && (edges[from] === true || from === after);
				if (field.shape.whole === true && !whole) continue;
				const unread = cells.slice(from, to).every((cell) => cell === UNREAD);
				const own =
					(from === after ? 0 : edgeCost(from)) + edgeCost(to) + (unread ? COSTS.unreadField : 0);
				const end =
					field.wordsAfter === undefined ? to : (afterWord(field.wordsAfter, line, to) ?? to);
				const next = field.repeats === true ? state | 1 : (state | 1) + 1;
				yield {
					cost: own + best(next, end).cost,
					next: [next, end],
					takes: [from, to]
				};
			}
	}

	function* steps(state: number, at: number): Generator<Step> {
		const field = fields[state >> 1];
		if (field !== undefined) {
			yield* takings(state, at);
			const next = (state | 1) + 1;
			const taken = (state & 1) === 1;
			const lacks = !taken && field.optional !== true;
			const own = taken ? 0 : lacks ? COSTS.missingField : COSTS.optionalField;
			const rest = own + best(next, at).cost;
			yield lacks
				? { cost: rest, next: [next, at], lacks: true }
				: { cost: rest, next: [next, at] };
		}
		if (at < cells.length) {
			const end = tokenEnd(at);
			yield { cost: COSTS.token + best(state, end).cost, next: [state, end], drops: [at, end] };
		}
	}

	function best(state: number, at: number): Step {
		if (state >> 1 >= fields.length && at === cells.length) return END;
		const id = state * width + at;
		const before = known[id];
		if (before !== undefined) return before;
		let found: Step | undefined;
		for (const step of steps(state, at))
			if (found === undefined || step.cost < found.cost) found = step;
		return (known[id] = found as Step);
	}

	const placed: Placed[] = [];
	const unplaced: (readonly [number, number])[] = [];
	const missing: LineField[] = [];
	let [state, at] = [0, 0];
	const { cost } = best(0, 0);
	for (let step = best(0, 0); step !== END; step = best(state, at)) {
		const field = fields[state >> 1] as LineField;
		if (step.takes !== undefined)
			placed.push({ field, line, from: step.takes[0], to: step.takes[1] });
		if (step.drops !== undefined) unplaced.push(step.drops);
		if (step.lacks === true) missing.push(field);
		[state, at] = step.next;
	}
	return { line, cost, placed, unplaced, missing };
}

/** A line of which nothing is placed. */
export const nothingPlaced = (line: Line): LineMatch => ({
	line,
	cost: COSTS.token * 2,
	placed: [],
	unplaced: tokensOf(line),
	missing: []
});
