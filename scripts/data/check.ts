/**
 * Holds every rule of the data folder: `npm run data:check`.
 * Prints each finding with its place and a count per rule; exits 1 when there is one. Then counts the questions that the
 * tables leave open and no line of `exceptions.csv` closes, which fail nothing: sources do differ.
 *   npm run data:check                 counts them
 *   npm run data:check -- --questions  asks each of them, with its rows and digest
 */
import { fileURLToPath } from 'node:url';
import { parseArgs } from 'node:util';
import { compile } from '../../src/lib/decoder';
import { contradictionsOf } from '../../src/lib/decoder/contradictions';
import { contradictionText } from '../../src/lib/text/en/contradictions';
import { CONTRADICTIONS } from '../../src/lib/types';
import { CHECKS } from './checks';
import { openQuestions, questionKey } from './exceptions';
import { contentOf, readData } from './read';

const { values, positionals } = parseArgs({
	options: { questions: { type: 'boolean', default: false } },
	allowPositionals: true
});
const root = positionals[0] ?? fileURLToPath(new URL('../../data', import.meta.url));
const data = readData(root);
let total = 0;
for (const { name, check } of CHECKS) {
	const findings = check(data);
	total += findings.length;
	for (const { file, line, message } of findings) console.log(`data/${file}:${line} ${message}`);
	console.log(`${name}: ${findings.length === 0 ? 'fine' : `${findings.length} found`}`);
}
console.log(
	`${data.rows.length} rows, ${data.citations.length} citations, ${data.sources.length} sources: ` +
		(total === 0 ? 'nothing found' : `${total} found`)
);
process.exitCode = total === 0 ? 0 : 1;
if (total === 0) {
	const { open, lapsed } = openQuestions(
		contradictionsOf(compile(contentOf(data))),
		data.exceptions.map(({ value, ...place }) => ({ ...value, ...place }))
	);
	for (const exception of lapsed)
		console.log(
			`data/${exception.file}:${exception.line} holds no more: ${questionKey(exception)}`
		);
	for (const name of CONTRADICTIONS) {
		const hits = open.filter(({ check }) => check === name);
		const [first] = hits;
		if (first !== undefined)
			console.log(
				`${hits.length} × ${contradictionText.names[name]} (${contradictionText.weights[first.weight]})`
			);
		if (values.questions)
			for (const { rows, sources, digest, message } of hits)
				console.log(`  ${[...(rows.length > 0 ? rows : sources)].join(' ')} ${digest} ${message}`);
	}
	console.log(
		`open questions: ${open.length}, closed by an exception: ${data.exceptions.length - lapsed.length}`
	);
}
