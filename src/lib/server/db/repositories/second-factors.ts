import { Op, type Transaction } from 'sequelize';
import type { Database } from '../connection';
import type { SecondFactorRecord } from '../models';

/** Somebody's second factor, in force or not yet. */
export async function factorOf(
	{ models }: Database,
	user_id: string,
	transaction?: Transaction
): Promise<SecondFactorRecord | null> {
	const found = await models.secondFactors.findByPk(user_id, { transaction });
	return found && found.get({ plain: true });
}

/** Begins anew with a secret that is not in force yet. */
export async function putFactor(
	{ models }: Database,
	factor: SecondFactorRecord,
	transaction: Transaction
): Promise<void> {
	await models.secondFactors.destroy({ where: { user_id: factor.user_id }, transaction });
	await models.secondFactors.create(factor, { transaction });
}

/** Puts it in force. */
export async function confirmFactor(
	{ models }: Database,
	user_id: string,
	confirmed_at: Date,
	transaction: Transaction
): Promise<void> {
	await models.secondFactors.update({ confirmed_at }, { where: { user_id }, transaction });
}

/** Moves on to the step of a code. Answers false when a code of that step, or a later one, was taken before. */
export async function moveToStep(
	{ models }: Database,
	user_id: string,
	step: number,
	transaction: Transaction
): Promise<boolean> {
	const [changed] = await models.secondFactors.update(
		{ last_step: step },
		{ where: { user_id, last_step: { [Op.lt]: step } }, transaction }
	);
	return changed > 0;
}

/** Removes it, and the codes that stand in for it. */
export async function removeFactor(
	{ models }: Database,
	user_id: string,
	transaction: Transaction
): Promise<void> {
	await models.secondFactors.destroy({ where: { user_id }, transaction });
	await models.recoveryCodes.destroy({ where: { user_id }, transaction });
}

/** Puts new recovery codes in the place of all that there were. */
export async function putRecoveryCodes(
	{ models }: Database,
	user_id: string,
	hashes: readonly string[],
	transaction: Transaction
): Promise<void> {
	await models.recoveryCodes.destroy({ where: { user_id }, transaction });
	await models.recoveryCodes.bulkCreate(
		hashes.map((hash) => ({ user_id, hash, used_at: null })),
		{ transaction }
	);
}

/** Uses a recovery code up. Answers false when it is none, or used before. */
export async function useRecoveryCode(
	{ models }: Database,
	user_id: string,
	hash: string,
	used_at: Date,
	transaction: Transaction
): Promise<boolean> {
	const [changed] = await models.recoveryCodes.update(
		{ used_at },
		{ where: { user_id, hash, used_at: null }, transaction }
	);
	return changed > 0;
}

/** How many recovery codes are left. */
export const recoveryCodesLeft = ({ models }: Database, user_id: string): Promise<number> =>
	models.recoveryCodes.count({ where: { user_id, used_at: null } });
