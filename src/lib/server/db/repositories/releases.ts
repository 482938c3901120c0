import type { Transaction } from 'sequelize';
import type { Database } from '../connection';
import type { ReleaseConflictRecord, ReleaseLoadRecord } from '../models';

/** What a release and a correction made here both changed, as it is found. */
export type ReleaseConflict = Pick<
	ReleaseConflictRecord,
	'kind' | 'entry_key' | 'reason' | 'base' | 'theirs' | 'ours'
>;

/** Number, edition and digest of the last release that was loaded; null before the first. */
export async function lastLoad(
	{ models }: Database,
	transaction?: Transaction
): Promise<Omit<ReleaseLoadRecord, 'content'> | null> {
	const found = await models.releaseLoads.findOne({
		attributes: { exclude: ['content'] },
		order: [['number', 'DESC']],
		transaction
	});
	return found && found.get({ plain: true });
}

/** The stored content of a loaded release, as it was written. */
export async function loadContent(
	{ models }: Database,
	number: number,
	transaction?: Transaction
): Promise<Buffer> {
	const found = await models.releaseLoads.findByPk(number, {
		attributes: ['content'],
		rejectOnEmpty: true,
		transaction
	});
	return found.get('content') as Buffer;
}

/** Records a load and what it could not take. */
export async function addLoad(
	{ models }: Database,
	load: ReleaseLoadRecord,
	conflicts: readonly ReleaseConflict[],
	transaction: Transaction
): Promise<void> {
	await models.releaseLoads.create(load, { transaction });
	await models.releaseConflicts.bulkCreate(
		conflicts.map((conflict) => ({
			...conflict,
			load_number: load.number,
			resolved_at: null,
			resolved_by: null
		})),
		{ transaction }
	);
}

/** What no moderator has decided yet, by load, kind and key. */
export async function openConflicts({ models }: Database): Promise<ReleaseConflictRecord[]> {
	const found = await models.releaseConflicts.findAll({
		where: { resolved_at: null },
		order: ['load_number', 'kind', 'entry_key']
	});
	return found.map((one) => one.get({ plain: true }));
}
