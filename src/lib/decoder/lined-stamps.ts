/** Reads a body tag, an engine stamp or a casting through the lined layouts. */
import type { FieldName, Problem, ReadContext, Reading } from '../types';
import { stampsText as text } from '../text/en/stamps';
import type { LinedKind, LinedLayout } from './engine/lined-layout';
import { leastCost, matchLayout, type LinedMatch } from './engine/lined-match';
import { lineProblems, otherMaker, textProblems } from './engine/lined-problems';
import { linedDrafts } from './engine/lined-reading';
import { matchFields } from './engine/named-fields';
import { linesOf, type Line } from './engine/lines';
import type { PreparedLayout } from './engine/plan';
import { ranked } from './engine/ranking';
import type { TableSet } from './engine/table-set';
import { knownCar } from './known-car';

export interface LinedRequest {
	readonly kind: LinedKind;
	readonly text: string;
	/** In place of the text: what stands in each named field. */
	readonly fields?: Readonly<Partial<Record<FieldName, string>>>;
	readonly context: ReadContext;
	readonly lookups: boolean;
	readonly lined: readonly LinedLayout[];
	readonly layouts: readonly PreparedLayout[];
}
export interface LinedResult {
	readonly normalised: string;
	readonly readings: readonly Reading[];
	readonly more: number;
	readonly problems: readonly Problem[];
	/** Whether every character of the first reading has its field. */
	readonly whole: boolean;
}

/** So much worse may another layout fit than the best and still be told. */
const NEAR = 120;
/** At most so many layouts are read; the others fit less well than all of these. */
const MOST_LAYOUTS = 8;

/** Whether at least a third of what is typed has its field: two plates may be typed into one. */
function mostlyPlaced({ lines }: LinedMatch): boolean {
	let typed = 0;
	let placed = 0;
	for (const { line, placed: own } of lines) {
		typed += line.cells.length;
		for (const { from, to } of own) placed += to - from;
	}
	return placed * 3 >= typed && placed > 0;
}

/** The layouts over the lines; left out are those that cannot come near one that fits, as they have too few lines. */
function matchesOf(layouts: readonly LinedLayout[], lines: readonly Line[]): LinedMatch[] {
	const bounds = new Map(layouts.map((layout) => [layout, leastCost(layout, lines.length)]));
	const boundOf = (layout: LinedLayout): number => bounds.get(layout) as number;
	const found = new Map<LinedLayout, LinedMatch>();
	let least = Infinity;
	for (const layout of [...layouts].sort((a, b) => boundOf(a) - boundOf(b))) {
		if (boundOf(layout) > least + NEAR) break;
		const match = matchLayout(layout, lines);
		found.set(layout, match);
		if (mostlyPlaced(match)) least = Math.min(least, match.cost);
	}
	return layouts.flatMap((layout) => found.get(layout) ?? []);
}

/** Pads and castings are typed as one line, whatever stood beneath what. */
const asOneLine = (layout: LinedLayout): LinedLayout =>
	layout.kind === 'body_tag' || layout.lines.length === 1
		? layout
		: {
				...layout,
				lines: [{ label: layout.title, fields: layout.lines.flatMap((form) => form.fields) }]
			};

/** Reads a stamp line by line. Never throws; what no field takes is kept as unknown. */
export function readLined(tables: TableSet, request: LinedRequest): LinedResult {
	const { kind, fields, context, lookups, lined, layouts } = request;
	const own = lined.filter((layout) => layout.kind === kind).map(asOneLine);
	const typed = linesOf(request.text, kind !== 'body_tag');
	const matches =
		fields === undefined
			? matchesOf(own, typed.lines)
			: own.map((layout) => matchFields(layout, fields, typed));
	matches.sort((a, b) => a.cost - b.cost);
	const fitting = matches.filter(mostlyPlaced);
	const least = fitting[0]?.cost ?? 0;
	const near = fitting.filter(({ cost }) => cost <= least + NEAR).slice(0, MOST_LAYOUTS);
	const car = knownCar(tables, context, layouts);
	const { maker, division, year } = { ...car, ...context };
	const hints = {
		...(maker === undefined ? {} : { maker }),
		...(division === undefined ? {} : { division }),
		...(year === undefined ? {} : { year })
	};
	const drafts = near.flatMap((match) => linedDrafts({ match, tables, context: hints, car }));
	const { readings, more } = ranked(drafts, hints, lookups);
	const general = textProblems(typed);
	const [first] = readings;
	const { normalised } = typed;
	if (first === undefined) {
		const [nearest] = matches;
		const message =
			nearest === undefined ? text.problems.noForms : text.problems.noForm(nearest.layout.title);
		const problems = [...general, { code: 'no_form', message, offers: [] }];
		return { normalised, readings, more, problems, whole: false };
	}
	const match = near.find(({ layout }) => layout.id === first.layout) as LinedMatch;
	const problems = [
		...general,
		...(fields === undefined ? lineProblems(match, own) : []),
		...otherMaker(match.layout.maker, car, context.maker)
	];
	return {
		normalised,
		readings,
		more,
		problems,
		whole: match.lines.every(({ unplaced }) => unplaced.length === 0)
	};
}
