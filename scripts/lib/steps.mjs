// Steps of a command, each printed with how it came out and how long it took.

/** @param {number} ms */
export const seconds = (ms) => `${(ms / 1000).toFixed(1)} s`;

const NAME_WIDTH = 12;
const NOTE_WIDTH = 46;

/** @param {string} name @param {string} note @param {number} ms */
export const stepLine = (name, note, ms) =>
	`  ${name.padEnd(NAME_WIDTH)}${note.padEnd(NOTE_WIDTH)}${seconds(ms).padStart(8)}`;

/**
 * Runs one step and prints its line.
 * @template T
 * @param {string} name
 * @param {(say: (note: string) => void) => Promise<T>} work `say`: how it came out; the last word counts
 * @returns {Promise<T>}
 */
export async function step(name, work) {
	const started = performance.now();
	let note = 'done';
	const result = await work((words) => (note = words));
	console.log(stepLine(name, note, performance.now() - started));
	return result;
}

/**
 * Says on a terminal what is going on, before a step that takes its time.
 * @param {string} words
 */
export const announce = (words) => console.log(`  ${words} …`);
