// Lanes that look at the sources and run nothing of them: each counts as one test.
import { runNode } from '../commands.mjs';
import { ensureBuild } from '../build.mjs';

/**
 * Commands one after the other, up to the first that fails.
 * @param {string[][]} commands arguments for Node
 * @returns {Promise<import('./lane.mjs').Outcome>}
 */
async function allSucceed(commands) {
	let shown = '';
	for (const args of commands) {
		const { code, output } = await runNode(args);
		shown = output;
		if (code !== 0) return { passed: 0, failed: 1, skipped: 0, output: shown };
	}
	return { passed: 1, failed: 0, skipped: 0, output: shown };
}

const SYNC = ['node_modules/@sveltejs/kit/svelte-kit.js', 'sync'];

/** Has to be through before two lanes need the generated types at once. */
export const syncTypes = () => runNode(SYNC);

export const types = () =>
	allSucceed([
		[
			'node_modules/svelte-check/bin/svelte-check',
			// Named, so that the bench's application of its own is not looked into.
			'--config',
			'svelte.config.js',
			'--tsconfig',
			'./tsconfig.json',
			'--threshold',
			'error'
		]
	]);

export const lint = () =>
	allSucceed([
		[
			'node_modules/prettier/bin/prettier.cjs',
			'--check',
			'--log-level=warn',
			'--cache',
			'--cache-location=.local/cache/prettier',
			'.'
		],
		[
			'node_modules/eslint/bin/eslint.js',
			'--max-warnings=0',
			'--cache',
			'--cache-location=.local/cache/eslint',
			'.'
		]
	]);

export const data = () => allSucceed([['--import', 'tsx', 'scripts/data/check.ts']]);

/** @returns {Promise<import('./lane.mjs').Outcome>} */
export async function build() {
	await ensureBuild();
	return { passed: 1, failed: 0, skipped: 0, output: '' };
}
