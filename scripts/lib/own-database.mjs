// The database of a command: the one that DATABASE_URL names, or a private server of its own.
import { DATABASE_FOLDER, startPrivateServer } from './mariadb.mjs';
import { inProject } from './project.mjs';
import { prepareDatabase } from './release.mjs';
import { announce, step } from './steps.mjs';

/**
 * @typedef {object} OwnDatabase
 * @property {string} url
 * @property {boolean} own a private server, with nobody else's data in it
 * @property {() => Promise<void>} stop
 */

/** @returns {Promise<OwnDatabase>} */
export async function openDatabase() {
	const given = process.env.DATABASE_URL;
	if (given) {
		await step('Database', async (say) => say('the server that DATABASE_URL names'));
		return { url: given, own: false, stop: async () => {} };
	}
	return step('Database', async (say) => {
		const server = await startPrivateServer({ dir: inProject(DATABASE_FOLDER), log: announce });
		say(`MariaDB on 127.0.0.1:${server.port}, data in ${DATABASE_FOLDER}`);
		return { url: server.url, own: true, stop: server.stop };
	});
}

/**
 * Schema and release.
 * @param {OwnDatabase} database
 */
export const fillDatabase = ({ url, own }) =>
	step('Tables', async (say) => {
		const options = own ? { remembered: inProject(DATABASE_FOLDER) } : {};
		say((await prepareDatabase(url, options)) ?? 'in place');
	});
