/**
 * Writes the live tables back to the data folder in their canonical form.
 *   npm run data:export               to data/
 *   npm run data:export -- folder     elsewhere
 */
import { existsSync, mkdirSync, readFileSync, writeFileSync } from 'node:fs';
import { dirname, join } from 'node:path';
import { contentOf } from '../../src/lib/server/reference';
import type { EditionContent } from '../../src/lib/types';
import { PROJECT, runCommand, withDatabase } from '../db/database';
import { CITATION_COLUMNS, ROW_COLUMNS } from './columns';
import { readFiles } from './read';
import { csv, editionFiles } from './write';

/**
 * Writes content to a folder; files that would not change are left alone.
 * @returns the files written, relative to the folder
 */
export function exportContent(content: EditionContent, folder: string): string[] {
	const files = editionFiles(content);
	// A table that lost its last row keeps its file, with the header alone.
	for (const file of readFiles(folder).keys())
		if (file.includes('/') && !files.has(file))
			files.set(file, csv(file.endsWith('.citations.csv') ? CITATION_COLUMNS : ROW_COLUMNS, []));
	const written: string[] = [];
	for (const [file, text] of files) {
		const path = join(folder, file);
		if (existsSync(path) && readFileSync(path, 'utf8') === text) continue;
		mkdirSync(dirname(path), { recursive: true });
		writeFileSync(path, text);
		written.push(file);
	}
	return written;
}

if (process.argv[1] === import.meta.filename)
	runCommand(async () => {
		const folder = process.argv[2] ?? join(PROJECT, 'data');
		const { head, content } = await withDatabase((database) => contentOf(database));
		const written = exportContent(content, folder);
		console.log(`Edition ${head.number}: ${written.length} files written to ${folder}`);
		for (const file of written) console.log(`  ${file}`);
	});
