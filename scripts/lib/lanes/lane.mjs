// A lane of the tests: one kind of check, with a count, a time, and what it printed.
import { mkdirSync, writeFileSync } from 'node:fs';
import { dirname, join, relative } from 'node:path';
import { SetupError } from '../debian.mjs';
import { LOCAL, ROOT } from '../project.mjs';
import { wordsOf } from '../say-error.mjs';
import { seconds } from '../steps.mjs';

/**
 * @typedef {object} Outcome
 * @property {number} passed
 * @property {number} failed
 * @property {number} skipped
 * @property {string} output shown when something failed
 *
 * @typedef {object} Lane
 * @property {string} name
 * @property {string[]} [after] lanes that have to be through first
 * @property {() => Promise<Outcome>} run
 *
 * @typedef {Outcome & { name: string, ms: number }} Result
 */

/** @param {unknown} error @returns {Outcome} */
const broken = (error) => ({
	passed: 0,
	failed: 1,
	skipped: 0,
	output: wordsOf(error)
});

/** @param {Lane} lane @returns {Promise<Result>} */
async function runLane({ name, run }) {
	const started = performance.now();
	const outcome = await run().catch(broken);
	return { ...outcome, name, ms: performance.now() - started };
}

/** @param {Result} result */
function lineOf({ name, ms, passed, failed, skipped }) {
	const counts = [
		`${passed} passed`,
		failed > 0 && `${failed} failed`,
		skipped > 0 && `${skipped} skipped`
	];
	return `  ${name.padEnd(14)}${seconds(ms).padStart(8)}   ${counts.filter(Boolean).join(', ')}`;
}

/** Enough to see what went wrong; the whole of it is kept in a file. */
const SHOWN_LINES = 200;

/** @param {Result} result */
function print(result) {
	console.log(lineOf(result));
	if (result.failed === 0) return;
	const lines = result.output.trim().split('\n');
	const file = join(LOCAL, 'reports', `${result.name}.log`);
	mkdirSync(dirname(file), { recursive: true });
	writeFileSync(file, result.output);
	if (lines.length > SHOWN_LINES) console.log(`\nThe last lines of ${relative(ROOT, file)}:`);
	console.log(`\n${lines.slice(-SHOWN_LINES).join('\n')}\n`);
}

/**
 * Runs lanes in their order, so many at a time; one that waits for another lets the next go ahead. A lane
 * whose forerunner failed fails too.
 * @param {Lane[]} lanes
 * @param {number} [atOnce] two processors are what there is
 * @returns {Promise<Result[]>}
 */
export async function runLanes(lanes, atOnce = 2) {
	const names = new Set(lanes.map(({ name }) => name));
	const waiting = [...lanes];
	/** @type {Map<string, Result>} */
	const results = new Map();
	/** @type {Set<Promise<void>>} */
	const running = new Set();

	/** Forerunners that are run at all. @param {Lane} lane */
	const forerunners = ({ after = [] }) => after.filter((name) => names.has(name));
	const next = () =>
		waiting.findIndex((lane) => forerunners(lane).every((name) => results.has(name)));

	while (waiting.length > 0 || running.size > 0) {
		const index = running.size < atOnce ? next() : -1;
		if (index < 0) {
			await Promise.race(running);
			continue;
		}
		const [lane] = /** @type {[Lane]} */ (waiting.splice(index, 1));
		const failed = forerunners(lane).find((name) => results.get(name)?.failed);
		const run = failed
			? () => Promise.reject(new SetupError(`${failed} failed, on which this rests.`))
			: lane.run;
		const work = runLane({ ...lane, run }).then((result) => {
			results.set(lane.name, result);
			print(result);
			running.delete(work);
		});
		running.add(work);
	}
	return [...results.values()];
}

/**
 * The closing line of a run, and whether all went well.
 * @param {Result[]} results
 */
export function sumOf(results) {
	const passed = results.reduce((sum, result) => sum + result.passed, 0);
	const failed = results.reduce((sum, result) => sum + result.failed, 0);
	return { line: `${passed} passed, ${failed} failed`, ok: failed === 0 && passed > 0 };
}
