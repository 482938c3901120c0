import type { Transaction, WhereOptions } from 'sequelize';
import type { Claim } from '../../../types';
import type { Database } from '../connection';
import type { ClaimRecord } from '../models';
import { fromCell, toCell } from './scope-cell';
import { closeVersions, insertAll, lastVersions, liveAt, movedBetween } from './versions';

export interface ClaimVersion {
	readonly claim: Claim;
	readonly edition_from: number;
	readonly edition_to: number | null;
}

async function versionsWhere(
	{ models }: Database,
	where: WhereOptions<ClaimRecord>,
	transaction?: Transaction
): Promise<ClaimVersion[]> {
	const records = (await models.claims.findAll({
		where,
		order: ['claim_key', 'version'],
		raw: true,
		transaction
	})) as unknown as ClaimRecord[];
	return records.map((record) => ({
		claim: {
			claim_key: record.claim_key,
			maker: record.maker,
			table: record.table_name,
			division: fromCell(record.division),
			line: fromCell(record.line),
			years_from: record.years_from,
			years_to: record.years_to,
			source: record.source,
			note: record.note
		},
		edition_from: record.edition_from,
		edition_to: record.edition_to
	}));
}

/** The claims of completeness of an edition, by key. */
export const claimsAt = (database: Database, edition: number, transaction?: Transaction) =>
	versionsWhere(database, liveAt(edition), transaction);

/** All versions of claims that began or ended after one edition and up to another. */
export const claimsMoved = (database: Database, after: number, upTo: number) =>
	versionsWhere(database, movedBetween(after, upTo));

/** Retires claims: `edition` is the first without them. */
export const closeClaims = (
	{ models }: Database,
	keys: readonly string[],
	edition: number,
	transaction: Transaction
): Promise<void> => closeVersions(models.claims, 'claim_key', keys, edition, transaction);

/** Writes claims as new versions, live from `edition`; versions before them are ended. */
export async function putClaims(
	database: Database,
	claims: readonly Claim[],
	edition: number,
	transaction: Transaction
): Promise<void> {
	const model = database.models.claims;
	const keys = claims.map(({ claim_key }) => claim_key);
	const last = await lastVersions(model, 'claim_key', keys, transaction);
	await closeClaims(database, [...last.keys()], edition, transaction);
	await insertAll(
		model,
		claims.map(({ table, division, line, ...rest }) => ({
			...rest,
			table_name: table,
			division: toCell(division),
			line: toCell(line),
			version: (last.get(rest.claim_key) ?? 0) + 1,
			edition_from: edition,
			edition_to: null
		})),
		transaction
	);
}
