import { rmSync } from 'node:fs';
import { join } from 'node:path';
import { fileURLToPath } from 'node:url';
import { connect, type Database } from '../../src/lib/server/db';
import { DATABASE_FOLDER, runningServerUrl, startPrivateServer } from '../lib/mariadb.mjs';

/** The project's folder, with a slash at its end. */
export const PROJECT = fileURLToPath(new URL('../../', import.meta.url));

/** A number of connections that is enough for a command. */
const POOL = 4;

async function withConnection<T>(url: string, work: (database: Database) => Promise<T>) {
	const database = connect(url, { pool: POOL });
	try {
		return await work(database);
	} finally {
		await database.close();
	}
}

/**
 * Runs a command's work on the database at DATABASE_URL; when that is not set, on the private server of the
 * start command, which is started for as long as the work takes unless it already runs.
 */
export async function withDatabase<T>(work: (database: Database) => Promise<T>): Promise<T> {
	const folder = PROJECT + DATABASE_FOLDER;
	const url = process.env.DATABASE_URL || runningServerUrl(folder);
	if (url) return withConnection(url, work);
	const server = await startPrivateServer({ dir: folder, log: console.log });
	try {
		return await withConnection(server.url, work);
	} finally {
		await server.stop();
	}
}

/** Lets the next start look at the schema again, although no source has changed. */
export const forgetPrepared = (): void =>
	rmSync(join(PROJECT, DATABASE_FOLDER, 'prepared.sha256'), { force: true });

/** Runs work on an empty database beside the given one, which is dropped again. */
export async function withScratchDatabase<T>(
	database: Database,
	work: (scratch: Database) => Promise<T>
): Promise<T> {
	const { sequelize } = database;
	const name = `${sequelize.getDatabaseName()}_scratch_${process.pid}`;
	const { host, port, username, password } = sequelize.config;
	const account = `${username}:${encodeURIComponent(password ?? '')}`;
	await sequelize.query(
		`CREATE DATABASE \`${name}\` CHARACTER SET utf8mb4 COLLATE utf8mb4_nopad_bin`
	);
	try {
		return await withConnection(`mariadb://${account}@${host}:${port}/${name}`, work);
	} finally {
		await sequelize.query(`DROP DATABASE \`${name}\``);
	}
}

/** What went wrong and why, without the statements that a database error carries along. */
function reasonOf(error: unknown): string {
	if (!(error instanceof Error)) return String(error);
	const [line = ''] = error.message.split('\n');
	return error.cause === undefined ? line : `${line} ${reasonOf(error.cause)}`;
}

/** Runs a command: what went wrong is said in one line, in full with DEBUG set. */
export function runCommand(command: () => Promise<void>): void {
	command().catch((error: unknown) => {
		console.error(process.env.DEBUG ? error : reasonOf(error));
		process.exitCode = 1;
	});
}
