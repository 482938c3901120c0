import { setTimeout as pause } from 'node:timers/promises';
import { afterAll, afterEach, beforeAll, beforeEach, describe, expect, it } from 'vitest';
import { connect } from '../../src/lib/server/db';
import * as reference from '../../src/lib/server/reference';
import type { WatchEvent } from '../../src/lib/server/reference';
import { CurrentEdition } from '../../src/lib/server/reference/current';
import type { ReferenceRow } from '../../src/lib/types';
import { correct } from '../fixtures/corrections';
import { openTestDatabase, type TestDatabase } from '../fixtures/database';
import { INVENTED } from '../fixtures/invented';
import { ownServer } from '../fixtures/test-server';

const KEY = 'gm.engine.t.1';
const row = INVENTED.rows.find(({ row_key }) => row_key === KEY) as ReferenceRow;
const citations = INVENTED.citations.filter(({ row_key }) => row_key === KEY);

/** Waits for something that happens in the background. */
async function until(condition: () => boolean): Promise<void> {
	for (let tries = 0; !condition(); tries += 1) {
		if (tries > 500) throw new Error('it did not happen in 10 seconds');
		await pause(20);
	}
}
const change = (database: TestDatabase, meaning: string) =>
	correct(database, { rows: { put: [{ row: { ...row, meaning }, citations }] } });
const currentMeaning = () => reference.current().tables.rows.get(KEY)?.meaning;

afterEach(() => reference.stop());

describe('before there is an edition', () => {
	it('nothing can be read, and the first one is taken as soon as it is there', async () => {
		const database = await openTestDatabase();
		expect(() => reference.current()).toThrow(reference.NoTablesYetError);
		expect(reference.status()).toEqual({ tables: null, database: 'down' });
		await reference.start(database.url, { every: 20 });
		expect(() => reference.current()).toThrow(reference.NoTablesYetError);
		expect(reference.status()).toEqual({ tables: null, database: 'up' });
		await reference.loadRelease(database, INVENTED);
		await until(() => reference.status().tables === 1);
		expect(currentMeaning()).toBe(row.meaning);
	});

	it('a schema that is missing is told once, not every time', async () => {
		const database = await openTestDatabase({ migrated: false });
		const events: WatchEvent[] = [];
		await reference.start(database.url, { every: 10, onEvent: (event) => events.push(event) });
		await pause(200);
		expect(events.map(({ event }) => event)).toEqual(['look_failed']);
	});
});

describe('the current edition', () => {
	let database: TestDatabase;
	beforeEach(async () => {
		database = await openTestDatabase();
		await reference.loadRelease(database, INVENTED);
	});

	it('is swapped whole when a newer one appears', async () => {
		const events: WatchEvent[] = [];
		await reference.start(database.url, { every: 20, onEvent: (event) => events.push(event) });
		const before = reference.current();
		await change(database, 'Second');
		await until(() => reference.status().tables === 2);
		expect(currentMeaning()).toBe('Second');
		expect(before.head.number).toBe(1);
		expect(before.tables.rows.get(KEY)?.meaning).toBe(row.meaning);
		expect(events).toMatchObject([
			{ event: 'edition', edition: 1 },
			{ event: 'edition', edition: 2 }
		]);
	});

	it('shares unchanged tables with the one before', async () => {
		await reference.start(database.url);
		const before = reference.current().tables.tables;
		await change(database, 'Second');
		await reference.refresh();
		const after = reference.current().tables.tables;
		expect(after.get('gm/paint')).toBe(before.get('gm/paint'));
		expect(after.get('gm/engine')).not.toBe(before.get('gm/engine'));
	});

	it('is of one piece for whoever reads while it is swapped', async () => {
		await reference.start(database.url, { every: 5 });
		let reads = 0;
		let reading = true;
		const readers = (async () => {
			while (reading) {
				const { head, tables } = reference.current();
				const expected = head.number === 1 ? row.meaning : `Edition ${head.number}`;
				expect(tables.rows.get(KEY)?.meaning).toBe(expected);
				expect(tables.tables.get('gm/engine')?.byCode.get('T')?.all[0]?.meaning).toBe(expected);
				reads += 1;
				await pause(1);
			}
		})();
		for (let edition = 2; edition <= 6; edition += 1) await change(database, `Edition ${edition}`);
		await until(() => reference.status().tables === 6);
		reading = false;
		await readers;
		expect(reads).toBeGreaterThan(20);
	});
});

