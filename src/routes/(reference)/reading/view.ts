/** A reading as the page shows it: made on the server, so that the browser gets words and places and no tables. */
import { leaderLayout, type LeaderLayout } from '$lib/format/leaders';
import { readingTitle } from '$lib/format/reading-title';
import { placesInWords, stampCells, type StampCell } from '$lib/format/stamp';
import { markOf, type LineMark } from '$lib/format/strength-line';
import { readingText as text } from '$lib/text/en/reading';
import type {
	AnsweredReading,
	FieldSource,
	Outcome,
	Possible,
	ReadingField,
	SourceKind
} from '$lib/types';

export interface FieldView {
	readonly label: string;
	readonly places: string;
	readonly code: string;
	readonly outcome: Outcome;
	readonly mark: LineMark;
	/** The word beside the mark where it is not the usual one. */
	readonly word?: string;
	/** A derived field that its parent's own row tells: strength and sources stand there. */
	readonly sameRow: boolean;
	/** What is said in the largest letters; empty for a contested field, whose values stand in `alternatives`. */
	readonly meaning: string;
	/** The meaning is the code itself: set in the letters of codes. */
	readonly meaningIsCode: boolean;
	readonly detail: string;
	readonly why: string;
	readonly rows: readonly string[];
	readonly sources: readonly FieldSource[];
	readonly alternatives: readonly AlternativeView[];
	readonly possible: readonly Omit<Possible, 'values'>[];
}
export interface AlternativeView {
	readonly meaning: string;
	readonly rows: readonly string[];
	readonly sources: readonly FieldSource[];
}
export interface GroupView {
	readonly id: string;
	/** The line of a stamp of several lines, from the top; null for a stamp of one. */
	readonly line: number | null;
	readonly from: number;
	readonly to: number;
	readonly cells: readonly StampCell[];
	readonly mark: LineMark;
	readonly name: string;
	readonly field: FieldView;
	readonly derived: readonly FieldView[];
}
export interface SourceView extends FieldSource {
	readonly labels: readonly string[];
}
export interface ReadingView {
	readonly title: string;
	readonly why: string;
	readonly layoutTitle: string;
	readonly partial: boolean;
	readonly groups: readonly GroupView[];
	readonly layout: LeaderLayout;
	readonly sources: readonly SourceView[];
}

/** Best kinds first: what a reader would rather look up. */
const BY_KIND: readonly SourceKind[] = [
	'factory_paper',
	'law',
	'standard',
	'book',
	'club_research',
	'magazine',
	'dataset',
	'web_page',
	'car_seen',
	'common_practice',
	'memory'
];
const ordered = (sources: readonly FieldSource[]): readonly FieldSource[] =>
	[...sources].sort((a, b) => BY_KIND.indexOf(a.kind) - BY_KIND.indexOf(b.kind));

const spoken = (cell: StampCell): string =>
	cell === '' || cell === '?'
		? text.unreadCharacter
		: cell.length > 1
			? text.eitherCharacter(cell)
			: cell;

function headline(field: ReadingField, typed: number): string {
	switch (field.outcome) {
		case 'contested':
			return '';
		case 'not_listed':
			return field.meaning ?? text.notListed;
		case 'not_used':
			return text.notUsed;
		case 'illegible':
			return field.from > typed ? text.notTyped : text.illegible;
		case 'found':
			return field.meaning ?? field.code;
	}
}

function placesOf(field: ReadingField, fields: readonly ReadingField[]): string {
	const parents = fields.filter(
		(own) => own.derived_from === undefined && field.derived_from?.includes(own.name)
	);
	const apart = parents.some((own, index) => index > 0 && own.from !== parents[index - 1]!.to + 1);
	return apart
		? text.placesApart(parents.map((own) => own.from))
		: placesInWords({ from: field.from, to: field.to });
}

function fieldView(field: ReadingField, fields: readonly ReadingField[], typed: number): FieldView {
	return {
		label: field.label,
		places: placesOf(field, fields),
		code: field.from > typed ? '' : field.code,
		outcome: field.outcome,
		mark: markOf(field),
		...(field.outcome === 'illegible' ? { word: text.unreadWord } : {}),
		sameRow: false,
		meaning: headline(field, typed),
		meaningIsCode: field.outcome === 'found' && (field.meaning ?? field.code) === field.code,
		detail: field.outcome === 'illegible' && field.from > typed ? '' : field.detail,
		why: field.strength_why,
		rows: field.rows,
		sources: ordered(field.sources),
		alternatives: field.alternatives.map(({ meaning, rows, sources }) => ({
			meaning,
			rows,
			sources: ordered(sources)
		})),
		possible: field.possible.map(({ values: _, ...possible }) => possible)
	};
}

