import { DatabaseError, QueryTypes } from 'sequelize';
import { beforeAll, describe, expect, it } from 'vitest';
import { connect, DatabaseAwayError, inTransaction, ping } from '../../src/lib/server/db';
import { openTestDatabase, type TestDatabase } from '../fixtures/database';

let database: TestDatabase;
beforeAll(async () => {
	database = await openTestDatabase({ migrated: false });
	await database.sequelize.query(
		'CREATE TABLE places (id INT PRIMARY KEY, n INT NOT NULL) ENGINE=InnoDB'
	);
	await database.sequelize.query('INSERT INTO places VALUES (1, 0), (2, 0)');
});

const countOf = async (id: number) => {
	const [place] = await database.sequelize.query<{ n: number }>(
		`SELECT n FROM places WHERE id = ${id}`,
		{ type: QueryTypes.SELECT }
	);
	return place?.n;
};

describe('a transaction', () => {
	it('that loses in a deadlock is run again from its beginning, and both end well', async () => {
		await database.sequelize.query('UPDATE places SET n = 0');
		let arrived = 0;
		let release = () => {};
		const bothHold = new Promise<void>((done) => (release = done));
		let attempts = 0;
		const crossing = (first: number, second: number) =>
			inTransaction(database, async (transaction) => {
				attempts += 1;
				const add = (id: number) =>
					database.sequelize.query(`UPDATE places SET n = n + 1 WHERE id = ${id}`, {
						transaction
					});
				await add(first);
				if (++arrived === 2) release();
				await bothHold;
				await add(second);
			});
		await Promise.all([crossing(1, 2), crossing(2, 1)]);
		expect(attempts).toBe(3);
		expect([await countOf(1), await countOf(2)]).toEqual([2, 2]);
	});

	it('that waited too long for a lock is run again', async () => {
		const holder = await database.sequelize.transaction();
		await database.sequelize.query('UPDATE places SET n = 10 WHERE id = 1', {
			transaction: holder
		});
		let attempts = 0;
		await inTransaction(database, async (transaction) => {
			attempts += 1;
			await database.sequelize.query('SET SESSION innodb_lock_wait_timeout = 1', { transaction });
			if (attempts === 2) await holder.commit();
			await database.sequelize.query('UPDATE places SET n = n + 1 WHERE id = 1', { transaction });
		});
		expect(attempts).toBe(2);
		expect(await countOf(1)).toBe(11);
	});

	it('that loses at its commit, as in a cluster, is run again', async () => {
		await database.sequelize.query('UPDATE places SET n = 0');
		let attempts = 0;
		await inTransaction(database, async (transaction) => {
			attempts += 1;
			await database.sequelize.query('UPDATE places SET n = n + 1 WHERE id = 1', { transaction });
			if (attempts > 1) return;
			transaction.commit = async () => {
				await transaction.rollback();
				throw new DatabaseError(Object.assign(new Error('lost'), { errno: 1213, sql: '' }));
			};
		});
		expect(attempts).toBe(2);
		expect(await countOf(1)).toBe(1);
	});

	it('that goes on losing is given up after six attempts', async () => {
		const lost = Object.assign(new Error('lost'), { errno: 1213, sql: '' });
		let attempts = 0;
		const run = inTransaction(database, async () => {
			attempts += 1;
			throw new DatabaseError(lost);
		});
		await expect(run).rejects.toThrow('lost');
		expect(attempts).toBe(6);
	});

	it('that fails by itself is not run again, and leaves nothing behind', async () => {
		const before = await countOf(2);
		let attempts = 0;
		const run = inTransaction(database, async (transaction) => {
			attempts += 1;
			await database.sequelize.query('UPDATE places SET n = 99 WHERE id = 2', { transaction });
			await database.sequelize.query('INSERT INTO places VALUES (1, 0)', { transaction });
		});
		await expect(run).rejects.toMatchObject({ name: 'SequelizeUniqueConstraintError' });
		expect(attempts).toBe(1);
		expect(await countOf(2)).toBe(before);
	});
});

describe('a database that is not there', () => {
	it('is told by one error, quickly', async () => {
		const away = connect('mariadb://nobody:x@127.0.0.1:1/none');
		const began = performance.now();
		await expect(ping(away)).rejects.toBeInstanceOf(DatabaseAwayError);
		await expect(inTransaction(away, async () => {})).rejects.toMatchObject({
			code: 'database_away'
		});
		expect(performance.now() - began).toBeLessThan(3000);
		await away.close();
	});

	it('is not mistaken for a statement that the database refuses', async () => {
		const refused = inTransaction(database, (transaction) =>
			database.sequelize.query('SELECT * FROM nowhere', { transaction })
		);
		await expect(refused).rejects.not.toBeInstanceOf(DatabaseAwayError);
	});
});
