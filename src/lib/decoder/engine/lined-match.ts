/** Lays the lines of a lined layout over the lines of a stamp. */
import type { LineForm, LinedLayout } from './lined-layout';
import { matchLine, nothingPlaced, type LineMatch } from './line-match';
import { isUnread, lineText, type Line } from './lines';

/** How the lines stood: as on the plate, from the other end, or otherwise. */
export type LineOrder = 'as_listed' | 'turned' | 'swapped';

export interface LinedMatch {
	readonly layout: LinedLayout;
	/** How badly the stamp fits: 0 is one whose every character has its field. */
	readonly cost: number;
	/** For each line of the stamp, from the top as typed, how it was placed. */
	readonly lines: readonly LineMatch[];
	/** For each line of the stamp, the form it was taken for; null for none. */
	readonly forms: readonly (LineForm | null)[];
	/** Forms that every such stamp has, and this one lacks. */
	readonly missing: readonly LineForm[];
	readonly order: LineOrder;
	/** The lines in the order of the plate, where they stood otherwise. */
	readonly sorted: readonly Line[];
	/** Lines that repeat one before them: which line of the stamp, and which it repeats. */
	readonly doubled: readonly (readonly [line: Line, first: Line])[];
}

const MISSING_LINE = 50;
const OPTIONAL_LINE = 1;
const UNPLACED_LINE = 40;
/** So much better must another order be before it is preferred. */
const BETTER = 30;

type Cost = (line: number, form: number) => number;
interface Laid {
	readonly cost: number;
	/** For each line, the index of its form, or -1. */
	readonly forms: readonly number[];
}

const lacking = (form: LineForm): number => (form.optional === true ? OPTIONAL_LINE : MISSING_LINE);

/** The cheapest way to lay forms over lines, both in the order given. */
function inOrder(
	count: number,
	order: readonly number[],
	forms: readonly LineForm[],
	cost: Cost
): Laid {
	const known = new Map<number, Laid>();
	const best = (line: number, at: number, taken: boolean): Laid => {
		if (line === count && at === order.length) return { cost: 0, forms: [] };
		const id = (line * (order.length + 1) + at) * 2 + Number(taken);
		const before = known.get(id);
		if (before !== undefined) return before;
		const options: Laid[] = [];
		const index = order[at];
		const form = index === undefined ? undefined : forms[index];
		if (index !== undefined && form !== undefined) {
			if (line < count) {
				const rest =
					form.repeats === true ? best(line + 1, at, true) : best(line + 1, at + 1, false);
				options.push({ cost: cost(line, index) + rest.cost, forms: [index, ...rest.forms] });
			}
			const rest = best(line, at + 1, false);
			options.push({ cost: (taken ? 0 : lacking(form)) + rest.cost, forms: rest.forms });
		}
		if (line < count) {
			const rest = best(line + 1, at, taken);
			options.push({ cost: UNPLACED_LINE + rest.cost, forms: [-1, ...rest.forms] });
		}
		const found = options.reduce((one, other) => (other.cost < one.cost ? other : one));
		known.set(id, found);
		return found;
	};
	return best(0, 0, false);
}

/** Each line to the form that it fits best, whatever the order. */
function anyOrder(count: number, forms: readonly LineForm[], cost: Cost): Laid {
	const pairs = Array.from({ length: count }, (_, line) =>
		forms.map((_form, form) => ({ line, form, cost: cost(line, form) }))
	)
		.flat()
		.filter((pair) => pair.cost < UNPLACED_LINE + MISSING_LINE)
		.sort((a, b) => a.cost - b.cost);
	const own = new Array<number>(count).fill(-1);
	const taken = new Set<number>();
	let total = 0;
	for (const pair of pairs) {
		const free = !taken.has(pair.form) || forms[pair.form]?.repeats === true;
		if (own[pair.line] !== -1 || !free) continue;
		own[pair.line] = pair.form;
		taken.add(pair.form);
		total += pair.cost;
	}
	for (const form of own) if (form === -1) total += UNPLACED_LINE;
	for (const [index, form] of forms.entries()) if (!taken.has(index)) total += lacking(form);
	return { cost: total, forms: own };
}

/** The order in which the lines fit best; another one than that of the plate only where it fits much better. */
function cheapest(
	count: number,
	down: readonly number[],
	forms: readonly LineForm[],
	cost: Cost
): { readonly order: LineOrder; readonly laid: Laid } {
	const listed = inOrder(count, down, forms, cost);
	let least = 0;
	for (let line = 0; line < count; line += 1)
		least += Math.min(UNPLACED_LINE, ...down.map((form) => cost(line, form)));
	if (least + BETTER > listed.cost) return { order: 'as_listed', laid: listed };
	const turned = inOrder(count, down.toReversed(), forms, cost);
	const swapped = anyOrder(count, forms, cost);
	if (turned.cost + BETTER <= listed.cost && swapped.cost + BETTER > turned.cost)
		return { order: 'turned', laid: turned };
	return swapped.cost + BETTER <= listed.cost
		? { order: 'swapped', laid: swapped }
		: { order: 'as_listed', laid: listed };
}

/** Lines that say the same as one before them; a line that is wholly unread repeats none. */
function doublesOf(lines: readonly Line[]): (readonly [Line, Line])[] {
	const first = new Map<string, Line>();
	const doubles: (readonly [Line, Line])[] = [];
	for (const line of lines) {
		if (isUnread(line)) continue;
		const text = lineText(line);
		const before = first.get(text);
		if (before === undefined) first.set(text, line);
		else doubles.push([line, before]);
	}
	return doubles;
}

/** What a layout costs at least on so many lines: those for which it has no form are left over. */
export const leastCost = ({ lines: forms }: LinedLayout, count: number): number =>
	forms.some(({ repeats }) => repeats === true)
		? 0
		: Math.max(0, count - forms.length) * UNPLACED_LINE;

/** Lays a layout over lines, in the order of the plate or, where that fits much better, in another. */
export function matchLayout(layout: LinedLayout, all: readonly Line[]): LinedMatch {
	const { lines: forms } = layout;
	const doubled = doublesOf(all).filter(() => !forms.some(({ repeats }) => repeats === true));
	const lines = all.filter((line) => doubled.every(([own]) => own !== line));
	const matches = lines.map(() => new Array<LineMatch | undefined>(forms.length));
	const matchOf = (line: number, form: number): LineMatch =>
		((matches[line] as (LineMatch | undefined)[])[form] ??= matchLine(
			forms[form] as LineForm,
			lines[line] as Line
		));
	const cost: Cost = (line, form) => {
		const match = matchOf(line, form);
		return match.placed.length === 0 ? Infinity : match.cost;
	};
	const listed = forms.map((_, index) => index);
	const down = layout.order === 'down' ? listed : listed.toReversed();
	const { order, laid } = cheapest(lines.length, down, forms, cost);
	const rank = (line: Line): number => down.indexOf(laid.forms[lines.indexOf(line)] as number);
	return {
		layout,
		cost: laid.cost + doubled.length * UNPLACED_LINE,
		lines: all.map((line) => {
			const at = lines.indexOf(line);
			const form = laid.forms[at] ?? -1;
			return form === -1 ? nothingPlaced(line) : matchOf(at, form);
		}),
		forms: all.map((line) => forms[laid.forms[lines.indexOf(line)] ?? -1] ?? null),
		missing: forms.filter((form, index) => form.optional !== true && !laid.forms.includes(index)),
		order,
		sorted: order === 'as_listed' ? [] : [...lines].sort((a, b) => rank(a) - rank(b)),
		doubled
	};
}