/** Primary fields partition the characters; derived ones stand right after the last of their parents. */
function groupsOf(reading: AnsweredReading, normalised: string): GroupView[] {
	const cells = stampCells(normalised);
	const groups: (Omit<GroupView, 'derived'> & { derived: FieldView[] })[] = [];
	for (const field of reading.fields) {
		const view = fieldView(field, reading.fields, cells.length);
		if (field.derived_from !== undefined) {
			const parent = groups.at(-1);
			const own = field.rows.join() === parent?.field.rows.join() && field.outcome === 'found';
			parent?.derived.push({ ...view, sameRow: own });
			continue;
		}
		const own = Array.from(
			{ length: field.to - field.from + 1 },
			(_, offset): StampCell => cells[field.from - 1 + offset] ?? ''
		);
		const plain = own.every((cell) => cell.length === 1 && cell !== '?');
		groups.push({
			id: field.from === field.to ? `at-${field.from}` : `at-${field.from}-${field.to}`,
			line: field.line ?? null,
			from: field.from,
			to: field.to,
			cells: own,
			mark: view.mark,
			name: text.group(view.places, own.map(spoken).join(plain ? '' : ' '), field.label),
			field: view,
			derived: []
		});
	}
	return groups;
}

/** Least width of a column: its longest word must fit, two values need room, and much text reads better wider. */
function widthOf(group: GroupView): number {
	if (group.field.outcome === 'contested') return 220;
	const own = [group.field, ...group.derived];
	const longest = Math.max(
		...own.flatMap((field) => field.meaning.split(' ').map((word) => word.length))
	);
	const volume = Math.max(
		...own.map(
			({ meaning, detail, sources }) =>
				meaning.length * 2 + detail.length + (sources[0]?.title.length ?? 0)
		)
	);
	const roomy = volume > 260 ? 190 : volume > 90 ? 160 : volume > 45 ? 140 : 120;
	return Math.min(220, Math.max(roomy, Math.ceil((longest * 10.5 + 28) / 10) * 10));
}

function sourcesOf(reading: AnsweredReading): SourceView[] {
	const byKey = new Map<string, FieldSource & { labels: string[] }>();
	for (const field of reading.fields) {
		const all = [...field.sources, ...field.alternatives.flatMap(({ sources }) => sources)];
		for (const source of all) {
			const id = `${source.key} ${source.locator}`;
			const known = byKey.get(id);
			if (known === undefined) byKey.set(id, { ...source, labels: [field.label] });
			else if (!known.labels.includes(field.label)) known.labels.push(field.label);
		}
	}
	return [...byKey.values()].sort((a, b) => BY_KIND.indexOf(a.kind) - BY_KIND.indexOf(b.kind));
}

/** What a part is named by: the code of its engine or gearbox, or its casting number. */
const partOf = (reading: AnsweredReading): ReadingField | undefined =>
	reading.fields.find(({ name }) => name === 'unit_code' || name === 'casting_number');

/** A reading's title; a bare code is named by its field, a part by its code. */
export function titleOf(reading: AnsweredReading): string {
	const only = reading.layout === null ? reading.fields[0] : partOf(reading);
	if (only !== undefined) {
		const name = text.codeTitle(only.label, only.code);
		const told = only.outcome === 'found' && only.possible.length === 0;
		return told && only.meaning !== null ? `${name}: ${only.meaning}` : name;
	}
	return readingTitle(reading) ?? (reading.layout_title || text.untitled);
}

/** The layout's title, where it says more than the reading's own. */
export const layoutTitleOf = (reading: AnsweredReading): string =>
	reading.layout === null || reading.layout_title === titleOf(reading) ? '' : reading.layout_title;

/** The reading that is shown, whole. */
export function viewOf(reading: AnsweredReading, normalised: string): ReadingView {
	const groups = groupsOf(reading, normalised);
	return {
		title: titleOf(reading),
		why: reading.why,
		layoutTitle: layoutTitleOf(reading),
		partial: reading.state === 'partial',
		groups,
		layout: leaderLayout(
			groups.map((group) => ({ cells: group.to - group.from + 1, width: widthOf(group) }))
		),
		sources: sourcesOf(reading)
	};
}