describe('earlier editions', () => {
	let database: TestDatabase;
	beforeAll(async () => {
		database = await openTestDatabase();
		await reference.loadRelease(database, INVENTED);
		for (let edition = 2; edition <= 12; edition += 1) await change(database, `Edition ${edition}`);
	});

	it('are compiled when asked for, and say what they said', async () => {
		await reference.start(database.url);
		expect((await reference.editionAt(1)).tables.rows.get(KEY)?.meaning).toBe(row.meaning);
		expect((await reference.editionAt(5)).tables.rows.get(KEY)?.meaning).toBe('Edition 5');
		expect((await reference.editionAt(12)).tables).toBe(reference.current().tables);
	});

	it('are four in memory at most, of which the current one never goes', async () => {
		const watched = new CurrentEdition(connect(database.url));
		await watched.start();
		const ask = async (...numbers: number[]) => {
			for (const number of numbers) await watched.compiled.get(number);
		};
		await ask(1, 2, 3);
		expect(watched.compiled.numbers).toEqual([12, 1, 2, 3]);
		await ask(1, 4);
		expect(watched.compiled.numbers).toEqual([12, 3, 1, 4]);
		await ask(5, 6, 7);
		expect(watched.compiled.numbers).toEqual([12, 5, 6, 7]);
		await watched.stop();
	});

	it('are compiled once for all who ask at the same time', async () => {
		await reference.start(database.url);
		const asked = await Promise.all(Array.from({ length: 20 }, () => reference.editionAt(3)));
		expect(new Set(asked).size).toBe(1);
	});

	it('are refused for a while when more are asked for than can be waited for', async () => {
		await reference.start(database.url);
		const asked = await Promise.allSettled(
			Array.from({ length: 11 }, (_, index) => reference.editionAt(index + 1))
		);
		const refused = asked.filter(({ status }) => status === 'rejected');
		expect(refused).toHaveLength(6);
		for (const one of refused)
			expect((one as PromiseRejectedResult).reason).toMatchObject({
				code: 'service_busy',
				retryAfterSeconds: 2
			});
		await expect(reference.editionAt(11)).resolves.toMatchObject({ head: { number: 11 } });
	});

	it.each([0, 13, 1.5, -1])('there is no edition %d', async (number) => {
		await reference.start(database.url);
		await expect(reference.editionAt(number)).rejects.toBeInstanceOf(reference.UnknownEditionError);
	});
});

describe('when the database goes', () => {
	const own = ownServer();
	afterAll(own.remove);

	it('reading goes on from memory, what needs it says so, and all is well when it is back', async () => {
		let server = await own.start();
		try {
			const database = await openTestDatabase({ url: server.url });
			await reference.loadRelease(database, INVENTED);
			await change(database, 'Second');
			const events: string[] = [];
			await reference.start(database.url, {
				every: 20,
				onEvent: ({ event }) => events.push(event)
			});
			await reference.editionAt(1);

			process.kill(server.pid, 'SIGKILL');
			await until(() => reference.status().database === 'down');
			expect(reference.status()).toEqual({ tables: 2, database: 'down' });
			expect(currentMeaning()).toBe('Second');
			expect((await reference.editionAt(1)).tables.rows.get(KEY)?.meaning).toBe(row.meaning);
			await expect(reference.rowHistory(KEY)).rejects.toBeInstanceOf(reference.DatabaseAwayError);
			await expect(reference.editions()).rejects.toMatchObject({ code: 'database_away' });
			await expect(reference.editionAt(3)).rejects.toMatchObject({ code: 'database_away' });

			await server.stop();
			server = await own.start();
			await until(() => reference.status().database === 'up');
			await change(database, 'Third');
			await until(() => reference.status().tables === 3);
			expect(currentMeaning()).toBe('Third');
			expect(await reference.rowHistory(KEY)).toHaveLength(3);
			expect(events).toEqual(['edition', 'database_down', 'database_up', 'edition']);
			await reference.stop();
		} finally {
			await server.stop();
		}
	});

	it('before the first look, the tables come with it', async () => {
		let server = await own.start();
		try {
			const database = await openTestDatabase({ url: server.url });
			await reference.loadRelease(database, INVENTED);
			await server.stop();
			await reference.start(database.url, { every: 20 });
			expect(reference.status()).toEqual({ tables: null, database: 'down' });
			expect(() => reference.current()).toThrow(reference.NoTablesYetError);
			server = await own.start();
			await until(() => reference.status().tables === 1);
			await reference.stop();
		} finally {
			await server.stop();
		}
	});
});
