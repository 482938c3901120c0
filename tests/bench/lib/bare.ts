import { execFile, spawn } from 'node:child_process';
import { once } from 'node:events';
import { cpSync, mkdirSync, mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { createInterface } from 'node:readline';
import { promisify } from 'node:util';
import { inProject, LOCAL } from '../../../scripts/lib/project.mjs';

const execute = promisify(execFile);
const BUILD = join(LOCAL, 'bench-bare');
const ANSWER = join(LOCAL, 'bench-answer.json');

export interface BareServer {
	readonly origin: string;
	readonly end: () => Promise<void>;
}

/** What makes a folder a SvelteKit application, beside its sources. */
const FRAME = {
	'package.json': '{ "name": "bare", "private": true, "type": "module" }',
	'svelte.config.js': `import adapter from '@sveltejs/adapter-node';
export default { kit: { adapter: adapter({ out: ${JSON.stringify(BUILD)} }) } };`,
	'vite.config.js': `import { sveltekit } from '@sveltejs/kit/vite';
export default { plugins: [sveltekit()] };`
};

/**
 * Builds the bare application: what SvelteKit costs by itself. SvelteKit looks for it in the working directory;
 * a second configuration that stayed in the project would confuse every tool that looks for one.
 */
export async function buildBare(): Promise<void> {
	mkdirSync(LOCAL, { recursive: true });
	const folder = mkdtempSync(join(LOCAL, 'bare-'));
	try {
		cpSync(inProject('tests/bench/bare'), join(folder, 'src'), { recursive: true });
		for (const [name, content] of Object.entries(FRAME)) writeFileSync(join(folder, name), content);
		await execute(process.execPath, [inProject('node_modules/vite/bin/vite.js'), 'build'], {
			cwd: folder,
			env: { ...process.env, NODE_ENV: 'production' }
		});
	} finally {
		rmSync(folder, { recursive: true });
	}
}

/**
 * Starts the bare application on a free port.
 * @param answer what /json answers
 * @param items lines on /page
 */
export async function startBare(answer: string, items: number): Promise<BareServer> {
	mkdirSync(LOCAL, { recursive: true });
	writeFileSync(ANSWER, answer);
	const child = spawn(process.execPath, [inProject('tests/bench/lib/bare-server.mjs'), BUILD], {
		env: { ...process.env, NODE_ENV: 'production', BARE_ANSWER: ANSWER, BARE_ITEMS: String(items) },
		stdio: ['ignore', 'pipe', 'inherit']
	});
	const [line] = (await Promise.race([
		once(createInterface(child.stdout), 'line'),
		once(child, 'exit').then(([code]) => {
			throw new Error(`The bare application ended (${code})`);
		})
	])) as [string];
	const port = /^port (\d+)$/.exec(line)?.[1];
	if (port === undefined) throw new Error(`The bare application said: ${line}`);
	return {
		origin: `http://127.0.0.1:${port}`,
		end: async () => {
			child.kill();
			await once(child, 'exit');
		}
	};
}
