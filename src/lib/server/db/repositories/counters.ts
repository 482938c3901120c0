import { Op, QueryTypes } from 'sequelize';
import type { Database } from '../connection';

/**
 * Counts one more in a window of time, for every process and node alike, and answers how many that makes.
 * One statement: nobody else's count comes in between.
 */
export async function countOne(
	{ sequelize }: Database,
	{ key, from, until }: { key: string; from: Date; until: Date }
): Promise<number> {
	const [counted] = await sequelize.query<{ used: number }>(
		`INSERT INTO shared_counters (counter_key, window_from, used, expires_at)
		VALUES (:key, :from, 1, :until)
		ON DUPLICATE KEY UPDATE used = used + 1
		RETURNING used`,
		{ replacements: { key, from, until }, type: QueryTypes.SELECT }
	);
	if (!counted) throw new Error('The counter answered nothing.');
	return counted.used;
}

/** Counts one less in a window, where it is still on record. */
export async function uncountOne(
	{ sequelize }: Database,
	{ key, from }: { key: string; from: Date }
): Promise<void> {
	await sequelize.query(
		`UPDATE shared_counters SET used = used - 1
		WHERE counter_key = :key AND window_from = :from AND used > 0`,
		{ replacements: { key, from } }
	);
}

/** Throws away counters of windows that have passed. Answers how many. */
export const forgetCounters = ({ models }: Database, now: Date): Promise<number> =>
	models.sharedCounters.destroy({ where: { expires_at: { [Op.lte]: now } } });
