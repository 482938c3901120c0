/**
 * Three versions of one entry, cell by cell: what two sides made of the same base. Carries the cells of an overtaken
 * correction over, and undoes an accepted one without taking later work along. Pure.
 */
import type { ReferenceRow } from '../../types';
import {
	claimText,
	entryText,
	sourceText,
	valueText,
	type ContentChanges,
	type Entries,
	type RowEntry
} from '../reference';
import { changesOf } from './apply';

/** A cell that both sides changed, each in its way; undefined where a side does not have it. */
export interface Clash {
	readonly cell: string;
	readonly base: unknown;
	readonly mine: unknown;
	readonly theirs: unknown;
}
export interface Merged {
	readonly entry: RowEntry;
	/** Cells that could not be carried over; the entry has theirs. */
	readonly clashes: readonly Clash[];
}

const VALUE = 'values.';
const CITATION = 'citation ';

/** Facts stand in cells of their own, and so does each citation: it is there or not. */
function cellsOf({ row, citations }: RowEntry): Map<string, unknown> {
	const { values, ...fields } = row;
	const cells = new Map<string, unknown>(Object.entries(fields));
	for (const [fact, value] of Object.entries(values)) cells.set(VALUE + fact, value);
	for (const citation of citations) cells.set(CITATION + valueText(citation), citation);
	return cells;
}

function entryOf(cells: ReadonlyMap<string, unknown>): RowEntry {
	const fields: Record<string, unknown> = {};
	const values: Record<string, unknown> = {};
	const citations: unknown[] = [];
	for (const [cell, value] of cells)
		if (cell.startsWith(VALUE)) values[cell.slice(VALUE.length)] = value;
		else if (cell.startsWith(CITATION)) citations.push(value);
		else fields[cell] = value;
	return {
		row: { ...fields, values } as unknown as ReferenceRow,
		citations: citations as RowEntry['citations']
	};
}

/** What one side alone changed is taken; where both changed a cell to something else, theirs stays and the clash is told. */
export function mergeRows(base: RowEntry, mine: RowEntry, theirs: RowEntry): Merged {
	const [b, m, t] = [cellsOf(base), cellsOf(mine), cellsOf(theirs)];
	const cells = new Map<string, unknown>();
	const clashes: Clash[] = [];
	for (const cell of new Set([...t.keys(), ...m.keys(), ...b.keys()])) {
		const [was, my, their] = [b, m, t].map((side) => valueText(side.get(cell)));
		const taken = their === was ? m : t;
		if (my !== was && their !== was && my !== their)
			clashes.push({ cell, base: b.get(cell), mine: m.get(cell), theirs: t.get(cell) });
		if (taken.has(cell)) cells.set(cell, taken.get(cell));
	}
	return { entry: entryOf(cells), clashes };
}

export interface Undo {
	readonly changes: ContentChanges;
	readonly entries: Entries;
	/** What cannot be put back, because something was made of it later: entries by key, with the cells where there are any. */
	readonly kept: readonly { readonly entry: string; readonly clashes: readonly Clash[] }[];
}

interface Sides<T> {
	readonly before: ReadonlyMap<string, T>;
	readonly after: ReadonlyMap<string, T>;
	readonly now: ReadonlyMap<string, T>;
}

function undone<T>(
	{ before, after, now }: Sides<T>,
	textOf: (entry: T) => string,
	mergeLater: (key: string, was: T, made: T, today: T) => T
): { readonly entries: Map<string, T>; readonly stuck: readonly string[] } {
	const entries = new Map(now);
	const stuck: string[] = [];
	const text = (entry: T | undefined) => entry && textOf(entry);
	for (const key of new Set([...before.keys(), ...after.keys()])) {
		const [was, made, today] = [before.get(key), after.get(key), now.get(key)];
		if (text(was) === text(made) || text(today) === text(was)) continue;
		if (text(today) === text(made)) {
			if (was === undefined) entries.delete(key);
			else entries.set(key, was);
		} else if (was !== undefined && made !== undefined && today !== undefined)
			entries.set(key, mergeLater(key, was, made, today));
		else stuck.push(key);
	}
	return { entries, stuck };
}

/**
 * Entries that name only sources that are there: one that is still there today stays for them; where it was withdrawn
 * since, so go its citations and the claims that rest on it.
 * @returns them, and the keys of what could not be put back
 */
function standing(entries: Entries, today: Entries): { entries: Entries; kept: string[] } {
	const sources = new Map(entries.sources);
	const kept: string[] = [];
	const has = (key: string): boolean => {
		const source = today.sources.get(key);
		if (sources.has(key)) return true;
		if (source === undefined) return false;
		sources.set(key, source);
		kept.push(`source ${key}`);
		return true;
	};
	const rows = new Map(entries.rows);
	for (const [key, { row, citations }] of rows) {
		const left = citations.filter(({ source }) => has(source));
		if (left.length === citations.length) continue;
		rows.set(key, { row, citations: left });
		kept.push(`row ${key}`);
	}
	const claims = new Map(entries.claims);
	for (const [key, { source }] of claims)
		if (!has(source)) {
			claims.delete(key);
			kept.push(`claim ${key}`);
		}
	// Sources that come to stay are walked as well: one may itself repeat another.
	for (const [key, source] of sources)
		if (source.repeats !== null && !has(source.repeats)) {
			sources.set(key, { ...source, repeats: null });
			kept.push(`source ${key}`);
		}
	return { entries: { rows, sources, claims }, kept };
}

/**
 * Takes back what an edition made, and keeps what was made since.
 * @param before all entries before the edition that is undone
 * @param after all entries of that edition
 * @param now all entries as they stand
 */
export function undoOf(before: Entries, after: Entries, now: Entries): Undo {
	const kept: { entry: string; clashes: readonly Clash[] }[] = [];
	const whole =
		(kind: string) =>
		<T>(key: string, _was: T, _made: T, today: T): T => {
			kept.push({ entry: `${kind} ${key}`, clashes: [] });
			return today;
		};
	const sides = <K extends keyof Entries>(name: K) => ({
		before: before[name],
		after: after[name],
		now: now[name]
	});
	const rows = undone(sides('rows') as Sides<RowEntry>, entryText, (key, was, made, today) => {
		const { entry, clashes } = mergeRows(made, was, today);
		if (clashes.length > 0) kept.push({ entry: `row ${key}`, clashes });
		return entry;
	});
	type SourceSides = Sides<Entries['sources'] extends ReadonlyMap<string, infer S> ? S : never>;
	type ClaimSides = Sides<Entries['claims'] extends ReadonlyMap<string, infer C> ? C : never>;
	const sources = undone(sides('sources') as SourceSides, sourceText, whole('source'));
	const claims = undone(sides('claims') as ClaimSides, claimText, whole('claim'));
	for (const [kind, { stuck }] of Object.entries({ row: rows, source: sources, claim: claims }))
		for (const key of stuck) kept.push({ entry: `${kind} ${key}`, clashes: [] });
	const stands = standing(
		{ rows: rows.entries, sources: sources.entries, claims: claims.entries },
		now
	);
	const told = new Set(kept.map(({ entry }) => entry));
	for (const entry of new Set(stands.kept)) if (!told.has(entry)) kept.push({ entry, clashes: [] });
	return { changes: changesOf(now, stands.entries), entries: stands.entries, kept };
}
