import { randomBytes } from 'node:crypto';
import { setTimeout as pause } from 'node:timers/promises';
import { readContent } from '../../scripts/data/read';
import { inProject } from '../../scripts/lib/project.mjs';
import { connect } from '../../src/lib/server/db';
import { migrateUp } from '../../src/lib/server/db/schema';
import { loadRelease } from '../../src/lib/server/reference';
import { startTestServer } from '../fixtures/test-server';
import { inventedEdition } from './invented-edition';
import { bundledDecoder } from './lib/decoder';
import { median } from './lib/rounds';
import { withBuiltServer } from './lib/served';

const { compile } = await bundledDecoder();
const ROWS = 20_000;

const MEGABYTE = 1_000_000;
function heap(): number {
	globalThis.gc?.();
	return process.memoryUsage().heapUsed / MEGABYTE;
}

/** Seconds that an invented edition takes into an empty database. */
async function secondsToLoad(): Promise<number> {
	const server = await startTestServer('bench');
	const name = `bench_${randomBytes(6).toString('hex')}`;
	const address = new URL(server.url);
	try {
		const admin = connect(server.url, { pool: 1 });
		await admin.sequelize.query(
			`CREATE DATABASE tallyplate_${name} CHARACTER SET utf8mb4 COLLATE utf8mb4_nopad_bin`
		);
		await admin.close();
		address.pathname = `/tallyplate_${name}`;
		const database = connect(address.href);
		try {
			await migrateUp(database);
			const started = performance.now();
			await loadRelease(database, inventedEdition(ROWS));
			return (performance.now() - started) / 1000;
		} finally {
			await database.sequelize.query(`DROP DATABASE tallyplate_${name}`);
			await database.close();
		}
	} finally {
		await server.stop();
	}
}

interface Edition {
	readonly edition: number;
}

/** The longest that a reading waits from the moment a larger edition is in the database until it answers, and a second more. */
async function longestWait(): Promise<number> {
	return withBuiltServer(async (server, databaseUrl) => {
		const ask = async (): Promise<{ edition: number; waited: number }> => {
			const started = performance.now();
			const response = await fetch(
				`${server.origin}/api/v1/readings?text=RM23N0G100123&kind=serial`
			);
			const { edition } = (await response.json()) as Edition;
			return { edition, waited: performance.now() - started };
		};
		for (let n = 0; n < 500; n += 1) await ask();
		const { edition: before } = await ask();
		const present = readContent(inProject('data'));
		const invented = inventedEdition(ROWS);
		// Those of its rows that no released row shares a key with.
		const own = ({ row_key }: { row_key: string }): boolean => /\.1\d{5}$/.test(row_key);
		const rows = invented.rows.filter(own).slice(0, ROWS - present.rows.length);
		const keys = new Set(rows.map((row) => row.row_key));
		const database = connect(databaseUrl);
		await loadRelease(database, {
			rows: [...present.rows, ...rows],
			citations: [
				...present.citations,
				...invented.citations.filter((citation) => keys.has(citation.row_key))
			],
			sources: [...present.sources, ...invented.sources],
			claims: present.claims
		});
		await database.close();
		let longest = 0;
		let swapped = Infinity;
		const until = performance.now() + 30_000;
		while (performance.now() < Math.min(until, swapped + 1000)) {
			const { edition, waited } = await ask();
			longest = Math.max(longest, waited);
			if (edition > before && swapped === Infinity) swapped = performance.now();
			await pause(2);
		}
		if (swapped === Infinity) throw new Error('The newer edition was not taken up in 30 s');
		return longest;
	});
}

export const figures = [
	{
		name: 'Edition of 20,000 rows, into an empty database',
		bound: 20,
		unit: 's',
		direction: 'at most',
		run: secondsToLoad
	},
	{
		name: 'Edition of 20,000 rows, compiled',
		bound: 1,
		unit: 's',
		direction: 'at most',
		run: () => {
			const content = inventedEdition(ROWS);
			return median(
				Array.from({ length: 7 }, () => {
					const started = performance.now();
					compile(content);
					return (performance.now() - started) / 1000;
				})
			);
		}
	},
	{
		name: 'Edition of 20,000 rows, held in memory with its content',
		bound: 80,
		unit: 'MB',
		direction: 'at most',
		run: () => {
			const before = heap();
			const held = compile(inventedEdition(ROWS));
			const size = heap() - before;
			if (held.rows.size < ROWS) throw new Error('Rows are missing');
			return size;
		}
	},
	{
		name: 'Longest wait of a reading while an edition is swapped',
		bound: 50,
		unit: 'ms',
		direction: 'at most',
		run: longestWait
	}
] as const;
