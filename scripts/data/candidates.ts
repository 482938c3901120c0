/**
 * Compares a folder of collected facts with what `data/candidates.csv` accounts for:
 * `node --import tsx scripts/data/candidates.ts <folder> [data folder]`.
 * Reports facts that are new, changed or missing, and exits 1 when there are any.
 */
import { createHash } from 'node:crypto';
import { readFileSync, readdirSync } from 'node:fs';
import { basename, join } from 'node:path';
import { argv } from 'node:process';
import { fileURLToPath, pathToFileURL } from 'node:url';
import { parse } from 'csv-parse/sync';
import { compareCandidates, type Candidate } from './collected';
import { readData } from './read';

/** First twelve figures of the SHA-256 over a record's cells in column order, joined by U+001F. */
export const digestOf = (cells: readonly string[]): string =>
	createHash('sha256').update(cells.join('\u001f')).digest('hex').slice(0, 12);

/** Digests of the records of collected files by candidate id; `texts` is keyed by file stem. */
export function digestsOf(texts: ReadonlyMap<string, string>): Map<string, string> {
	const digests = new Map<string, string>();
	for (const [stem, text] of texts) {
		const records = parse(text) as string[][];
		for (const [index, cells] of records.slice(1).entries())
			digests.set(`${stem}-${index + 1}`, digestOf(cells));
	}
	return digests;
}

export interface Comparison {
	/** Collected, but not accounted for. */
	readonly added: readonly string[];
	/** Accounted for, but the fact reads otherwise now. */
	readonly changed: readonly string[];
	/** Accounted for, but no longer collected. */
	readonly missing: readonly string[];
}

/** Holds collected facts against the list of what became of them. */
export function compareCollected(
	digests: ReadonlyMap<string, string>,
	candidates: readonly Candidate[]
): Comparison {
	const known = new Map(candidates.map(({ candidate, digest }) => [candidate, digest]));
	const ids = [...digests.keys()].sort(compareCandidates);
	return {
		added: ids.filter((id) => !known.has(id)),
		changed: ids.filter((id) => known.has(id) && known.get(id) !== digests.get(id)),
		missing: [...known.keys()].filter((id) => !digests.has(id)).sort(compareCandidates)
	};
}

function main(folder: string, dataFolder: string): void {
	const texts = new Map(
		readdirSync(folder)
			.filter((name) => name.endsWith('.csv'))
			.sort()
			.map((name) => [basename(name, '.csv'), readFileSync(join(folder, name), 'utf8')])
	);
	const candidates = readData(dataFolder).candidates.map(({ value }) => value);
	const comparison = compareCollected(digestsOf(texts), candidates);
	let total = 0;
	for (const [label, ids] of Object.entries(comparison) as [string, readonly string[]][]) {
		total += ids.length;
		for (const id of ids) console.log(`${label} ${id}`);
		console.log(`${label}: ${ids.length}`);
	}
	process.exitCode = total === 0 ? 0 : 1;
}

if (argv[1] !== undefined && import.meta.url === pathToFileURL(argv[1]).href) {
	const [, , folder, dataFolder = fileURLToPath(new URL('../../data', import.meta.url))] = argv;
	if (folder === undefined) {
		console.error('Say which folder holds the collected facts.');
		process.exitCode = 2;
	} else main(folder, dataFolder);
}
