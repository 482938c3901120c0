/**
 * Writes the files of a data folder back in canonical form and order:
 * `node --import tsx scripts/data/format.ts [folder]`. A file that cannot be read whole is left alone.
 */
import { writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { fileURLToPath } from 'node:url';
import { contentOf, readData } from './read';
import { collectedFiles, editionFiles, exceptionFiles } from './write';

const root = process.argv[2] ?? fileURLToPath(new URL('../../data', import.meta.url));
const data = readData(root);
const broken = new Set(data.unreadable.map(({ file }) => file));
for (const { file, line, message } of data.unreadable) console.log(`${file}:${line} ${message}`);
const canonical = new Map([
	...editionFiles(contentOf(data)),
	...collectedFiles({
		mapping: data.mapping.map(({ value }) => value),
		candidates: data.candidates.map(({ value }) => value),
		rejected: data.rejected.map(({ value }) => value)
	}),
	...exceptionFiles(data.exceptions.map(({ value }) => value))
]);
for (const [file, text] of canonical) {
	if (broken.has(file) || !data.files.has(file) || data.files.get(file) === text) continue;
	writeFileSync(join(root, file), text);
	console.log(`wrote ${file}`);
}
