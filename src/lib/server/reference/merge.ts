/** The three-way merge of a new release with what corrections made of the last one. Pure. */
import type { Claim, Source } from '../../types';
import type { ReleaseConflict, RowEntry } from '../db/repositories';
import { claimText, entryText, sourceText } from './canonical';
import { citedSources, type Entries } from './entries';

/** Entries to write and keys to retire. */
export interface Changes<T> {
	readonly put: T[];
	readonly retire: string[];
}
export interface ContentChanges {
	readonly rows: Changes<RowEntry>;
	readonly sources: Changes<Source>;
	readonly claims: Changes<Claim>;
}
export interface Merge {
	/** What the release changes here. */
	readonly changes: ContentChanges;
	/** What it could not change, because a correction had. */
	readonly conflicts: readonly ReleaseConflict[];
	/** All entries as they then stand. */
	readonly merged: Entries;
}

type Sides<T> = { readonly [side in 'base' | 'theirs' | 'ours']: ReadonlyMap<string, T> };
interface Part<T> {
	readonly changes: Changes<T>;
	readonly merged: Map<string, T>;
	readonly conflicts: ReleaseConflict[];
}

/** Why both sides cannot be had, given that they differ from the base and from each other. */
function reasonOf<T>(base?: T, theirs?: T, ours?: T): ReleaseConflict['reason'] {
	if (base === undefined) return 'added_in_both';
	if (ours === undefined) return 'retired_here';
	return theirs === undefined ? 'retired_in_release' : 'changed_in_both';
}

/** Merges one sort of entry, key by key: what the release alone changed is taken, all else stays. */
function mergePart<T>(
	kind: ReleaseConflict['kind'],
	sides: Sides<T>,
	textOf: (entry: T) => string
): Part<T> {
	const text = (entry: T | undefined) => entry && textOf(entry);
	const merged = new Map(sides.ours);
	const changes: Changes<T> = { put: [], retire: [] };
	const conflicts: ReleaseConflict[] = [];
	for (const key of new Set([...sides.base.keys(), ...sides.theirs.keys()])) {
		const base = sides.base.get(key);
		const theirs = sides.theirs.get(key);
		const ours = sides.ours.get(key);
		const released = text(theirs);
		if (released === text(base) || released === text(ours)) continue;
		if (text(ours) !== text(base)) {
			conflicts.push({
				kind,
				entry_key: key,
				reason: reasonOf(base, theirs, ours),
				base: base ?? null,
				theirs: theirs ?? null,
				ours: ours ?? null
			});
		} else if (theirs === undefined) {
			changes.retire.push(key);
			merged.delete(key);
		} else {
			changes.put.push(theirs);
			merged.set(key, theirs);
		}
	}
	return { changes, merged, conflicts };
}

/** A source that the release retires stays as long as something that stands here cites it. */
function keepCitedSources(part: Part<Source>, sides: Sides<Source>, merged: Entries): Part<Source> {
	const kept = new Map(part.merged);
	const keptConflicts: ReleaseConflict[] = [];
	const retired = new Set(part.changes.retire);
	// A source that is kept may itself repeat another one.
	for (let found = true; found;) {
		found = false;
		for (const key of citedSources({ ...merged, sources: kept })) {
			const source = sides.ours.get(key);
			if (!source || !retired.delete(key)) continue;
			kept.set(key, source);
			found = true;
			keptConflicts.push({
				kind: 'source',
				entry_key: key,
				reason: 'still_cited',
				base: sides.base.get(key) ?? null,
				theirs: null,
				ours: source
			});
		}
	}
	return {
		changes: { put: part.changes.put, retire: [...retired] },
		merged: kept,
		conflicts: [...part.conflicts, ...keptConflicts]
	};
}

/**
 * Merges a release into the live entries.
 * @param base the last release that was loaded
 * @param theirs the new release
 * @param ours what is live
 */
export function mergeRelease(base: Entries, theirs: Entries, ours: Entries): Merge {
	const sides = <K extends keyof Entries>(name: K) => ({
		base: base[name],
		theirs: theirs[name],
		ours: ours[name]
	});
	const rows = mergePart('row', sides('rows') as Sides<RowEntry>, entryText);
	const claims = mergePart('claim', sides('claims') as Sides<Claim>, claimText);
	const released = mergePart('source', sides('sources') as Sides<Source>, sourceText);
	const sources = keepCitedSources(released, sides('sources') as Sides<Source>, {
		rows: rows.merged,
		claims: claims.merged,
		sources: released.merged
	});
	return {
		changes: { rows: rows.changes, sources: sources.changes, claims: claims.changes },
		conflicts: [...rows.conflicts, ...sources.conflicts, ...claims.conflicts],
		merged: { rows: rows.merged, sources: sources.merged, claims: claims.merged }
	};
}

/** Whether there is nothing to write. */
export const isEmpty = ({ rows, sources, claims }: ContentChanges): boolean =>
	[rows, sources, claims].every(({ put, retire }) => put.length === 0 && retire.length === 0);
