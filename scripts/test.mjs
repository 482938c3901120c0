// npm test: every check, from a fresh clone. Node built-ins only, until packages are there.
import { parseArgs } from 'node:util';
import { endCommands } from './lib/commands.mjs';
import { findProgram, installPackages, SetupError } from './lib/debian.mjs';
import { runLanes, sumOf } from './lib/lanes/lane.mjs';
import * as checks from './lib/lanes/static.mjs';
import { vitestLane } from './lib/lanes/vitest.mjs';
import { ensureMariadb } from './lib/mariadb.mjs';
import { ensurePackages } from './lib/packages.mjs';
import { sayError } from './lib/say-error.mjs';
import { announce, seconds, step } from './lib/steps.mjs';

const COVERAGE = ['--coverage.enabled', '--coverage.thresholds.branches=100'];

/** @type {import('./lib/lanes/lane.mjs').Lane[]} */
const LANES = [
	{ name: 'build', run: checks.build },
	{ name: 'types', run: checks.types },
	{ name: 'lint', run: checks.lint },
	{ name: 'data', run: checks.data },
	{ name: 'unit', run: vitestLane('unit', COVERAGE) },
	{ name: 'browser', run: vitestLane('e2e'), after: ['build'] },
	{ name: 'integration', run: vitestLane('integration') }
];
const names = LANES.map(({ name }) => name);

/** @returns {import('./lib/lanes/lane.mjs').Lane[]} */
function chosenLanes() {
	const { values } = parseArgs({ options: { lane: { type: 'string', multiple: true } } });
	const unknown = values.lane?.find((name) => !names.includes(name));
	if (unknown) throw new SetupError(`There is no lane ${unknown}. Lanes: ${names.join(', ')}.`);
	if (!values.lane) return LANES;
	// A browser needs something to look at.
	const wanted = values.lane.includes('browser') ? ['build', ...values.lane] : values.lane;
	return LANES.filter(({ name }) => wanted.includes(name));
}

/** @param {string[]} lanes */
async function ensureDebian(lanes) {
	if (lanes.includes('integration') || lanes.includes('browser')) await ensureMariadb(announce);
	if (lanes.includes('browser') && !findProgram('chromium') && !process.env.CHROME_PATH)
		await installPackages(['chromium'], 'Chromium', announce);
}

async function test() {
	const started = performance.now();
	const lanes = chosenLanes();
	await step('Packages', async (say) => say((await ensurePackages()) ? 'installed' : 'in place'));
	await step('Debian', () => ensureDebian(lanes.map(({ name }) => name)));
	await checks.syncTypes();
	const { line, ok } = sumOf(await runLanes(lanes));
	console.log(`\nTook ${seconds(performance.now() - started)}`);
	console.log(line);
	return ok;
}

for (const [signal, code] of Object.entries({ SIGINT: 130, SIGTERM: 143 }))
	process.on(signal, () => {
		// Vitest closes servers and browsers of its tests on this one.
		endCommands('SIGINT');
		process.exit(code);
	});

try {
	process.exitCode = (await test()) ? 0 : 1;
} catch (error) {
	sayError(error);
	console.log('0 passed, 1 failed');
	process.exitCode = 1;
}
