import { spawn } from 'node:child_process';
import { once } from 'node:events';
import { describe, expect, inject, it } from 'vitest';
import { ROOT } from '../../scripts/lib/project.mjs';

/**
 * Runs the start command on the run's database, so that the private server of this checkout is left
 * alone, and ends it once it is open.
 */
async function start(environment: Readonly<Record<string, string>>) {
	const child = spawn(process.execPath, ['scripts/start.mjs'], {
		cwd: ROOT,
		env: { ...process.env, DATABASE_URL: inject('builtDatabaseUrl'), ...environment },
		stdio: ['ignore', 'pipe', 'pipe']
	});
	let output = '';
	let health: unknown;
	child.stderr.on('data', (part) => (output += part));
	child.stdout.on('data', (part) => {
		output += part;
		const [, origin] = /^Open (\S+)$/m.exec(output) ?? [];
		if (!origin || health !== undefined) return;
		health = fetch(`${origin}/healthz`)
			.then((response) => response.json())
			.finally(() => child.kill('SIGTERM'));
	});
	const [code] = await once(child, 'exit');
	return { code, output, health: await health };
}

describe('npm start', () => {
	it('prints each step with its time and where to open, serves, and ends in order', async () => {
		const { code, output, health } = await start({ PORT: '0' });
		for (const step of ['Packages', 'Database', 'Tables', 'Build', 'Server'])
			expect(output).toMatch(new RegExp(`^ {2}${step} .* \\d+\\.\\d s$`, 'm'));
		expect(output).toContain('the server that DATABASE_URL names');
		expect(health).toMatchObject({ status: 'ok' });
		expect(code).toBe(0);
	});

	it('says in one sentence that the port is taken, before anything takes long', async () => {
		const { port } = new URL(inject('origin'));
		const { code, output } = await start({ PORT: port });
		expect(output.trim()).toBe(
			`Port ${port} is taken on 127.0.0.1. Stop what uses it, or choose another: PORT=${Number(port) + 1} npm start`
		);
		expect(code).toBe(1);
	});

	it('names a setting that is wrong', async () => {
		const { code, output } = await start({ PORT: 'eighty' });
		expect(output).toContain('PORT is "eighty"; expected a whole number from 0 to 65535.');
		expect(code).toBe(1);
	});
});
