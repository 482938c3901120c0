/** The lines of a tag as the page shows them: what was typed, what it says, and how it stands to the serial. */
import type { Result } from '$lib/components/result/result';
import { readingAddress, rowAddress } from '$lib/format/addresses';
import { stampCells } from '$lib/format/stamp';
import { markOf, type LineMark } from '$lib/format/strength-line';
import { readingText } from '$lib/text/en/reading';
import type { AnsweredReading, Problem, ReadingField, TallyLine } from '$lib/types';

/** What a field comes to against the serial; only what needs a second look is said beside it. */
export type Doubt = Exclude<Result, 'tallies' | 'not_looked_at'>;

export interface TagField {
	readonly key: string;
	readonly label: string;
	readonly cells: readonly string[];
	readonly meaning: string;
	readonly note: string;
	readonly mark: LineMark;
	readonly unread: boolean;
	readonly rows: readonly string[];
	/** What else its characters say: parts of the serial number. */
	readonly also: readonly { readonly label: string; readonly meaning: string }[];
	readonly doubt: { readonly result: Doubt; readonly label: string } | null;
	/** Reading of the bare code, where no row or no field was found. */
	readonly lookUp: string | null;
}

export interface TagLine {
	/** As problems count: from the top, blank lines left out. Null for a blank one. */
	readonly number: number | null;
	readonly typed: string;
	readonly problems: readonly string[];
	readonly fields: readonly TagField[];
	/** Tokens of a line that no form takes, each with the address of its reading as a single code. */
	readonly tokens: readonly { readonly text: string; readonly address: string }[];
	/** Cells of the line for the drawing; a space where a divider stands. */
	readonly cells: readonly string[];
	/** Spans of `cells` under which a bar is drawn. */
	readonly bars: readonly { readonly from: number; readonly to: number; readonly result: Doubt }[];
}

export interface Scope {
	readonly maker: string;
	readonly year: string;
}

/** Sides that the tag takes in lines that need a second look: field label and code, and how it came out. */
export type Doubts = ReadonlyMap<string, { readonly result: Doubt; readonly label: string }>;
export const doubtKey = (label: string, code: string): string => `${label}\n${code}`;

/** @param tag index of the tag among the stamps */
export function doubtsOf(lines: readonly TallyLine[], tag: number): Doubts {
	const doubts = new Map<string, { result: Doubt; label: string }>();
	for (const { result, left, right } of lines) {
		if (right === null || left.stamp === right.stamp) continue;
		if (result !== 'does_not_tally' && result !== 'cannot_be_told') continue;
		const own = left.stamp === tag ? left : right;
		const key = doubtKey(own.label, own.code);
		if (own.code !== '' && doubts.get(key)?.result !== 'does_not_tally')
			doubts.set(key, { result, label: own.label });
	}
	return doubts;
}

const codeAddress = (text: string, { maker, year }: Scope): string =>
	readingAddress({ kind: 'code', text, maker, year });

function headline(field: ReadingField): string {
	if (field.outcome === 'contested')
		return field.alternatives.map(({ meaning }) => meaning).join(` ${readingText.or}`);
	if (field.outcome === 'illegible') return readingText.illegible;
	if (field.outcome === 'not_used') return readingText.notUsed;
	if (field.outcome === 'not_listed') return field.meaning ?? readingText.notListed;
	return field.meaning ?? field.code;
}

const isDerived = ({ derived_from }: ReadingField): boolean => derived_from !== undefined;
const within = (parent: ReadingField, field: ReadingField): boolean =>
	isDerived(field) && field.from === parent.from && field.to === parent.to;

function fieldView(
	field: ReadingField,
	reading: AnsweredReading,
	cells: readonly string[],
	doubts: Doubts,
	scope: Scope
): TagField {
	const also = reading.fields.filter((own) => within(field, own));
	const doubt = [field, ...also]
		.map(({ label, code }) => doubts.get(doubtKey(label, code)))
		.filter((one) => one !== undefined)
		.sort((a, b) => b.result.localeCompare(a.result))[0];
	const lost = field.outcome === 'not_listed' || field.name === 'unknown';
	return {
		key: `${field.from}-${field.to}`,
		label: field.label,
		cells: cells.slice(field.from - 1, field.to),
		meaning: headline(field),
		note: field.outcome === 'found' ? '' : field.detail,
		mark: markOf(field),
		unread: field.outcome === 'illegible',
		rows: field.rows.map(rowAddress),
		also: also.map((own) => ({ label: own.label, meaning: headline(own) })),
		doubt: doubt ?? null,
		lookUp: lost ? codeAddress(field.code, scope) : null
	};
}

/** Where each line begins in the cells of the whole text: lines are joined by " / ". */
function startsOf(cells: readonly string[]): number[] {
	const starts = [0];
	for (let at = 1; at < cells.length - 1; at += 1)
		if (cells[at] === '/' && cells[at - 1] === ' ' && cells[at + 1] === ' ') starts.push(at + 2);
	return starts;
}

interface Told {
	readonly typed: readonly string[];
	/** Which of the typed lines hold a character. */
	readonly numbers: readonly (number | null)[];
	readonly normalised: string;
	readonly reading: AnsweredReading | undefined;
	readonly problems: readonly Problem[];
	readonly doubts: Doubts;
	readonly scope: Scope;
}

/** Every typed line, in its place; nothing that was typed is left out. */
export function tagLines(told: Told): TagLine[] {
	const { typed, numbers, normalised, reading, problems, doubts, scope } = told;
	const cells = stampCells(normalised);
	const starts = startsOf(cells);
	return typed.map((text, index) => {
		const number = numbers[index] ?? null;
		const own = problems.filter((problem) => number !== null && problem.line === number);
		const start = number === null ? undefined : starts[number - 1];
		const end = number === null ? 0 : (starts[number] ?? cells.length + 3) - 3;
		const fields = (reading?.fields ?? []).filter(
			(field) => !isDerived(field) && (field.line ?? 1) === number
		);
		const views = fields.map((field) =>
			fieldView(field, reading as AnsweredReading, cells, doubts, scope)
		);
		const kept = start === undefined ? [] : cells.slice(start, end);
		return {
			number,
			typed: text,
			problems: own.map(({ message }) => message),
			fields: views,
			tokens:
				views.length > 0
					? []
					: tokensOf(kept).map((token) => ({ text: token, address: codeAddress(token, scope) })),
			cells: kept,
			bars: fields.flatMap((field, at) => {
				const doubt = views[at]?.doubt;
				return doubt && start !== undefined
					? [{ from: field.from - 1 - start, to: field.to - start, result: doubt.result }]
					: [];
			})
		};
	});
}

/** Tokens as they would be typed again. */
const tokensOf = (cells: readonly string[]): string[] =>
	cells
		.map((cell) => (cell.length > 1 ? `[${cell}]` : cell))
		.join('')
		.split(' ')
		.filter((token) => token !== '');
