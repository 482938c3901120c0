import { Op, type Transaction } from 'sequelize';
import type { EditionHead } from '../../../types';
import type { Database } from '../connection';
import type { EditionRecord } from '../models';

const toHead = (record: EditionRecord): EditionHead => ({
	number: record.number,
	parent: record.parent,
	digest: record.digest,
	cause: record.cause,
	cause_id: record.cause_id,
	made_at: record.made_at.toISOString()
});

/** The number of the newest edition; null before the first. */
export async function newestEdition(
	{ models }: Database,
	transaction?: Transaction
): Promise<number | null> {
	return models.editions.max('number', { transaction });
}

/** The head of an edition; null when there is none of that number. */
export async function editionHead(
	{ models }: Database,
	number: number
): Promise<EditionHead | null> {
	const found = await models.editions.findByPk(number);
	return found && toHead(found.get({ plain: true }));
}

/** Heads of editions below a number, newest first. */
export async function editionHeads(
	{ models }: Database,
	{ below, limit }: { below: number | null; limit: number }
): Promise<EditionHead[]> {
	const found = await models.editions.findAll({
		where: below === null ? {} : { number: { [Op.lt]: below } },
		order: [['number', 'DESC']],
		limit
	});
	return found.map((one) => toHead(one.get({ plain: true })));
}

/** Locks the counter, so that one edition at a time is made; answers the newest number, 0 before the first. */
export async function lockNewestEdition(
	{ models }: Database,
	transaction: Transaction
): Promise<number> {
	const counter = await models.editionCounter.findByPk(1, { transaction, lock: true });
	if (!counter) throw new Error('The counter of editions is missing: run the migrations.');
	return counter.get('number') as number;
}

/** Writes the head of the edition after the newest and moves the counter, which must be locked. */
export async function addEdition(
	{ models }: Database,
	record: EditionRecord,
	transaction: Transaction
): Promise<void> {
	await models.editions.create(record, { transaction });
	await models.editionCounter.update({ number: record.number }, { where: { id: 1 }, transaction });
}
