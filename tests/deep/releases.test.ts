import { setTimeout as pause } from 'node:timers/promises';
import { afterAll, describe, expect, it } from 'vitest';
import { connect, type Database } from '../../src/lib/server/db';
import { migrateUp } from '../../src/lib/server/db/schema';
import { contentOf, loadRelease } from '../../src/lib/server/reference';
import { digestOf } from '../../src/lib/server/reference/digest';
import { entriesOf } from '../../src/lib/server/reference/entries';
import type { EditionContent } from '../../src/lib/types';
import { inventedEdition } from '../bench/invented-edition';
import { ownServer } from '../fixtures/test-server';

const server = ownServer();
afterAll(() => server.remove());

/** A release whose nth hundred of rows says something else. */
const release = (version: number, rows = 3_000): EditionContent => {
	const content = inventedEdition(rows);
	return {
		...content,
		rows: content.rows.map((row, index) =>
			index % 30 === version % 30 ? { ...row, meaning: `${row.meaning}, version ${version}` } : row
		)
	};
};
/** Kills a process and waits until it is gone. */
async function killed(pid: number): Promise<void> {
	process.kill(pid, 'SIGKILL');
	const isThere = (): boolean => {
		try {
			return process.kill(pid, 0);
		} catch (error) {
			if ((error as NodeJS.ErrnoException).code === 'ESRCH') return false;
			throw error;
		}
	};
	while (isThere()) await pause(5);
}
const digest = (content: EditionContent): string => digestOf(entriesOf(content));

describe('the database killed while a release is merged', () => {
	const KILLS = 60;

	it(`holds one of the two editions whole, ${KILLS} times`, async () => {
		let running = await server.start();
		let database: Database = connect(running.url);
		await migrateUp(database);
		await loadRelease(database, release(0));
		let present = release(0);
		let number = 1;
		for (let kill = 1; kill <= KILLS; kill += 1) {
			const next = release(kill);
			const loading = Promise.allSettled([loadRelease(database, next)]);
			await pause(20 + ((kill * 53) % 900));
			await killed(running.pid);
			await loading;
			await Promise.allSettled([database.close()]);
			running = await server.start();
			database = connect(running.url);
			const held = await contentOf(database);
			const head = held.head.number;
			if (head === number) expect(digest(held.content)).toBe(digest(present));
			else {
				expect(head).toBe(number + 1);
				expect(digest(held.content)).toBe(digest(next));
				present = next;
				number = head;
			}
		}
		await loadRelease(database, release(KILLS + 1));
		expect(digest((await contentOf(database)).content)).toBe(digest(release(KILLS + 1)));
		await database.close();
		await running.stop();
	});
});
