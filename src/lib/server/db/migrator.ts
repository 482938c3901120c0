import { QueryTypes, type Sequelize } from 'sequelize';
import { SequelizeStorage, Umzug } from 'umzug';
import type { Database } from './connection';
import { asking } from './errors';
import { MIGRATIONS } from './migrations';

/** One statement each way: DDL is not transactional, so that a step that failed halfway can be run again. */
export interface SchemaStep {
	readonly up: string;
	readonly down: string;
}

const LEDGER = 'migrations';
const LOCK_WAIT_S = 120;

function umzug(sequelize: Sequelize) {
	return new Umzug({
		migrations: MIGRATIONS.map(([name, step]) => ({
			name,
			up: () => sequelize.query(step.up),
			down: () => sequelize.query(step.down)
		})),
		storage: new SequelizeStorage({ sequelize, modelName: LEDGER, tableName: LEDGER }),
		logger: undefined
	});
}

/** Lets one process at a time change the schema of a database; the others wait, then find it done. */
async function alone<T>(database: Database, work: () => Promise<T>): Promise<T> {
	const { sequelize } = database;
	// The lock belongs to a connection, which the open transaction holds while the steps run on others.
	return sequelize.transaction(async (transaction) => {
		const options = { transaction, type: QueryTypes.SELECT } as const;
		const [taken] = await sequelize.query<{ got: number | null }>(
			`SELECT GET_LOCK(CONCAT(DATABASE(), '.schema'), ${LOCK_WAIT_S}) AS got`,
			options
		);
		if (taken?.got !== 1)
			throw new Error(`Another process has been changing the schema for ${LOCK_WAIT_S} seconds.`);
		try {
			return await work();
		} finally {
			await sequelize.query(`SELECT RELEASE_LOCK(CONCAT(DATABASE(), '.schema'))`, options);
		}
	});
}

/**
 * Brings the schema up to date.
 * @returns names of the migrations that were run
 * @throws {DatabaseAwayError}
 */
export const migrateUp = (database: Database): Promise<string[]> =>
	asking(() =>
		alone(database, async () => (await umzug(database.sequelize).up()).map(({ name }) => name))
	);

/**
 * Takes back the last migration, or as many as told, or all.
 * @returns names of the migrations that were taken back
 */
export const migrateDown = (database: Database, steps: number | 'all' = 1): Promise<string[]> =>
	asking(() =>
		alone(database, async () => {
			const down = umzug(database.sequelize);
			const undone = await down.down(steps === 'all' ? { to: 0 } : { step: steps });
			return undone.map(({ name }) => name);
		})
	);

/** Names of the migrations that the schema lacks. */
export const pendingMigrations = (database: Database): Promise<string[]> =>
	asking(async () => (await umzug(database.sequelize).pending()).map(({ name }) => name));
