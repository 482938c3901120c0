/** What the page of a row shows. */
import { day } from '$lib/format/editions';
import { log } from '$lib/server/log';
import {
	current,
	DatabaseAwayError,
	editionAt,
	rowHistory,
	rowOf,
	type CompiledEdition,
	type RowVersion
} from '$lib/server/reference';
import { historyView } from './history';
import { rowView } from './row-view';

interface Found {
	readonly edition: CompiledEdition;
	/** The edition that retired the row; null while it is in the tables. */
	readonly retired: number | null;
}

/**
 * The edition that shows a row: the one asked for, the present one, or for a row that is gone the last
 * that had it.
 * @throws {UnknownRowError} @throws what `editionAt` throws
 */
async function editionOf(
	row_key: string,
	asked: number | undefined,
	versions: readonly RowVersion[] | null
): Promise<Found> {
	const edition = asked === undefined ? current() : await editionAt(asked);
	const last = versions?.at(-1)?.edition_to ?? null;
	const isGone = asked === undefined && last !== null && last <= edition.head.number;
	if (isGone && !edition.tables.rows.has(row_key))
		return { edition: await editionAt(last - 1), retired: last };
	return { edition, retired: null };
}

/** All versions of a row; null when the database is away, which the page says. */
async function versionsOf(row_key: string, requestId: string): Promise<RowVersion[] | null> {
	try {
		return await rowHistory(row_key);
	} catch (error) {
		if (!(error instanceof DatabaseAwayError)) throw error;
		log().warn({ err: error, request_id: requestId }, 'history_without_database');
		return null;
	}
}

/**
 * The row, what it rests on, what contradicts it, and what it was before.
 * @throws {UnknownRowError} @throws what `editionAt` throws
 */
export async function rowPage(row_key: string, asked: number | undefined, requestId: string) {
	const versions = await versionsOf(row_key, requestId);
	const { edition, retired } = await editionOf(row_key, asked, versions);
	const { tables, head } = edition;
	const row = rowOf(tables, row_key);
	const titleOf = (key: string): string => tables.sources.get(key)?.title ?? key;
	return {
		row: rowView(row, tables),
		contested: row.contested_by.flatMap((key) => {
			const other = tables.rows.get(key);
			return other ? [rowView(other, tables)] : [];
		}),
		history: versions && historyView(versions, titleOf),
		requestId,
		retired,
		edition: { number: head.number, day: day(head.made_at), digest: head.digest },
		present: current().head.number
	};
}
