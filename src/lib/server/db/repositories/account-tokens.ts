import { Op, type Transaction } from 'sequelize';
import type { Database } from '../connection';
import type { AccountTokenRecord } from '../models';

export async function addToken(
	{ models }: Database,
	token: AccountTokenRecord,
	transaction?: Transaction
): Promise<void> {
	await models.accountTokens.create(token, { transaction });
}

const good = (hash: string, purpose: string, now: Date) => ({
	hash,
	purpose,
	expires_at: { [Op.gt]: now }
});

/** What a link is good for, while it is; it stays good. */
export async function tokenOf(
	{ models }: Database,
	hash: string,
	purpose: string,
	now: Date
): Promise<AccountTokenRecord | null> {
	const found = await models.accountTokens.findOne({ where: good(hash, purpose, now) });
	return found && found.get({ plain: true });
}

/** Takes what a link is good for: of two who come at once, one gets it. */
export async function takeToken(
	{ models }: Database,
	hash: string,
	purpose: string,
	now: Date,
	transaction: Transaction
): Promise<AccountTokenRecord | null> {
	const found = await models.accountTokens.findOne({
		where: good(hash, purpose, now),
		transaction,
		lock: true
	});
	await found?.destroy({ transaction });
	return found && found.get({ plain: true });
}

/** Lets all links of somebody lapse. */
export async function forgetTokensOf(
	{ models }: Database,
	user_id: string,
	transaction: Transaction
): Promise<void> {
	await models.accountTokens.destroy({ where: { user_id }, transaction });
}

/** Throws away what has lapsed. Answers how much that was. */
export const forgetLapsedTokens = ({ models }: Database, now: Date): Promise<number> =>
	models.accountTokens.destroy({ where: { expires_at: { [Op.lte]: now } } });
