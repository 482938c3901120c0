// The worker of who starts the product: a process of its own, started anew when it dies.
import { fork } from 'node:child_process';
import { once } from 'node:events';
import { setTimeout as pause } from 'node:timers/promises';
import { SetupError } from './debian.mjs';
import { inProject } from './project.mjs';

const AGAIN_MS = 1000;

/**
 * Starts it.
 * @param {Record<string, string>} [environment] beside this process's own variables
 * @returns {Promise<{ pid: () => number | undefined, stop: () => Promise<void> }>} once it works
 * @throws when it does not come to work the first time
 */
export async function startWorkerProcess(environment = {}) {
	let stopping = false;
	const begin = () =>
		fork(inProject('scripts/worker.ts'), {
			execArgv: ['--import', 'tsx'],
			env: { ...process.env, ...environment },
			stdio: ['ignore', 'inherit', 'inherit', 'ipc']
		});
	let child = begin();
	const first = await Promise.race([once(child, 'message'), once(child, 'exit').then(() => null)]);
	if (first === null) throw new SetupError('The worker did not start.');

	const watch = async () => {
		for (;;) {
			await once(child, 'exit');
			if (stopping) return;
			await pause(AGAIN_MS);
			if (stopping) return;
			child = begin();
		}
	};
	const watching = watch();
	return {
		pid: () => child.pid,
		stop: async () => {
			stopping = true;
			child.kill('SIGTERM');
			await watching;
		}
	};
}
