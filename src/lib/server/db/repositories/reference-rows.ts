import { Op, type Transaction, type WhereOptions } from 'sequelize';
import type { Citation, ReferenceRow } from '../../../types';
import type { Database } from '../connection';
import type { CitationRecord, ReferenceRowRecord } from '../models';
import { fromCell, toCell } from './scope-cell';
import { closeVersions, insertAll, lastVersions, liveAt, movedBetween } from './versions';

/** A row and what it rests on: they move together. */
export interface RowEntry {
	readonly row: ReferenceRow;
	readonly citations: readonly Citation[];
}
export interface RowVersion extends RowEntry {
	readonly version: number;
	readonly edition_from: number;
	/** The first edition that no longer holds this version; null while it is live. */
	readonly edition_to: number | null;
}

function toRecord(row: ReferenceRow, version: number, edition: number): ReferenceRowRecord {
	const { table, division, line, body, engine, plant, market, ...rest } = row;
	return {
		...rest,
		table_name: table,
		division: toCell(division),
		line: toCell(line),
		body: toCell(body),
		engine: toCell(engine),
		plant: toCell(plant),
		market: toCell(market),
		version,
		edition_from: edition,
		edition_to: null
	};
}

const toRow = (record: ReferenceRowRecord): ReferenceRow => ({
	row_key: record.row_key,
	maker: record.maker,
	table: record.table_name,
	division: fromCell(record.division),
	line: fromCell(record.line),
	body: fromCell(record.body),
	engine: fromCell(record.engine),
	plant: fromCell(record.plant),
	market: fromCell(record.market),
	years_from: record.years_from,
	years_to: record.years_to,
	code: record.code,
	meaning: record.meaning,
	values: { ...record.values },
	note: record.note
});

function toCitation(record: CitationRecord): Citation {
	const { row_key, source, stance, read, locator, quotation, seen_on } = record;
	return { row_key, source, stance, read, locator, quotation, seen_on };
}

/** Versions that meet a condition, by key and version, with their citations. */
async function versionsWhere(
	{ models }: Database,
	where: WhereOptions<ReferenceRowRecord>,
	options: { transaction?: Transaction; limit?: number }
): Promise<RowVersion[]> {
	const records = (await models.referenceRows.findAll({
		where,
		order: ['row_key', 'version'],
		raw: true,
		...options
	})) as unknown as ReferenceRowRecord[];
	const first = records[0];
	const last = records.at(-1);
	if (!first || !last) return [];
	const citations = (await models.citations.findAll({
		where: {
			row_key:
				records.length > 200
					? { [Op.between]: [first.row_key, last.row_key] }
					: records.map(({ row_key }) => row_key)
		},
		order: ['row_key', 'version', 'position'],
		raw: true,
		transaction: options.transaction
	})) as unknown as CitationRecord[];
	const cited = new Map<string, Citation[]>();
	for (const record of citations) {
		const id = `${record.row_key} ${record.version}`;
		const list = cited.get(id);
		if (list) list.push(toCitation(record));
		else cited.set(id, [toCitation(record)]);
	}
	return records.map((record) => ({
		row: toRow(record),
		citations: cited.get(`${record.row_key} ${record.version}`) ?? [],
		version: record.version,
		edition_from: record.edition_from,
		edition_to: record.edition_to
	}));
}

/** The next rows of an edition after a key, by key: at most `limit`. */
export const rowsAt = (
	database: Database,
	edition: number,
	page: { after: string; limit: number; transaction?: Transaction }
): Promise<RowVersion[]> => {
	const { after, ...options } = page;
	return versionsWhere(database, { ...liveAt(edition), row_key: { [Op.gt]: after } }, options);
};

/** All versions of rows that began or ended after one edition and up to another. */
export const rowsMoved = (database: Database, after: number, upTo: number): Promise<RowVersion[]> =>
	versionsWhere(database, movedBetween(after, upTo), {});

/** Every version of a row, first to last; none when there never was such a row. */
export const rowVersions = (database: Database, row_key: string): Promise<RowVersion[]> =>
	versionsWhere(database, { row_key }, {});

/** Retires rows: `edition` is the first without them. */
export const closeRows = (
	{ models }: Database,
	keys: readonly string[],
	edition: number,
	transaction: Transaction
): Promise<void> => closeVersions(models.referenceRows, 'row_key', keys, edition, transaction);

/** Writes rows as new versions, live from `edition`; versions before them are ended. */
export async function putRows(
	database: Database,
	entries: readonly RowEntry[],
	edition: number,
	transaction: Transaction
): Promise<void> {
	const { models } = database;
	const keys = entries.map(({ row }) => row.row_key);
	const last = await lastVersions(models.referenceRows, 'row_key', keys, transaction);
	await closeRows(database, [...last.keys()], edition, transaction);
	const versionOf = (row_key: string) => (last.get(row_key) ?? 0) + 1;
	await insertAll(
		models.referenceRows,
		entries.map(({ row }) => toRecord(row, versionOf(row.row_key), edition)),
		transaction
	);
	await insertAll(
		models.citations,
		entries.flatMap(({ row, citations }) =>
			citations.map((citation, position) => ({
				...citation,
				version: versionOf(row.row_key),
				position
			}))
		),
		transaction
	);
}
