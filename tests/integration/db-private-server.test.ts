import { spawn } from 'node:child_process';
import { readFileSync, rmSync, statSync } from 'node:fs';
import { resolve } from 'node:path';
import { afterAll, afterEach, describe, expect, it } from 'vitest';
import { runningServerUrl, startPrivateServer } from '../../scripts/lib/mariadb.mjs';
import { connect, ping } from '../../src/lib/server/db';

const dir = `.local/test-db/private-${process.pid}`;
type Server = Awaited<ReturnType<typeof startPrivateServer>>;
const started: Server[] = [];
async function start(): Promise<Server> {
	const server = await startPrivateServer({ dir });
	started.push(server);
	return server;
}
async function answers(url: string): Promise<boolean> {
	const database = connect(url, { pool: 1 });
	try {
		await ping(database);
		return true;
	} finally {
		await database.close();
	}
}
const isThere = (pid: number) => {
	try {
		return process.kill(pid, 0);
	} catch {
		return false;
	}
};

afterEach(async () => {
	for (const server of started.splice(0)) await server.stop();
});
afterAll(() => rmSync(dir, { recursive: true, force: true }));

describe('the private server', () => {
	it('starts, answers on its remembered port, stops, and starts again', async () => {
		const first = await start();
		expect(await answers(first.url)).toBe(true);
		expect(runningServerUrl(dir)).toBe(first.url);
		await first.stop();
		await first.stop();
		expect(isThere(first.pid)).toBe(false);
		expect(runningServerUrl(dir)).toBeUndefined();
		const second = await start();
		expect(second.url).toBe(first.url);
		expect(await answers(second.url)).toBe(true);
	});

	it('refuses a second one on the same data, and names who has it', async () => {
		await start();
		await expect(startPrivateServer({ dir })).rejects.toThrow(
			`This process already runs a database server in ${resolve(dir)}.`
		);
		const command = `import('./scripts/lib/mariadb.mjs')
			.then(({ startPrivateServer }) => startPrivateServer({ dir: '${dir}' }))
			.catch((error) => console.log(error.message))`;
		const child = spawn(process.execPath, ['-e', command]);
		let said = '';
		child.stdout.on('data', (part) => (said += part));
		await new Promise((done) => child.on('close', done));
		expect(said).toContain(`Process ${process.pid} already runs a database server`);
	});

	it('recovers what was committed when it was killed', async () => {
		const first = await start();
		const database = connect(first.url);
		await database.sequelize.query('CREATE TABLE kept (n INT)');
		await database.sequelize.query('INSERT INTO kept VALUES (7)');
		process.kill(first.pid, 'SIGKILL');
		await first.stop();
		await start();
		const [result] = await database.sequelize.query('DELETE FROM kept WHERE n = 7');
		expect(result).toMatchObject({ affectedRows: 1 });
		await database.close();
	});

	it('is taken over when whoever started it is gone', async () => {
		const command = `import('./scripts/lib/mariadb.mjs')
			.then(({ startPrivateServer }) => startPrivateServer({ dir: '${dir}' }))
			.then(({ pid }) => { console.log(pid); process.kill(process.pid, 'SIGKILL'); })`;
		const child = spawn(process.execPath, ['-e', command]);
		let said = '';
		child.stdout.on('data', (part) => (said += part));
		await new Promise((done) => child.on('close', done));
		const orphan = Number(said);
		expect(isThere(orphan)).toBe(true);
		const server = await start();
		expect(server.pid).not.toBe(orphan);
		expect(isThere(orphan)).toBe(false);
		expect(await answers(server.url)).toBe(true);
	});

	it('lets nobody in without its password, and its account nowhere but to the product', async () => {
		const { port, url } = await start();
		expect(statSync(`${dir}/access.json`).mode & 0o077).toBe(0);
		const { password, rootPassword } = JSON.parse(readFileSync(`${dir}/access.json`, 'utf8'));
		expect(new Set([password, rootPassword, '']).size).toBe(3);
		for (const account of ['root:', 'tallyplate:', `root:${rootPassword}`, ':'])
			await expect(answers(`mariadb://${account}@127.0.0.1:${port}/mysql`)).rejects.toMatchObject({
				cause: { message: expect.stringContaining('Access denied') }
			});
		const database = connect(url, { pool: 1 });
		for (const statement of ['CREATE DATABASE elsewhere', 'SELECT * FROM mysql.global_priv'])
			await expect(database.sequelize.query(statement)).rejects.toThrow(/denied/);
		await database.close();
	});
});
