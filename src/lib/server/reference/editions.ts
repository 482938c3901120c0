import type { Claim, EditionHead, Source } from '../../types';
import { asking, type Database } from '../db';
import {
	claims,
	editions as heads,
	referenceRows,
	sources,
	type RowEntry,
	type RowVersion
} from '../db/repositories';
import { claimText, entryText, sourceText } from './canonical';
import { UnknownEditionError, UnknownRowError } from './errors';

/** What one edition has and another has not, or has otherwise. Each list is by key. */
export interface Difference<T> {
	readonly added: readonly T[];
	readonly changed: readonly { readonly old: T; readonly new: T }[];
	readonly retired: readonly T[];
}
export interface EditionDifference {
	readonly from: EditionHead;
	readonly to: EditionHead;
	readonly rows: Difference<RowEntry>;
	readonly sources: Difference<Source>;
	readonly claims: Difference<Claim>;
}

/**
 * The head of an edition.
 * @throws {UnknownEditionError} @throws {DatabaseAwayError}
 */
export async function headOf(database: Database, number: number): Promise<EditionHead> {
	const found =
		Number.isSafeInteger(number) && number > 0 && number < 2 ** 32
			? await asking(() => heads.editionHead(database, number))
			: null;
	if (found === null) throw new UnknownEditionError(number);
	return found;
}

/** Heads below a number, newest first; from the newest when it is null. */
export const headsBelow = (database: Database, below: number | null, limit: number) =>
	asking(() => heads.editionHeads(database, { below, limit }));

/** Every version of a row, first to last. @throws {UnknownRowError} @throws {DatabaseAwayError} */
export async function historyOf(database: Database, row_key: string): Promise<RowVersion[]> {
	const versions = await asking(() => referenceRows.rowVersions(database, row_key));
	if (versions.length === 0) throw new UnknownRowError(row_key);
	return versions;
}

interface Span {
	readonly edition_from: number;
	readonly edition_to: number | null;
}

/** Tells what moved between two editions from the versions that began or ended between them. */
function differenceOf<V extends Span, T>(
	versions: readonly V[],
	[from, to]: readonly [number, number],
	entryOf: (version: V) => T,
	keyOf: (entry: T) => string,
	textOf: (entry: T) => string
): Difference<T> {
	const holds = (edition: number) =>
		new Map(
			versions
				.filter((one) => one.edition_from <= edition && (one.edition_to ?? Infinity) > edition)
				.map((one) => [keyOf(entryOf(one)), entryOf(one)])
		);
	const before = holds(from);
	const after = holds(to);
	const added: T[] = [];
	const changed: { old: T; new: T }[] = [];
	for (const [key, entry] of after) {
		const old = before.get(key);
		if (old === undefined) added.push(entry);
		else if (textOf(old) !== textOf(entry)) changed.push({ old, new: entry });
	}
	const retired = [...before].filter(([key]) => !after.has(key)).map(([, entry]) => entry);
	return { added, changed, retired };
}

/**
 * What `to` has that `from` has not, or has otherwise; either may be the newer.
 * @throws {UnknownEditionError} @throws {DatabaseAwayError}
 */
export async function differenceBetween(
	database: Database,
	from: number,
	to: number
): Promise<EditionDifference> {
	const [fromHead, toHead] = [await headOf(database, from), await headOf(database, to)];
	const older = Math.min(from, to);
	const newer = Math.max(from, to);
	const [rows, works, claimVersions] = await asking(() =>
		Promise.all([
			referenceRows.rowsMoved(database, older, newer),
			sources.sourcesMoved(database, older, newer),
			claims.claimsMoved(database, older, newer)
		])
	);
	const span = [from, to] as const;
	return {
		from: fromHead,
		to: toHead,
		rows: differenceOf(
			rows,
			span,
			({ row, citations }): RowEntry => ({ row, citations }),
			({ row }) => row.row_key,
			entryText
		),
		sources: differenceOf(
			works,
			span,
			({ source }) => source,
			({ key }) => key,
			sourceText
		),
		claims: differenceOf(
			claimVersions,
			span,
			({ claim }) => claim,
			({ claim_key }) => claim_key,
			claimText
		)
	};
}
