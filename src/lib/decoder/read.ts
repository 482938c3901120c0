/** Reads one stamp against one edition. */
import type { Problem, ReadContext, Reading, ReadResult, StampKind } from '../types';
import { isRead, normalise, type Cell, type Characters } from './engine/characters';
import { fits } from './engine/fit';
import type { PrimaryField } from './engine/layout';
import type { PreparedLayout } from './engine/plan';
import {
	bareSequence,
	checkDigitOffers,
	foreignLetters,
	lookAlikes,
	misfit
} from './engine/problems';
import { ranked } from './engine/ranking';
import { draftsOf, hasRow, type Draft } from './engine/reading';
import type { TableSet } from './engine/table-set';
import { readCode } from './code-reading';
import { PREPARED } from './layouts';

export interface ReadRequest {
	/** As typed; see `examineText` for what cannot be read at all. */
	readonly text: string;
	/** Left out: every kind that fits. */
	readonly kind?: StampKind;
	readonly context?: ReadContext;
	/** Whether fields carry the questions that they put to the tables. */
	readonly lookups?: boolean;
	/** The layouts to try: those of the product when left out. */
	readonly layouts?: readonly PreparedLayout[];
}

/** Shortest serial; what is shorter is read as a beginning. */
const shortest = (layouts: readonly PreparedLayout[]): number =>
	layouts === PREPARED ? SHORTEST : lengthOfShortest(layouts);
const lengthOfShortest = (layouts: readonly PreparedLayout[]): number =>
	Math.min(...layouts.map(({ layout }) => layout.length));
const SHORTEST = lengthOfShortest(PREPARED);
/** Up to so many characters, a text without a kind is first taken as a bare code. */
const LIKELY_CODE = 3;

export interface Candidate {
	readonly prepared: PreparedLayout;
	readonly years: readonly (number | null)[];
}

/**
 * The layouts and model years that a serial may be. Unread places give more of them, never fewer:
 * the set for a marked text contains that of every text it stands for.
 */
export function candidatesOf(
	cells: readonly Cell[],
	layouts: readonly PreparedLayout[] = PREPARED
): Candidate[] {
	const partial = cells.length < shortest(layouts);
	const found: Candidate[] = [];
	for (const own of layouts) {
		if (partial ? cells.length > own.layout.length : cells.length !== own.layout.length) continue;
		if (!fits(own, cells)) continue;
		const missing = own.layout.length - cells.length;
		const whole = missing > 0 ? [...cells, ...Array<Cell>(missing).fill('?')] : cells;
		const open = missing > 0 && own.layout.beginsWithoutYear === true;
		const years = open ? [null] : own.layout.yearsOf(whole);
		if (years.length > 0) found.push({ prepared: own, years });
	}
	return found;
}

interface Serial {
	readonly readings: readonly Reading[];
	readonly more: number;
	readonly problems: readonly Problem[];
}

function firstProblems(
	reading: Reading,
	candidate: Candidate,
	cells: readonly Cell[],
	tables: TableSet,
	context: ReadContext
): Problem[] {
	const { prepared } = candidate;
	if (cells.length !== prepared.layout.length) return [];
	const meaning = (index: number, other: readonly Cell[]): string | null => {
		const { from } = prepared.layout.fields[index] as PrimaryField;
		for (const year of prepared.layout.yearsOf(other))
			if (year === reading.model_year)
				for (const draft of draftsOf(prepared, other, year, tables, context)) {
					const own = draft.results.find(({ field, counts }) => field.from === from && counts);
					if (own !== undefined) return own.field.meaning;
				}
		return null;
	};
	const has = (index: number, other: readonly Cell[]): boolean =>
		hasRow(prepared, index, other, tables);
	const check = prepared.layout.length === 17 ? checkDigitOffers(prepared, cells) : null;
	return [
		...lookAlikes(reading, prepared, cells, { hasRow: has, meaning }),
		...(check === null ? [] : [check])
	];
}

function readSerial(
	characters: Characters,
	tables: TableSet,
	context: ReadContext,
	lookups: boolean,
	layouts: readonly PreparedLayout[]
): Serial {
	const { cells } = characters;
	const candidates = candidatesOf(cells, layouts);
	const drafts: Draft[] = [];
	const whole = cells.every(isRead) ? characters.normalised : '';
	for (const { prepared, years } of candidates)
		for (const year of years) {
			const plain = whole.length === prepared.layout.length ? whole : null;
			for (const draft of draftsOf(prepared, cells, year, tables, context, plain))
				drafts.push(draft);
		}
	const { readings, more } = ranked(drafts, context, lookups);
	const [first] = readings;
	if (first === undefined) return { readings, more, problems: [misfit(layouts, cells)] };
	const own = candidates.find(({ prepared }) => prepared.layout.id === first.layout) as Candidate;
	const bare = bareSequence(layouts, cells);
	return {
		readings,
		more,
		problems: [
			...(bare === null ? [] : [bare]),
			...firstProblems(first, own, cells, tables, context)
		]
	};
}

/**
 * Reads a stamp. Never throws: a text of which nothing can be read gives no readings and a problem.
 * The result depends on the tables and the request alone; the order of rows makes no difference.
 * @example read(tables, { text: 'RM23N0Gxxxxxx' }).readings[0]?.model_year // 1970
 */
export function read(tables: TableSet, request: ReadRequest): ReadResult {
	const { text, kind, context = {}, lookups = false, layouts = PREPARED } = request;
	const characters = normalise(text);
	const { normalised, cells } = characters;
	const input = (own: StampKind | null) => ({ kind: own, text, normalised });
	if (cells.length === 0)
		return { input: input(kind ?? null), readings: [], more: 0, problems: [] };
	const foreign = normalised === text ? [] : foreignLetters(text, characters);
	const asCode =
		kind === 'code' || (kind === undefined && cells.length < shortest(layouts))
			? readCode(characters, tables, context, lookups)
			: null;
	if (kind === 'code' && asCode !== null)
		return { input: input('code'), ...asCode, problems: [...foreign, ...asCode.problems] };
	const serial = readSerial(characters, tables, context, lookups, layouts);
	if (asCode === null || asCode.readings.length === 0)
		return { input: input('serial'), ...serial, problems: [...foreign, ...serial.problems] };
	const codeFirst = cells.length <= LIKELY_CODE || serial.readings.length === 0;
	const [one, two] = codeFirst ? [asCode, serial] : [serial, asCode];
	const all = [...one.readings, ...two.readings].map((reading, index) =>
		index < one.readings.length ? reading : { ...reading, rank: reading.rank + one.readings.length }
	);
	return {
		input: input(codeFirst ? 'code' : 'serial'),
		readings: all.slice(0, 24),
		more: one.more + two.more + Math.max(0, all.length - 24),
		problems: [...foreign, ...one.problems]
	};
}
