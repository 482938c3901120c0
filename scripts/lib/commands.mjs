// Commands that another command runs: their output is kept for the case that they fail, and none
// outlives its starter.
import { spawn } from 'node:child_process';
import { ROOT } from './project.mjs';

/** @type {Set<import('node:child_process').ChildProcess>} */
const running = new Set();

const LINES = 40;

/** Said when a command that has to succeed did not: the end of what it printed, and which it was. */
export class CommandError extends Error {
	/** @param {string} what @param {number | string | null} ended @param {string} output */
	constructor(what, ended, output) {
		const last = output.trim().split('\n').slice(-LINES).join('\n');
		super(`${last}\n\n${what} failed (${ended}).`);
		this.name = 'CommandError';
	}
}

/**
 * @typedef {object} Ended
 * @property {number | null} code null when it was ended by a signal
 * @property {NodeJS.Signals | null} signal
 * @property {string} output both streams, as they came
 *
 * @typedef {object} RunOptions
 * @property {Record<string, string | undefined>} [env] beside this process's own
 * @property {number} [timeoutMs]
 */

/**
 * Runs a command in the project's root, in a process group of its own.
 * @param {string} command @param {string[]} args @param {RunOptions} [options]
 * @returns {Promise<Ended>}
 */
export function run(command, args, { env = {}, timeoutMs } = {}) {
	return new Promise((resolve, reject) => {
		const child = spawn(command, args, {
			cwd: ROOT,
			env: { ...process.env, ...env },
			stdio: ['ignore', 'pipe', 'pipe'],
			detached: true
		});
		running.add(child);
		let output = '';
		child.stdout.on('data', (part) => (output += part));
		child.stderr.on('data', (part) => (output += part));
		const timer = timeoutMs && setTimeout(() => endGroup(child, 'SIGKILL'), timeoutMs);
		const settle = () => {
			running.delete(child);
			if (timer) clearTimeout(timer);
		};
		child.once('error', (error) => {
			settle();
			reject(error);
		});
		child.once('close', (code, signal) => {
			settle();
			resolve({ code, signal, output });
		});
	});
}

/**
 * Runs a Node program of the project or of one of its packages.
 * @param {string[]} args @param {RunOptions} [options]
 */
export const runNode = (args, options) => run(process.execPath, args, options);

/**
 * @param {string} what the step, for the sentence said when it fails
 * @param {Promise<Ended>} ending
 * @returns {Promise<string>} what was printed
 * @throws {CommandError}
 */
export async function succeed(what, ending) {
	const { code, signal, output } = await ending;
	if (code !== 0) throw new CommandError(what, code ?? signal, output);
	return output;
}

/** @param {import('node:child_process').ChildProcess} child @param {NodeJS.Signals} signal */
function endGroup(child, signal) {
	try {
		process.kill(-(child.pid ?? 0), signal);
	} catch (error) {
		if (/** @type {NodeJS.ErrnoException} */ (error).code !== 'ESRCH') throw error;
	}
}

/** Asks everything that still runs to end. @param {NodeJS.Signals} [signal] */
export function endCommands(signal = 'SIGTERM') {
	for (const child of running) endGroup(child, signal);
}
