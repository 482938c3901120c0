import { QueryTypes, type Transaction } from 'sequelize';
import type { Database } from '../connection';

/** A reading as somebody has saved it. */
export interface SavedReading {
	readonly id: string;
	readonly kind: string;
	readonly text: string;
	readonly context: unknown;
	readonly edition: number;
	readonly reader: string;
	readonly result: unknown;
	readonly saved_at: Date;
}

/** The readings that somebody has saved, oldest first. */
export const readingsOf = ({ sequelize }: Database, owner: string): Promise<SavedReading[]> =>
	sequelize.query<SavedReading>(
		`SELECT id, kind, text, context, edition, reader, result, saved_at
		FROM saved_readings WHERE owner = :owner ORDER BY saved_at, id`,
		{ replacements: { owner }, type: QueryTypes.SELECT }
	);

/** Throws away the readings that somebody has saved. */
export async function forgetReadingsOf(
	{ sequelize }: Database,
	owner: string,
	transaction: Transaction
): Promise<void> {
	await sequelize.query('DELETE FROM saved_readings WHERE owner = :owner', {
		replacements: { owner },
		transaction
	});
}
