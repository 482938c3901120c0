// Lanes that run a project of vite.config.ts.
import { existsSync, mkdirSync, readFileSync, rmSync } from 'node:fs';
import { dirname, join } from 'node:path';
import { runNode } from '../commands.mjs';
import { LOCAL } from '../project.mjs';

/**
 * What Vitest's report counts.
 * @typedef {{ numPassedTests: number, numFailedTests: number, numPendingTests: number, numTodoTests: number }} Report
 */

/**
 * A lane over one project.
 * @param {string} project
 * @param {string[]} [more] further arguments of Vitest
 * @param {number} [timeoutMs]
 * @returns {() => Promise<import('./lane.mjs').Outcome>}
 */
export function vitestLane(project, more = [], timeoutMs = 480_000) {
	return async () => {
		const file = join(LOCAL, 'reports', `${project}.json`);
		mkdirSync(dirname(file), { recursive: true });
		rmSync(file, { force: true });
		const { code, output } = await runNode(
			[
				'node_modules/vitest/vitest.mjs',
				'run',
				`--project=${project}`,
				'--reporter=default',
				'--reporter=json',
				`--outputFile.json=${file}`,
				...more
			],
			{ timeoutMs }
		);
		return outcomeOf(
			existsSync(file) ? JSON.parse(readFileSync(file, 'utf8')) : null,
			code,
			output
		);
	};
}

/**
 * @param {Report | null} report null when Vitest did not come to write one
 * @param {number | null} code
 * @param {string} output
 * @returns {import('./lane.mjs').Outcome}
 */
export function outcomeOf(report, code, output) {
	const failed = report?.numFailedTests ?? 0;
	return {
		passed: report?.numPassedTests ?? 0,
		// A file that does not load, or a threshold that is missed, fails no test of its own.
		failed: code !== 0 && failed === 0 ? 1 : failed,
		skipped: (report?.numPendingTests ?? 0) + (report?.numTodoTests ?? 0),
		output
	};
}
