import type { Citation, Claim, EditionContent, Source } from '../../types';
import type { RowEntry } from '../db/repositories';
import { InvalidReleaseError } from './errors';

/** The content of an edition by key, rows with their citations. */
export interface Entries {
	readonly rows: ReadonlyMap<string, RowEntry>;
	readonly sources: ReadonlyMap<string, Source>;
	readonly claims: ReadonlyMap<string, Claim>;
}

export const NO_ENTRIES: Entries = { rows: new Map(), sources: new Map(), claims: new Map() };

function byKey<T>(what: string, items: readonly T[], keyOf: (item: T) => string): Map<string, T> {
	const map = new Map<string, T>();
	for (const item of items) {
		const key = keyOf(item);
		if (map.has(key)) throw new InvalidReleaseError(`Two ${what} have the key ${key}.`);
		map.set(key, item);
	}
	return map;
}

/**
 * Arranges content by key.
 * @throws {InvalidReleaseError} two entries of one key, a citation of no row, a source that is not there
 */
export function entriesOf(content: EditionContent): Entries {
	const cited = new Map<string, Citation[]>();
	for (const citation of content.citations) {
		const list = cited.get(citation.row_key);
		if (list) list.push(citation);
		else cited.set(citation.row_key, [citation]);
	}
	const entries = content.rows.map((row) => ({ row, citations: cited.get(row.row_key) ?? [] }));
	const rows = byKey('rows', entries, ({ row }) => row.row_key);
	for (const row_key of cited.keys())
		if (!rows.has(row_key))
			throw new InvalidReleaseError(`A citation is of the row ${row_key}, which is not there.`);
	const sources = byKey('sources', content.sources, ({ key }) => key);
	const claims = byKey('claims', content.claims, ({ claim_key }) => claim_key);
	for (const key of citedSources({ rows, sources, claims }))
		if (!sources.has(key))
			throw new InvalidReleaseError(`The source ${key} is cited and is not there.`);
	return { rows, sources, claims };
}

/** Keys of all sources that rows, claims and other sources name. */
export function citedSources({ rows, sources, claims }: Entries): Set<string> {
	const keys = new Set<string>();
	for (const { citations } of rows.values())
		for (const citation of citations) keys.add(citation.source);
	for (const claim of claims.values()) keys.add(claim.source);
	for (const { repeats } of sources.values()) if (repeats !== null) keys.add(repeats);
	return keys;
}

/** The content again, as lists. */
export const contentOfEntries = ({ rows, sources, claims }: Entries): EditionContent => ({
	rows: [...rows.values()].map(({ row }) => row),
	citations: [...rows.values()].flatMap(({ citations }) => citations),
	sources: [...sources.values()],
	claims: [...claims.values()]
});
