/**
 * Counts the worked examples that published pages print and the tests hold the tables against, and names those that
 * are knowingly missed: `npm run data:examples` writes what the coverage page shows. A test fails when it is out of date.
 */
import { existsSync, readFileSync, writeFileSync } from 'node:fs';
import { fileURLToPath } from 'node:url';
import { parse } from 'csv-parse/sync';
import { KNOWN_MAKERS, type PublishedExamples } from '../../src/lib/types/published';
import type { StampKind } from '../../src/lib/types';

const here = (path: string): string => fileURLToPath(new URL(path, import.meta.url));
const FILE = here('../../src/lib/server/reference/published-examples.json');

interface Sample {
	readonly maker: string;
	readonly kind: StampKind;
	readonly text: string;
	readonly source: string;
	readonly reason: string;
}

const rowsOf = (path: string): Record<string, string>[] => {
	const file = here(`../../tests/published/${path}`);
	return existsSync(file) ? parse(readFileSync(file, 'utf8'), { columns: true }) : [];
};

const sampleOf = (
	maker: string,
	kind: StampKind,
	{ text = '', source = '', known_miss: reason = '' }: Record<string, string>
): Sample => ({ maker, kind, text, source, reason });

function samples(): Sample[] {
	const own = KNOWN_MAKERS.flatMap((maker) => [
		...rowsOf(`serials/${maker}.csv`).map((row) => sampleOf(maker, 'serial', row)),
		...rowsOf(`stamps/${maker}.csv`).map((row) => sampleOf(maker, row['kind'] as StampKind, row))
	]);
	const further = rowsOf('stamps/further.csv').map((row) =>
		sampleOf(row['maker'] ?? '', row['kind'] as StampKind, row)
	);
	const dates = rowsOf('dates/dates.csv').map((row) => sampleOf('', 'date', row));
	const standard = rowsOf('standards.csv').map((row) => sampleOf('', 'serial', row));
	return [...own, ...further, ...dates, ...standard];
}

/** Counts by kind, and the known misses. */
export function publishedExamples(): PublishedExamples {
	const all = samples();
	const kinds = [...new Set(all.map(({ kind }) => kind))];
	return {
		kinds: kinds.map((kind) => {
			const own = all.filter((sample) => sample.kind === kind);
			return { kind, met: own.filter(({ reason }) => reason === '').length, of: own.length };
		}),
		misses: all
			.filter(({ reason }) => reason !== '')
			.map(({ text, kind, source, reason }) => ({ text, kind, source, reason }))
	};
}

if (process.argv[1] === fileURLToPath(import.meta.url)) {
	writeFileSync(FILE, `${JSON.stringify(publishedExamples(), null, '\t')}\n`);
	console.log(`wrote ${FILE}`);
}
