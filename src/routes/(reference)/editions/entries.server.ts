import { day } from '$lib/format/editions';
import { editionsText as text } from '$lib/text/en/editions';
import type { EditionHead } from '$lib/types';
import { rowCounts, type ChangeCounts } from './counts.server';

/** Editions on a page: each one that is new here costs a comparison. */
export const PAGE = 25;

export interface EditionEntryView {
	readonly number: number;
	readonly day: string;
	readonly cause: string;
	readonly digest: string;
	/** Null for the first edition. */
	readonly counts: ChangeCounts | null;
}

/** Heads of editions with what each changed, one after the other. @throws {DatabaseAwayError} */
export async function editionEntries(heads: readonly EditionHead[]): Promise<EditionEntryView[]> {
	const entries: EditionEntryView[] = [];
	for (const head of heads)
		entries.push({
			number: head.number,
			day: day(head.made_at),
			cause: text.cause[head.cause],
			digest: head.digest,
			counts: await rowCounts(head)
		});
	return entries;
}
