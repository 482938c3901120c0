import type { Transaction, WhereOptions } from 'sequelize';
import type { Source } from '../../../types';
import type { Database } from '../connection';
import type { SourceRecord } from '../models';
import { closeVersions, insertAll, lastVersions, liveAt, movedBetween } from './versions';

export interface SourceVersion {
	readonly source: Source;
	readonly edition_from: number;
	readonly edition_to: number | null;
}

async function versionsWhere(
	{ models }: Database,
	where: WhereOptions<SourceRecord>,
	transaction?: Transaction
): Promise<SourceVersion[]> {
	const records = (await models.sources.findAll({
		where,
		order: ['source_key', 'version'],
		raw: true,
		transaction
	})) as unknown as SourceRecord[];
	return records.map((record) => ({
		source: {
			key: record.source_key,
			title: record.title,
			publisher: record.publisher,
			year: record.year,
			kind: record.kind,
			seen_at: record.seen_at,
			licence: record.licence,
			repeats: record.repeats
		},
		edition_from: record.edition_from,
		edition_to: record.edition_to
	}));
}

/** The sources of an edition, by key. */
export const sourcesAt = (database: Database, edition: number, transaction?: Transaction) =>
	versionsWhere(database, liveAt(edition), transaction);

/** All versions of sources that began or ended after one edition and up to another. */
export const sourcesMoved = (database: Database, after: number, upTo: number) =>
	versionsWhere(database, movedBetween(after, upTo));

/** Withdraws sources: `edition` is the first without them. */
export const closeSources = (
	{ models }: Database,
	keys: readonly string[],
	edition: number,
	transaction: Transaction
): Promise<void> => closeVersions(models.sources, 'source_key', keys, edition, transaction);

/** Writes sources as new versions, live from `edition`; versions before them are ended. */
export async function putSources(
	database: Database,
	sources: readonly Source[],
	edition: number,
	transaction: Transaction
): Promise<void> {
	const model = database.models.sources;
	const keys = sources.map(({ key }) => key);
	const last = await lastVersions(model, 'source_key', keys, transaction);
	await closeSources(database, [...last.keys()], edition, transaction);
	await insertAll(
		model,
		sources.map(({ key, ...rest }) => ({
			...rest,
			source_key: key,
			version: (last.get(key) ?? 0) + 1,
			edition_from: edition,
			edition_to: null
		})),
		transaction
	);
}
