import type { Database, Transaction } from '../db';
import { claims, referenceRows, sources, type RowEntry } from '../db/repositories';
import type { Entries } from './entries';

/** Rows read at once: a few milliseconds of work between two turns of the event loop. */
const PAGE = 250;

/**
 * Everything that an edition holds. An edition never changes, so that reading it page by page needs no
 * transaction; `transaction` is for one that is about to make the next.
 */
export async function entriesAt(
	database: Database,
	edition: number,
	transaction?: Transaction
): Promise<Entries> {
	const rows = new Map<string, RowEntry>();
	for (let after = ''; ;) {
		const page = await referenceRows.rowsAt(database, edition, {
			after,
			limit: PAGE,
			transaction
		});
		for (const { row, citations } of page) rows.set(row.row_key, { row, citations });
		const last = page.at(-1);
		if (last === undefined || page.length < PAGE) break;
		after = last.row.row_key;
	}
	const sourceList = await sources.sourcesAt(database, edition, transaction);
	const claimList = await claims.claimsAt(database, edition, transaction);
	return {
		rows,
		sources: new Map(sourceList.map(({ source }) => [source.key, source])),
		claims: new Map(claimList.map(({ claim }) => [claim.claim_key, claim]))
	};
}
