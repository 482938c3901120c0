/** Reads a serial number through the layouts that it fits. */
import type { Problem, ReadContext, Reading } from '../types';
import { isRead, type Cell, type Characters } from './engine/characters';
import { fits } from './engine/fit';
import type { PrimaryField } from './engine/layout';
import type { PreparedLayout } from './engine/plan';
import { bareSequence, checkDigitOffers, lookAlikes, misfit } from './engine/problems';
import { ranked } from './engine/ranking';
import { draftsOf, hasRow, type Draft } from './engine/reading';
import type { TableSet } from './engine/table-set';
import { PREPARED } from './layouts';

/** Shortest serial; what is shorter is read as a beginning. */
export const shortest = (layouts: readonly PreparedLayout[]): number =>
	layouts === PREPARED ? SHORTEST : lengthOfShortest(layouts);
const lengthOfShortest = (layouts: readonly PreparedLayout[]): number =>
	Math.min(...layouts.map(({ layout }) => layout.length));
const SHORTEST = lengthOfShortest(PREPARED);
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

export interface SerialResult {
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

/** Reads a serial, or its beginning. */
export function readSerial(
	characters: Characters,
	tables: TableSet,
	context: ReadContext,
	lookups: boolean,
	layouts: readonly PreparedLayout[]
): SerialResult {
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
