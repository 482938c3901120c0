/**
 * Holds every rule of the data folder: `npm run data:check`.
 * Prints each finding with its place and a count per rule; exits 1 when there is one.
 */
import { fileURLToPath } from 'node:url';
import { CHECKS } from './checks';
import { readData } from './read';

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
