import { Op, type Transaction } from 'sequelize';
import type { Database } from '../connection';
import type { AuditRecord } from '../models';

/** The newest entry, locked, so that one entry at a time comes after it; null before the first. */
export async function lockNewestEntry(
	{ models }: Database,
	transaction: Transaction
): Promise<Pick<AuditRecord, 'number' | 'hash'> | null> {
	const found = await models.audit.findOne({
		attributes: ['number', 'hash'],
		order: [['number', 'DESC']],
		transaction,
		lock: true
	});
	return found && found.get({ plain: true });
}

/** Appends an entry. Nothing here changes one or takes one away. */
export async function appendEntry(
	{ models }: Database,
	entry: AuditRecord,
	transaction: Transaction
): Promise<void> {
	await models.audit.create(entry, { transaction });
}

/** Entries after a number, in their order. */
export async function entriesAfter(
	{ models }: Database,
	number: number,
	limit: number
): Promise<AuditRecord[]> {
	const found = await models.audit.findAll({
		where: { number: { [Op.gt]: number } },
		order: ['number'],
		limit
	});
	return found.map((one) => one.get({ plain: true }));
}

export interface EntryFilter {
	/** Entries that somebody wrote, or that are about them. */
	readonly person?: string;
	/** Below this number. */
	readonly below?: number;
}

/** Entries, newest first. */
export async function newestEntries(
	{ models }: Database,
	{ person, below }: EntryFilter,
	limit: number
): Promise<AuditRecord[]> {
	const found = await models.audit.findAll({
		where: {
			...(below !== undefined && { number: { [Op.lt]: below } }),
			...(person !== undefined && {
				[Op.or]: [{ actor: person }, { subject_kind: 'person', subject_id: person }]
			})
		},
		order: [['number', 'DESC']],
		limit
	});
	return found.map((one) => one.get({ plain: true }));
}
