/**
 * Holds every rule of the data folder: `npm run data:check`.
 * Prints each finding with its place and a count per rule; exits 1 when there is one. Then counts the questions that the
 * tables leave open, which fail nothing: sources do differ.
 */
import { fileURLToPath } from 'node:url';
import { compile } from '../../src/lib/decoder';
import { contradictionsOf } from '../../src/lib/decoder/contradictions';
import { contradictionText } from '../../src/lib/text/en/contradictions';
import { CONTRADICTIONS } from '../../src/lib/types';
import { CHECKS } from './checks';
import { readContent, readData } from './read';

const root = process.argv[2] ?? fileURLToPath(new URL('../../data', import.meta.url));
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
	const open = contradictionsOf(compile(readContent(root)));
	const counts = CONTRADICTIONS.map((name) => ({
		name,
		count: open.filter(({ check }) => check === name).length
	})).filter(({ count }) => count > 0);
	console.log(
		`open questions: ${counts.map(({ name, count }) => `${contradictionText.names[name]} ${count}`).join(', ') || 'none'}`
	);
}
