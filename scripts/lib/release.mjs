// Schema and released tables in a database.
import { join } from 'node:path';
import { runNode, succeed } from './commands.mjs';
import { digestOf, isStamped, stamp } from './digests.mjs';

/** What decides what the database holds after a start. */
const SOURCES = [
	'data',
	'scripts/data',
	'scripts/db',
	'src/lib/server/db',
	'src/lib/server/reference',
	'src/lib/types',
	'package-lock.json'
];

/**
 * Migrates a database and loads or merges the release.
 * @param {string} url
 * @param {{ remembered?: string }} [options] the folder of a server that nobody else changes: there it
 *   is remembered for which sources all was done
 * @returns {Promise<string | null>} the last line said by the work, or null when nothing was to be done
 * @throws {import('./commands.mjs').CommandError}
 */
export async function prepareDatabase(url, { remembered } = {}) {
	const digest = digestOf(SOURCES);
	const file = remembered && join(remembered, 'prepared.sha256');
	if (file && isStamped(file, digest)) return null;
	const output = await succeed(
		'db:migrate',
		runNode(['--import', 'tsx', 'scripts/db/migrate.ts'], { env: { DATABASE_URL: url } })
	);
	if (file) stamp(file, digest);
	return output.trim().split('\n').at(-1) ?? '';
}
