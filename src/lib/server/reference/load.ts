import { gunzipSync, gzipSync } from 'node:zlib';
import type { EditionContent } from '../../types';
import { inTransaction, type Database } from '../db';
import { editions, releases, type ReleaseConflict } from '../db/repositories';
import { entriesAt } from './content';
import { digestOf } from './digest';
import { contentOfEntries, entriesOf, NO_ENTRIES, type Entries } from './entries';
import { isEmpty, mergeRelease } from './merge';
import { writeEdition } from './write-edition';

export interface LoadReport {
	/** False when this release was the last one loaded already. */
	readonly loaded: boolean;
	/** The newest edition now. */
	readonly edition: number;
	/** The release's digest. */
	readonly digest: string;
	/** Rows, sources and claims written and retired. */
	readonly written: number;
	readonly retired: number;
	/** What a correction made here had changed as well: it stays, and moderators are shown both. */
	readonly conflicts: readonly ReleaseConflict[];
}

/** The stored form keeps the base of the next merge whole: live rows alone could not tell it. */
const pack = (entries: Entries): Buffer => gzipSync(JSON.stringify(contentOfEntries(entries)));
const unpack = (content: Buffer): Entries =>
	entriesOf(JSON.parse(gunzipSync(content).toString('utf8')) as EditionContent);

/**
 * Loads a release: the first one becomes edition 1, a later one is merged with what corrections made of
 * the last. Does nothing when it was the last one loaded. Processes that load at once wait for each other,
 * and the second finds the work done.
 * @throws {InvalidReleaseError}
 * @throws {DatabaseAwayError}
 */
export async function loadRelease(
	database: Database,
	release: EditionContent,
	now: () => Date = () => new Date()
): Promise<LoadReport> {
	const theirs = entriesOf(release);
	const digest = digestOf(theirs);
	return inTransaction(database, async (transaction) => {
		const newest = await editions.lockNewestEdition(database, transaction);
		const last = await releases.lastLoad(database, transaction);
		if (last?.digest === digest)
			return { loaded: false, edition: newest, digest, written: 0, retired: 0, conflicts: [] };
		const base = last
			? unpack(await releases.loadContent(database, last.number, transaction))
			: NO_ENTRIES;
		const ours = newest === 0 ? NO_ENTRIES : await entriesAt(database, newest, transaction);
		const { changes, conflicts, merged } = mergeRelease(base, theirs, ours);
		const load = (last?.number ?? 0) + 1;
		const made_at = now();
		const edition =
			newest > 0 && isEmpty(changes)
				? newest
				: await writeEdition(
						database,
						{
							after: newest,
							cause: 'release',
							cause_id: String(load),
							credits: null,
							changes,
							entries: merged,
							made_at
						},
						transaction
					);
		await releases.addLoad(
			database,
			{ number: load, edition, digest, content: pack(theirs), loaded_at: made_at },
			conflicts,
			transaction
		);
		const all = Object.values(changes);
		return {
			loaded: true,
			edition,
			digest,
			written: all.reduce((sum, { put }) => sum + put.length, 0),
			retired: all.reduce((sum, { retire }) => sum + retire.length, 0),
			conflicts
		};
	});
}
