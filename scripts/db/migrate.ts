/**
 * Brings a database up to date: schema, then the release in data/.
 *   npm run db:migrate                    all that is pending, then load or merge the release
 *   npm run db:migrate -- --schema-only   without the release
 *   npm run db:migrate -- --down [n|all]  takes back the last n migrations (1)
 *   npm run db:migrate -- --dump          writes the schema that the migrations make to schema.sql
 */
import { writeFileSync } from 'node:fs';
import type { Database } from '../../src/lib/server/db';
import { dumpSchema, migrateDown, migrateUp } from '../../src/lib/server/db/schema';
import { forgetPrepared, PROJECT, runCommand, withDatabase, withScratchDatabase } from './database';
import { loadData } from './load-data';

const SCHEMA = `${PROJECT}src/lib/server/db/schema.sql`;

async function dump(database: Database): Promise<void> {
	const schema = await withScratchDatabase(database, async (scratch) => {
		await migrateUp(scratch);
		return dumpSchema(scratch);
	});
	writeFileSync(SCHEMA, schema);
	console.log(`Wrote ${SCHEMA}`);
}

function stepsOf(argument: string | undefined): number | 'all' {
	if (argument === undefined) return 1;
	if (argument === 'all') return 'all';
	const steps = Number(argument);
	if (!Number.isInteger(steps) || steps < 1)
		throw new Error(`--down takes a number of migrations or "all", not "${argument}".`);
	return steps;
}

runCommand(async () => {
	const [option, argument] = process.argv.slice(2);
	await withDatabase(async (database) => {
		if (option === '--dump') return dump(database);
		if (option === '--down') {
			forgetPrepared();
			const names = await migrateDown(database, stepsOf(argument));
			console.log(names.length > 0 ? `Took back ${names.join(', ')}` : 'Nothing to take back');
			return;
		}
		if (option !== undefined && option !== '--schema-only')
			throw new Error(
				`Unknown option ${option}; known are --schema-only, --down [n|all] and --dump.`
			);
		const names = await migrateUp(database);
		console.log(names.length > 0 ? `Ran ${names.length} migrations` : 'The schema is up to date');
		if (option === undefined) await loadData(database);
	});
});
