import { prepareDatabase } from '../../../scripts/lib/release.mjs';
import { startBuiltServer, type BuiltServer } from '../../fixtures/built-server';
import { startTestServer } from '../../fixtures/test-server';

/**
 * Runs a measurement on the build, served with the release from a database of its own. Not slowed by a
 * limit for one address, nor by a line in the log for each request.
 */
export async function withBuiltServer<T>(
	work: (server: BuiltServer, databaseUrl: string) => Promise<T>
): Promise<T> {
	const database = await startTestServer('bench');
	try {
		await prepareDatabase(database.url);
		const server = await startBuiltServer({
			DATABASE_URL: database.url,
			LOG_LEVEL: 'warn',
			READINGS_PER_MINUTE: '1000000'
		});
		try {
			return await work(server, database.url);
		} finally {
			await server.end();
		}
	} finally {
		await database.stop();
	}
}
