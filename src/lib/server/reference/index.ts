/**
 * The reference data: numbered editions of all code tables. The current edition sits compiled in memory
 * and needs no database to be read; everything that looks back into history asks the database.
 */
import { tableId, type CompiledRow, type CompiledTable, type TableSet } from '../../decoder';
import type { EditionContent, EditionHead, Maker, PublishedExamples, TableName } from '../../types';
import { asking, connect, type Database } from '../db';
import { editions as heads, type RowVersion } from '../db/repositories';
import type { CompiledEdition } from './compiled-editions';
import { entriesAt } from './content';
import { CurrentEdition, type ReferenceStatus, type WatchOptions } from './current';
import {
	differenceBetween,
	headOf,
	headsBelow,
	historyOf,
	type EditionDifference
} from './editions';
import { contentOfEntries } from './entries';
import { NoTablesYetError, UnknownRowError } from './errors';
import examples from './published-examples.json';

export type { RowEntry, RowVersion } from '../db/repositories';
export { claimText, entryText, sourceText, valueText } from './canonical';
export type { CompiledEdition } from './compiled-editions';
export { coverage, type Coverage, type CoverageCell, type DivisionCoverage } from './coverage';
export type { ReferenceStatus, WatchEvent, WatchOptions } from './current';
export type { Difference, EditionDifference } from './editions';
export {
	DatabaseAwayError,
	InvalidReleaseError,
	NoTablesYetError,
	ServiceBusyError,
	UnknownEditionError,
	UnknownRowError,
	UnknownSourceError
} from './errors';
export type { Entries } from './entries';
export { loadRelease, type LoadReport } from './load';
export type { Changes, ContentChanges } from './merge';
export { searchRows, tablesInOrder, type RowFilters, type RowPage } from './search';
export {
	sourcesList,
	sourceWithRows,
	type CitingRow,
	type CountedSource,
	type SourceWithRows
} from './sources';

let running: { database: Database; edition: CurrentEdition } | null = null;

/**
 * Opens the database, loads the newest edition and watches for newer ones. Does not fail without a
 * database: `status` tells, and the tables come when it does.
 */
export async function start(databaseUrl: string, options: WatchOptions = {}): Promise<void> {
	await stop();
	const database = connect(databaseUrl);
	const edition = new CurrentEdition(database, options);
	running = { database, edition };
	await edition.start();
}

/** Stops watching and closes the pool. What was asked for before is still answered. */
export async function stop(): Promise<void> {
	const ended = running;
	running = null;
	await ended?.edition.stop();
	await ended?.database.close();
}

function started() {
	if (running === null) throw new NoTablesYetError();
	return running;
}

/** The edition that is read by now, from memory. @throws {NoTablesYetError} */
export const current = (): CompiledEdition => started().edition.get();

/** For health checks; answers before `start` and without a database too. */
export const status = (): ReferenceStatus =>
	running?.edition.status() ?? { tables: null, database: 'down' };

/** Looks for a newer edition at once, for whoever has just made one. */
export const refresh = (): Promise<void> => started().edition.look();

/**
 * An edition with its tables: from memory, or compiled, which takes its time.
 * @throws {UnknownEditionError} @throws {DatabaseAwayError} @throws {ServiceBusyError}
 */
export async function editionAt(number: number): Promise<CompiledEdition> {
	const { edition } = started();
	return number === edition.status().tables ? edition.get() : edition.compiled.get(number);
}

/** Heads of editions, newest first, beginning below a number when one is given. @throws {DatabaseAwayError} */
export const editions = (page: { below?: number; limit?: number } = {}): Promise<EditionHead[]> =>
	headsBelow(started().database, page.below ?? null, page.limit ?? 50);

/** @throws {UnknownEditionError} @throws {DatabaseAwayError} */
export const editionHead = (number: number): Promise<EditionHead> =>
	headOf(started().database, number);

/** Rows, sources and claims that `to` has added, changed and retired since `from`. */
export const compareEditions = (from: number, to: number): Promise<EditionDifference> =>
	differenceBetween(started().database, from, to);

/** Every version of a row, first to last. @throws {UnknownRowError} @throws {DatabaseAwayError} */
export const rowHistory = (row_key: string): Promise<RowVersion[]> =>
	historyOf(started().database, row_key);

/** One table of a maker; undefined when the edition has no row of it. */
export const tableOf = (
	tables: TableSet,
	maker: Maker,
	table: TableName
): CompiledTable | undefined => tables.tables.get(tableId(maker, table));

/** A row of an edition. @throws {UnknownRowError} */
export function rowOf(tables: TableSet, row_key: string): CompiledRow {
	const row = tables.rows.get(row_key);
	if (!row) throw new UnknownRowError(row_key);
	return row;
}

/**
 * The content of an edition, or of the newest, as it stands in the database: for an export.
 * @throws {NoTablesYetError} there is no edition @throws {UnknownEditionError} @throws {DatabaseAwayError}
 */
export async function contentOf(
	database: Database,
	number?: number
): Promise<{ head: EditionHead; content: EditionContent }> {
	const asked = number ?? (await asking(() => heads.newestEdition(database)));
	if (asked === null) throw new NoTablesYetError();
	const head = await headOf(database, asked);
	return { head, content: contentOfEntries(await asking(() => entriesAt(database, asked))) };
}

/** Worked examples of published pages, as `npm run data:examples` counted them. */
export const PUBLISHED_EXAMPLES = examples as PublishedExamples;
