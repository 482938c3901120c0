import { readdirSync, readFileSync } from 'node:fs';
import { QueryTypes } from 'sequelize';
import { describe, expect, it } from 'vitest';
import {
	dumpSchema,
	migrateDown,
	migrateUp,
	pendingMigrations
} from '../../src/lib/server/db/schema';
import { MIGRATIONS } from '../../src/lib/server/db/migrations';
import { openTestDatabase } from '../fixtures/database';

const FOLDER = 'src/lib/server/db/migrations';
const committed = readFileSync('src/lib/server/db/schema.sql', 'utf8');

describe('the migrations', () => {
	it('are all registered, in the order of their minutes', () => {
		const files = readdirSync(FOLDER).filter((name) => name !== 'index.ts');
		expect(MIGRATIONS.map(([name]) => `${name}.ts`)).toEqual(files.sort());
		for (const file of files) expect(file).toMatch(/^20\d{10}-[a-z0-9-]+\.ts$/);
	});

	it('make the committed schema: up, down, and up again', async () => {
		const database = await openTestDatabase({ migrated: false });
		const empty = await dumpSchema(database);
		const names = MIGRATIONS.map(([name]) => name);
		expect(await pendingMigrations(database)).toEqual(names);
		expect(await migrateUp(database)).toEqual(names);
		expect(await dumpSchema(database)).toBe(committed);
		expect(await migrateDown(database, 'all')).toEqual([...names].reverse());
		expect(await dumpSchema(database)).toBe(empty);
		await migrateUp(database);
		expect(await dumpSchema(database)).toBe(committed);
		expect(await migrateUp(database)).toEqual([]);
	});

	it('can each be taken back alone and run again', async () => {
		const database = await openTestDatabase();
		const schemas = [await dumpSchema(database)];
		for (const [name] of [...MIGRATIONS].reverse()) {
			expect(await migrateDown(database)).toEqual([name]);
			schemas.push(await dumpSchema(database));
		}
		await migrateUp(database);
		expect(await dumpSchema(database)).toBe(schemas[0]);
	});

	it('can be run again when one failed after its statement', async () => {
		const database = await openTestDatabase();
		await database.sequelize.query('DELETE FROM migrations');
		await migrateUp(database);
		expect(await dumpSchema(database)).toBe(committed);
	});

	it('are run once by two processes that start together', async () => {
		const database = await openTestDatabase({ migrated: false });
		const runs = await Promise.all([migrateUp(database), migrateUp(database)]);
		expect(runs.map((names) => names.length).sort()).toEqual([0, MIGRATIONS.length]);
	});
});

describe('the committed schema', () => {
	it('can be read by a server and shows itself again', async () => {
		const { sequelize, ...rest } = await openTestDatabase({ migrated: false });
		await sequelize.transaction(async (transaction) => {
			for (const statement of committed.replace(/^--.*\n/, '').split(/;\n\s*/))
				if (statement) await sequelize.query(statement, { transaction });
		});
		expect(await dumpSchema({ sequelize, ...rest })).toBe(committed);
	});

	it('tells keys and codes apart by every character, names to search not by case and accent', async () => {
		const { sequelize } = await openTestDatabase();
		await sequelize.query(`INSERT INTO editions (number, digest, cause, made_at)
			VALUES (1, '', 'release', NOW(3))`);
		for (const [index, key] of ['ab', 'Ab', 'ab '].entries())
			await sequelize.query(
				`INSERT INTO sources (source_key, version, title, publisher, kind, seen_at, licence, edition_from)
				VALUES (:key, 1, :title, '', 'book', '', '', 1)`,
				{ replacements: { key, title: index === 0 ? 'Códex' : 'other' } }
			);
		const keysWhere = async (condition: string) => {
			const sql = `SELECT source_key FROM sources WHERE ${condition}`;
			return sequelize.query(sql, { type: QueryTypes.SELECT });
		};
		expect(await keysWhere(`source_key = 'ab'`)).toEqual([{ source_key: 'ab' }]);
		expect(await keysWhere(`title = 'CODEX'`)).toEqual([{ source_key: 'ab' }]);
	});
});
