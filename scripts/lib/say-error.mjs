// How a command says why it stopped.
import { inspect } from 'node:util';

/** Errors whose message is all that their reader needs. */
const FORESEEN = new Set(['SetupError', 'ListenError', 'ConfigurationError', 'CommandError']);

/**
 * What to say of an error: its message when it was foreseen, else the stack too.
 * @param {unknown} error @returns {string}
 */
export const wordsOf = (error) =>
	error instanceof Error && FORESEEN.has(error.name) ? error.message : inspect(error);

/** @param {unknown} error */
export const sayError = (error) => console.error(wordsOf(error));
