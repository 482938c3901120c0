// npm run bench [-- --write] [names…]: measures what has a bound; exits 1 when one is missed.
import { readdirSync, readFileSync, writeFileSync } from 'node:fs';
import { basename, join } from 'node:path';
import { parseArgs } from 'node:util';
import { holds, tableOf, withTable } from './lib/bench/figure.mjs';
import { ensureBuild } from './lib/build.mjs';
import { CommandError, endCommands, runNode } from './lib/commands.mjs';
import { ensureMariadb, SetupError } from './lib/mariadb.mjs';
import { ensurePackages } from './lib/packages.mjs';
import { inProject } from './lib/project.mjs';
import { sayError } from './lib/say-error.mjs';
import { announce, step } from './lib/steps.mjs';

/** @typedef {import('./lib/bench/figure.mjs').Measured} Measured */

const MARK = '@figure ';
const FOLDER = inProject('tests', 'bench');
const README = inProject('README.md');

const { values: options, positionals: wanted } = parseArgs({
	options: { write: { type: 'boolean', default: false } },
	allowPositionals: true
});

/** @returns {string[]} modules, in the order of their names */
function modules() {
	const found = readdirSync(FOLDER)
		.filter((name) => /\.bench\.(?:ts|mjs)$/.test(name))
		.filter((name) => wanted.length === 0 || wanted.some((part) => name.includes(part)))
		.sort();
	if (found.length === 0) throw new SetupError('There is nothing to measure under tests/bench.');
	return found.map((name) => join(FOLDER, name));
}

/** @param {string} file @returns {Promise<Measured[]>} */
async function measure(file) {
	const name = basename(file).replace(/\.bench\.\w+$/, '');
	return step(name, async (say) => {
		const { code, signal, output } = await runNode([
			'--expose-gc',
			inProject('scripts', 'lib', 'bench', 'measure.mjs'),
			file
		]);
		if (code !== 0) throw new CommandError(name, code ?? signal, output);
		const measured = output
			.split('\n')
			.filter((line) => line.startsWith(MARK))
			.map((line) => /** @type {Measured} */ (JSON.parse(line.slice(MARK.length))));
		const missed = measured.filter((figure) => !holds(figure)).length;
		say(missed === 0 ? 'within bounds' : `${missed} of ${measured.length} missed`);
		return measured;
	});
}

async function bench() {
	await step('Packages', async (say) => say((await ensurePackages()) ? 'installed' : 'in place'));
	await step('Build', async (say) => say((await ensureBuild()) ? 'built' : 'in place'));
	await ensureMariadb(announce);
	/** @type {Measured[]} */
	const figures = [];
	for (const file of modules()) figures.push(...(await measure(file)));
	const table = tableOf(figures);
	console.log(`\n${table}\n`);
	if (options.write) writeFileSync(README, withTable(readFileSync(README, 'utf8'), table));
	const missed = figures.filter((figure) => !holds(figure));
	console.log(`${figures.length - missed.length} of ${figures.length} within their bounds`);
	return missed.length === 0;
}

for (const [signal, code] of Object.entries({ SIGINT: 130, SIGTERM: 143 }))
	process.on(signal, () => {
		endCommands();
		process.exit(code);
	});

try {
	process.exitCode = (await bench()) ? 0 : 1;
} catch (error) {
	sayError(error);
	process.exitCode = 1;
}
