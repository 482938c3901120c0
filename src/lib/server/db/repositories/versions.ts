import { Op, QueryTypes, type Model, type ModelStatic, type Transaction } from 'sequelize';
import type { Versioned } from '../models';

/** Rows of one INSERT and keys of one IN: far below the largest packet, and quick to escape. */
const CHUNK = 1000;

function* chunks<T>(items: readonly T[]): Generator<T[]> {
	for (let at = 0; at < items.length; at += CHUNK) yield items.slice(at, at + CHUNK);
}

/** Where-condition for the versions that an edition holds. */
export const liveAt = (edition: number) => ({
	edition_from: { [Op.lte]: edition },
	[Op.or]: [{ edition_to: null }, { edition_to: { [Op.gt]: edition } }]
});

/** Where-condition for the versions that began or ended after one edition and up to another. */
export const movedBetween = (after: number, upTo: number) => ({
	[Op.or]: [
		{ edition_from: { [Op.gt]: after, [Op.lte]: upTo } },
		{ edition_to: { [Op.gt]: after, [Op.lte]: upTo } }
	]
});

/** Inserts in chunks, without making a model of each record. */
export async function insertAll<R extends object>(
	model: ModelStatic<Model<R, R>>,
	records: readonly R[],
	transaction: Transaction
): Promise<void> {
	const queryInterface = model.sequelize!.getQueryInterface();
	const columns = model.getAttributes();
	for (const chunk of chunks(records))
		await queryInterface.bulkInsert(model.tableName, chunk, { transaction }, columns);
}

/** Ends the live versions of some keys: `edition` is the first that no longer holds them. */
export async function closeVersions<R extends Versioned>(
	model: ModelStatic<Model<R, R>>,
	keyColumn: keyof R & string,
	keys: readonly string[],
	edition: number,
	transaction: Transaction
): Promise<void> {
	for (const chunk of chunks(keys))
		await model.update({ edition_to: edition } as never, {
			where: { [keyColumn]: chunk, edition_to: null } as never,
			transaction
		});
}

/** The last version that each of some keys ever had; a key that is new is missing. */
export async function lastVersions<R extends Versioned>(
	model: ModelStatic<Model<R, R>>,
	keyColumn: keyof R & string,
	keys: readonly string[],
	transaction: Transaction
): Promise<Map<string, number>> {
	const found = new Map<string, number>();
	for (const chunk of chunks(keys)) {
		const rows = await model.sequelize!.query<{ entry_key: string; version: number }>(
			`SELECT ${keyColumn} AS entry_key, MAX(version) AS version FROM ${model.tableName}
			WHERE ${keyColumn} IN (:keys) GROUP BY ${keyColumn}`,
			{ replacements: { keys: chunk }, transaction, type: QueryTypes.SELECT }
		);
		for (const { entry_key, version } of rows) found.set(entry_key, version);
	}
	return found;
}
