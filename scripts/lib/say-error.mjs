// How a command says why it stopped.
import { CommandError } from './commands.mjs';

/** Errors whose message is all that their reader needs. */
const PLAIN = new Set(['SetupError', 'ListenError', 'ConfigurationError', 'CommandError']);
const LINES = 40;

/**
 * Prints an error: one sentence when it was foreseen, the end of the output of a command that failed,
 * else the stack.
 * @param {unknown} error
 */
export function sayError(error) {
	if (error instanceof CommandError) {
		console.error(error.output.trim().split('\n').slice(-LINES).join('\n'));
		console.error();
	}
	const plain = error instanceof Error && PLAIN.has(error.name);
	console.error(plain ? error.message : error);
}
