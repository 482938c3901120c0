// Debian packages that the commands need. Node built-ins only: runs before the packages are there.
import { spawn } from 'node:child_process';
import { existsSync } from 'node:fs';
import { delimiter, join } from 'node:path';
import { setTimeout as pause } from 'node:timers/promises';

/** Where an ordinary user's PATH does not look, and Debian puts servers. */
const MORE_FOLDERS = [
	'/usr/local/sbin',
	'/usr/local/bin',
	'/usr/sbin',
	'/usr/bin',
	'/sbin',
	'/bin'
];
const APT_WAIT_S = 180;

/** Said to somebody who has to do something before the command can go on. */
export class SetupError extends Error {
	/** @param {string} message */
	constructor(message) {
		super(message);
		this.name = 'SetupError';
	}
}

/**
 * The path of a program, or undefined.
 * @param {string} name
 * @returns {string | undefined}
 */
export function findProgram(name) {
	const folders = [...(process.env.PATH ?? '').split(delimiter), ...MORE_FOLDERS];
	return folders
		.filter(Boolean)
		.map((folder) => join(folder, name))
		.find(existsSync);
}

/**
 * Runs apt-get to its end.
 * @param {string[]} args
 * @returns {Promise<{ code: number | null, output: string }>}
 */
function aptGet(args) {
	return new Promise((resolve, reject) => {
		// `update` does not wait for another run by itself, `install` does with this option.
		const child = spawn('apt-get', ['-o', `DPkg::Lock::Timeout=${APT_WAIT_S}`, ...args], {
			env: { ...process.env, DEBIAN_FRONTEND: 'noninteractive', LC_ALL: 'C' },
			stdio: ['ignore', 'pipe', 'pipe']
		});
		let output = '';
		child.stdout.on('data', (part) => (output += part));
		child.stderr.on('data', (part) => (output += part));
		child.on('error', reject);
		child.on('close', (code) => resolve({ code, output }));
	});
}

/** @param {string[]} args */
async function aptGetPatiently(args) {
	const until = Date.now() + APT_WAIT_S * 1000;
	for (;;) {
		const result = await aptGet(args);
		const locked = result.code !== 0 && /could not get lock|unable to lock/i.test(result.output);
		if (!locked || Date.now() > until) return result;
		await pause(1000);
	}
}

/**
 * Installs Debian packages when this is root on a machine with apt.
 * @param {string[]} packages
 * @param {string} what what they are, for the sentence said otherwise
 * @param {(line: string) => void} log
 * @throws {SetupError} one sentence with the command to type
 */
export async function installPackages(packages, what, log) {
	const command = `apt-get install --no-install-recommends ${packages.join(' ')}`;
	if (!findProgram('apt-get'))
		throw new SetupError(
			`${what} is missing. On Debian: sudo ${command}; elsewhere install it as your system does.`
		);
	if (process.getuid?.() !== 0)
		throw new SetupError(`${what} is missing. Install it first: sudo ${command}`);
	log(`Installing ${packages.join(', ')} from Debian`);
	const install = ['install', '-y', '--no-install-recommends', ...packages];
	let result = await aptGetPatiently(install);
	if (result.code !== 0) {
		// No list of packages yet, or an old one.
		await aptGetPatiently(['update']);
		result = await aptGetPatiently(install);
	}
	if (result.code !== 0) {
		const last = result.output.trim().split('\n').slice(-3).join(' / ');
		throw new SetupError(`${what} could not be installed (${last}). Try: ${command}`);
	}
}
