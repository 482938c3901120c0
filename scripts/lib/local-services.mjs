// Mail server and store of a demonstration, for who starts the product.
import { fork } from 'node:child_process';
import { once } from 'node:events';
import { join } from 'node:path';
import { inProject } from './project.mjs';

/**
 * @typedef {object} LocalServices
 * @property {Record<string, string>} environment the variables by which the product finds them
 * @property {() => Promise<void>} stop
 */

/**
 * Starts both on free ports of loopback.
 * @param {string} folder where mails and objects are kept
 * @returns {Promise<LocalServices>}
 */
export async function startLocalServices(folder) {
	const child = fork(
		inProject('scripts/local/services.mjs'),
		[join(folder, 'mailbox'), join(folder, 'store')],
		{ stdio: ['ignore', 'ignore', 'pipe', 'ipc'] }
	);
	let complaint = '';
	child.stderr?.on('data', (part) => (complaint += part));
	const exit = once(child, 'exit');
	const first = await Promise.race([once(child, 'message'), exit.then(() => null)]);
	if (first === null)
		throw new Error(`The local mail server and file store did not start: ${complaint}`);
	return {
		environment: first[0],
		stop: async () => {
			child.kill('SIGTERM');
			await exit;
		}
	};
}
