// The build that the server serves.
import { existsSync } from 'node:fs';
import { join } from 'node:path';
import { runNode, succeed } from './commands.mjs';
import { digestOf, isStamped, stamp } from './digests.mjs';
import { BUILD } from './project.mjs';

/** All that the build is made from. */
const SOURCES = [
	'src',
	'static',
	'scripts/vite',
	'package-lock.json',
	'package.json',
	'svelte.config.js',
	'tsconfig.json',
	'vite.config.ts'
];
const STAMP = join(BUILD, 'sources.sha256');

/**
 * Builds when the sources have changed since the last build.
 * @returns {Promise<boolean>} whether it was built anew
 * @throws {import('./commands.mjs').CommandError}
 */
export async function ensureBuild() {
	const digest = digestOf(SOURCES);
	if (existsSync(join(BUILD, 'handler.js')) && isStamped(STAMP, digest)) return false;
	await succeed(
		'vite build',
		runNode(['node_modules/vite/bin/vite.js', 'build'], { env: { NODE_ENV: 'production' } })
	);
	stamp(STAMP, digest);
	return true;
}
