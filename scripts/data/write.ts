/** Writes the data folder in its one canonical form, so that import and then export change no byte. */
import { stringify } from 'csv-stringify/sync';
import { canonicalJson, compareRows } from '../../src/lib/decoder/engine/compare';
import {
	SCOPE_COLUMNS,
	type Citation,
	type Claim,
	type EditionContent,
	type ReferenceRow,
	type Source
} from '../../src/lib/types';
import { compareCandidates, type Collected } from './collected';
import * as columns from './columns';
import { questionKey, type Exception } from './exceptions';

const byUnit = (a: string, b: string): number => (a < b ? -1 : a > b ? 1 : 0);
const by =
	<T>(keyOf: (item: T) => string) =>
	(a: T, b: T): number =>
		byUnit(keyOf(a), keyOf(b));

const list = (values: readonly string[]): string => [...values].sort(byUnit).join('|');

/** CSV with a header line, `\n` line ends, and quotes only where they are needed. */
export const csv = (header: readonly string[], records: readonly unknown[][]): string =>
	stringify([[...header], ...records], { record_delimiter: '\n' });

/** Scope in its canonical order, on which the order of the rows rests in turn. */
const withSortedScope = (row: ReferenceRow): ReferenceRow => ({
	...row,
	...Object.fromEntries(SCOPE_COLUMNS.map((column) => [column, [...row[column]].sort(byUnit)]))
});

const rowCells = (row: ReferenceRow): unknown[] => [
	row.row_key,
	row.division.join('|'),
	row.line.join('|'),
	row.body.join('|'),
	row.engine.join('|'),
	row.plant.join('|'),
	row.market.join('|'),
	row.years_from,
	row.years_to,
	row.code,
	row.meaning,
	canonicalJson(row.values),
	row.note
];
const citationCells = (citation: Citation): unknown[] => [
	citation.row_key,
	citation.source,
	citation.stance,
	citation.read,
	citation.locator,
	citation.quotation,
	citation.seen_on
];
const sourceCells = (source: Source): unknown[] => [
	source.key,
	source.title,
	source.publisher,
	source.year,
	source.kind,
	source.seen_at,
	source.licence,
	source.repeats
];
const claimCells = (claim: Claim): unknown[] => [
	claim.claim_key,
	claim.maker,
	claim.table,
	list(claim.division),
	list(claim.line),
	claim.years_from,
	claim.years_to,
	claim.source,
	claim.note
];

function group<T>(items: readonly T[], keyOf: (item: T) => string): Map<string, T[]> {
	const groups = new Map<string, T[]>();
	for (const item of items) {
		const key = keyOf(item);
		const own = groups.get(key);
		if (own === undefined) groups.set(key, [item]);
		else own.push(item);
	}
	return groups;
}

/** Maker and table stand in the key itself, so that a citation finds its file without its row. */
const citationFile = ({ row_key }: Citation): string => {
	const [maker = '', table = ''] = row_key.split('.');
	return columns.citationsFile(maker, table);
};

/** The canonical files of an edition: text by path relative to the data folder. */
export function editionFiles(content: EditionContent): Map<string, string> {
	const files = new Map<string, string>();
	for (const [file, rows] of group(content.rows, (row) => columns.rowsFile(row.maker, row.table)))
		files.set(
			file,
			csv(columns.ROW_COLUMNS, rows.map(withSortedScope).sort(compareRows).map(rowCells))
		);
	for (const [file, citations] of group(content.citations, citationFile)) {
		const sorted = citations.sort(
			by(({ row_key, source, stance }) => [row_key, source, stance].join('\u0000'))
		);
		files.set(file, csv(columns.CITATION_COLUMNS, sorted.map(citationCells)));
	}
	const sources = [...content.sources].sort(by((source) => source.key));
	files.set(columns.SOURCES_FILE, csv(columns.SOURCE_COLUMNS, sources.map(sourceCells)));
	const claims = [...content.claims].sort(by((claim) => claim.claim_key));
	files.set(columns.CLAIMS_FILE, csv(columns.CLAIM_COLUMNS, claims.map(claimCells)));
	return files;
}

/** The canonical files about the collected facts. */
export function collectedFiles(collected: Collected): Map<string, string> {
	const mapping = collected.mapping
		.map(({ family, area, field, table }) => [family, area, field, table])
		.sort(by((cells) => cells.join('\u0000')));
	const candidates = [...collected.candidates]
		.sort((a, b) => compareCandidates(a.candidate, b.candidate))
		.map((one) => [one.candidate, one.area, one.field, one.digest, one.outcome, list(one.targets)]);
	const rejected = [...collected.rejected]
		.sort((a, b) => compareCandidates(a.candidate, b.candidate))
		.map((one) => columns.REJECTED_COLUMNS.map((column) => one[column]));
	return new Map([
		[columns.MAPPING_FILE, csv(columns.MAPPING_COLUMNS, mapping)],
		[columns.CANDIDATES_FILE, csv(columns.CANDIDATE_COLUMNS, candidates)],
		[columns.REJECTED_FILE, csv(columns.REJECTED_COLUMNS, rejected)]
	]);
}

/** The canonical file of the closed questions; none where nothing is closed. */
export function exceptionFiles(exceptions: readonly Exception[]): Map<string, string> {
	if (exceptions.length === 0) return new Map();
	const lines = [...exceptions]
		.sort(by(questionKey))
		.map(({ check, rows, digest, source, reason }) => [check, list(rows), digest, source, reason]);
	return new Map([[columns.EXCEPTIONS_FILE, csv(columns.EXCEPTION_COLUMNS, lines)]]);
}
