import { literal, Op, UniqueConstraintError, type Transaction } from 'sequelize';
import type { Role } from '../../../types';
import type { Database } from '../connection';
import type { UserRecord } from '../models';

/** Adds somebody. Answers false when the address has an account already. */
export async function addUser(
	{ models }: Database,
	user: UserRecord,
	transaction: Transaction
): Promise<boolean> {
	try {
		await models.users.create(user, { transaction });
		return true;
	} catch (error) {
		if (error instanceof UniqueConstraintError) return false;
		throw error;
	}
}

/** Somebody who has an account; not one that was deleted. */
export async function userById(
	{ models }: Database,
	id: string,
	transaction?: Transaction
): Promise<UserRecord | null> {
	const found = await models.users.findOne({ where: { id, deleted_at: null }, transaction });
	return found && found.get({ plain: true });
}

/** Whose address it is. */
export async function userByAddress(
	{ models }: Database,
	email: string,
	transaction?: Transaction
): Promise<UserRecord | null> {
	const found = await models.users.findOne({ where: { email }, transaction });
	return found && found.get({ plain: true });
}

type Changes = Partial<Omit<UserRecord, 'id' | 'version' | 'created_at'>>;

/**
 * Changes somebody.
 * @param version when given, only while it is the version that was seen
 * @returns false when it is not, when nobody has that id, or when the address has another account
 */
export async function changeUser(
	{ models }: Database,
	id: string,
	changes: Changes,
	transaction: Transaction,
	version?: number
): Promise<boolean> {
	try {
		const [changed] = await models.users.update(
			{ ...changes, version: literal('version + 1') as unknown as number },
			{ where: { id, ...(version !== undefined && { version }) }, transaction }
		);
		return changed > 0;
	} catch (error) {
		if (error instanceof UniqueConstraintError) return false;
		throw error;
	}
}

/** Ids of those with a role, locked, so that the last of them does not lose it to two at once. */
export async function lockRole(
	{ models }: Database,
	role: Role,
	transaction: Transaction
): Promise<string[]> {
	const found = await models.users.findAll({
		attributes: ['id'],
		where: { role, deleted_at: null },
		transaction,
		lock: true
	});
	return found.map((one) => one.get('id') as string);
}

export interface PeopleFilter {
	/** Part of a name, or of an address. */
	readonly text?: string;
	readonly role?: Role;
	/** Only those who are paused at this time. */
	readonly pausedAt?: Date;
}

const escaped = (text: string): string => text.replace(/[\\%_]/g, (sign) => `\\${sign}`);

/** People by name, and how many there are in all. */
export async function findPeople(
	{ models }: Database,
	{ text, role, pausedAt }: PeopleFilter,
	{ limit, offset }: { limit: number; offset: number }
): Promise<{ total: number; people: UserRecord[] }> {
	const like = text && { [Op.like]: `%${escaped(text)}%` };
	const { count, rows } = await models.users.findAndCountAll({
		where: {
			deleted_at: null,
			...(role && { role }),
			...(pausedAt && { paused_until: { [Op.gt]: pausedAt } }),
			...(like && { [Op.or]: [{ name: like }, { email: like }] })
		},
		order: ['name', 'id'],
		limit,
		offset
	});
	return { total: count, people: rows.map((one) => one.get({ plain: true })) };
}

/** Names by id; null for those whose account is gone. */
export async function namesOf(
	{ models }: Database,
	ids: readonly string[]
): Promise<ReadonlyMap<string, string | null>> {
	const found = await models.users.findAll({ attributes: ['id', 'name'], where: { id: [...ids] } });
	return new Map(found.map((one) => [one.get('id') as string, one.get('name') as string | null]));
}
