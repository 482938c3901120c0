/** Lays the fields of a line form over the cells of a line. */
import { UNREAD, type Cell } from './characters';
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
	withinToken: 4,
	unreadField: 4,
	optionalField: 1
} as const;

/** The place after a printed word that begins at a place, or null. */
function afterWord(words: readonly string[], { cells, edges }: Line, at: number): number | null {
	if (edges[at] !== true) return null;
	for (const word of words) {
		let length = 0;
		while (length < word.length && cells[at + length] === word[length]) length += 1;
		if (length === word.length) return at + length;
	}
	return null;
}

/** What a field takes, worked out: for each place, by character code, 1 where a character may stand. */
interface Taking {
	readonly masks: readonly Uint8Array[];
	readonly fewest: number;
	readonly most: number;
}

function maskOf(chars: string): Uint8Array {
	const mask = new Uint8Array(128);
	for (const character of chars + UNREAD) mask[character.charCodeAt(0)] = 1;
	return mask;
}

function takingOf({ shape: { chars, length = 1, fewest: least } }: LineField): Taking {
	if (typeof chars !== 'string')
		return { masks: chars.map(maskOf), fewest: least ?? chars.length, most: chars.length };
	const [fewest, most] = typeof length === 'number' ? [length, length] : length;
	return { masks: new Array<Uint8Array>(most).fill(maskOf(chars)), fewest, most };
}

const takings = new WeakMap<LineForm, readonly Taking[]>();

/** What the fields of a form take; a form always takes the same, so it is worked out once. */
function takingsOf(form: LineForm): readonly Taking[] {
	const known = takings.get(form);
	if (known !== undefined) return known;
	const own = form.fields.map(takingOf);
	takings.set(form, own);
	return own;
}

/** Whether a cell may hold one of the characters allowed. */
function allows(mask: Uint8Array, cell: Cell): boolean {
	for (let index = 0; index < cell.length; index += 1)
		if (mask[cell.charCodeAt(index)] === 1) return true;
	return false;
}

/** How many cells from a place on are such as the field has. */
function reach({ masks, most }: Taking, cells: readonly Cell[], at: number): number {
	const end = Math.min(most, cells.length - at);
	let length = 0;
	while (length < end && allows(masks[length] as Uint8Array, cells[at + length] as Cell))
		length += 1;
	return length;
}

/** What is known of a state: its cost, what it does, and where that leads. */
const SLOTS = 6;
const [COST, ACT, STATE, AT, FROM, TO] = [0, 1, 2, 3, 4, 5] as const;
const [TAKE, PASS, LACK, DROP] = [1, 2, 3, 4] as const;
/** Costs are kept from one up, so that naught stands for "not worked out yet". */
const BASE = 1;

/** Room for the states of one line; a line is laid out before the next one is. */
let room = new Int32Array(8_192);
function emptyRoom(size: number): Int32Array {
	if (size > room.length) room = new Int32Array(size * 2);
	else room.fill(0, 0, size);
	return room;
}

/** Works out the cheapest way from each state that is reached; of equally cheap ones the one with the longer field. */
class Laying {
	private readonly fields: readonly LineField[];
	private readonly takings: readonly Taking[];
	private readonly known: Int32Array;
	private readonly width: number;

	constructor(
		form: LineForm,
		private readonly line: Line
	) {
		this.fields = form.fields;
		this.takings = takingsOf(form);
		this.width = line.cells.length + 1;
		// Two states a field: not yet taken, and taken once and free to repeat.
		this.known = emptyRoom((form.fields.length * 2 + 1) * this.width * SLOTS);
	}

	slot(state: number, at: number, name: number): number {
		return this.known[(state * this.width + at) * SLOTS + name] as number;
	}

	private keep(id: number, act: number, cost: number, state: number, at: number, from = 0, to = 0) {
		const { known } = this;
		const before = known[id + COST] as number;
		if (before !== 0 && before <= cost + BASE) return;
		known[id + COST] = cost + BASE;
		known[id + ACT] = act;
		known[id + STATE] = state;
		known[id + AT] = at;
		known[id + FROM] = from;
		known[id + TO] = to;
	}

	private take(id: number, state: number, field: LineField, from: number, afterWords: boolean) {
		const { cells, edges } = this.line;
		const taking = this.takings[state >> 1] as Taking;
		const next = field.repeats === true ? state | 1 : (state | 1) + 1;
		const begins = afterWords || edges[from] === true;
		for (let length = reach(taking, cells, from); length >= taking.fewest; length -= 1) {
			const to = from + length;
			const whole = begins && edges[to] === true;
			if (field.shape.whole === true && !whole) continue;
			let own = (begins ? 0 : COSTS.withinToken) + (edges[to] === true ? 0 : COSTS.withinToken);
			let read = false;
			for (let index = from; index < to; index += 1) {
				if (index > from && edges[index] === true) own += COSTS.withinToken;
				if (cells[index] !== UNREAD) read = true;
			}
			if (!read) own += COSTS.unreadField;
			const end =
				field.wordsAfter === undefined ? to : (afterWord(field.wordsAfter, this.line, to) ?? to);
			this.keep(id, TAKE, own + this.best(next, end), next, end, from, to);
		}
	}

	best(state: number, at: number): number {
		const { fields, line, width } = this;
		const field = fields[state >> 1];
		if (field === undefined && at === line.cells.length) return 0;
		const id = (state * width + at) * SLOTS;
		const before = this.known[id + COST] as number;
		if (before !== 0) return before - BASE;
		if (field !== undefined) {
			const after = field.words === undefined ? null : afterWord(field.words, line, at);
			if (after !== null) this.take(id, state, field, after, true);
			this.take(id, state, field, at, false);
			const next = (state | 1) + 1;
			const taken = (state & 1) === 1;
			const lacks = !taken && field.optional !== true;
			const own = taken ? 0 : lacks ? COSTS.missingField : COSTS.optionalField;
			this.keep(id, lacks ? LACK : PASS, own + this.best(next, at), next, at);
		}
		if (at < line.cells.length) {
			const end = line.edges.indexOf(true, at + 1);
			this.keep(id, DROP, COSTS.token + this.best(state, end), state, end, at, end);
		}
		return (this.known[id + COST] as number) - BASE;
	}
}

/** The cheapest way to lay the fields of a form over a line. */
export function matchLine(form: LineForm, line: Line): LineMatch {
	const { fields } = form;
	const laying = new Laying(form, line);
	const cost = laying.best(0, 0);
	const placed: Placed[] = [];
	const unplaced: (readonly [number, number])[] = [];
	const missing: LineField[] = [];
	let [state, at] = [0, 0];
	while (state >> 1 < fields.length || at < line.cells.length) {
		const field = fields[state >> 1] as LineField;
		const from = laying.slot(state, at, FROM);
		const to = laying.slot(state, at, TO);
		const act = laying.slot(state, at, ACT);
		if (act === TAKE) placed.push({ field, line, from, to });
		else if (act === DROP) unplaced.push([from, to]);
		else if (act === LACK) missing.push(field);
		[state, at] = [laying.slot(state, at, STATE), laying.slot(state, at, AT)];
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
