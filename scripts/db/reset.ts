/**
 * Throws away everything in a database and makes it anew from the migrations and the release in data/.
 *   npm run db:reset -- --yes
 */
import { migrateDown, migrateUp } from '../../src/lib/server/db/schema';
import { runCommand, withDatabase } from './database';
import { loadData } from './load-data';

runCommand(async () => {
	if (process.argv[2] !== '--yes')
		throw new Error('This throws away all corrections and accounts: npm run db:reset -- --yes');
	await withDatabase(async (database) => {
		await migrateDown(database, 'all');
		await migrateUp(database);
		await loadData(database);
	});
	console.log('The database is new. Restart the server if it runs.');
});
