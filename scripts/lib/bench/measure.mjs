// Measures the figures of one module, in a process of its own, so that no figure warms or burdens
// another. Prints one line of JSON a figure, after the mark.
import { pathToFileURL } from 'node:url';
import { register } from 'tsx/esm/api';

/** @typedef {import('./figure.mjs').Figure} Figure */

const MARK = '@figure ';

/** @param {Record<string, any>} module @returns {Figure[]} */
const figuresIn = (module) => module.figures ?? [/** @type {Figure} */ (module)];

register();
const module = await import(pathToFileURL(process.argv[2] ?? '').href);
for (const { name, bound, unit, direction, run } of figuresIn(module)) {
	const value = await run();
	console.log(MARK + JSON.stringify({ name, bound, unit, direction, value }));
}
// What a module left open does not hold up the next.
process.exit(0);
