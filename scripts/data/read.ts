/**
 * Reads the data folder. Nothing is judged here beyond shape: a record that cannot be what its file says
 * becomes a finding and is left out; all else is for the checks.
 */
import { existsSync, readFileSync, readdirSync } from 'node:fs';
import { join } from 'node:path';
import {
	MAKERS,
	citationSchema,
	claimSchema,
	referenceRowSchema,
	sourceSchema,
	type Citation,
	type Claim,
	type EditionContent,
	type ReferenceRow,
	type Source
} from '../../src/lib/types';
import {
	candidateSchema,
	mappingSchema,
	rejectedSchema,
	type Candidate,
	type Mapping,
	type Rejected
} from './collected';
import * as columns from './columns';
import { exceptionSchema, type Exception } from './exceptions';
import type { Finding, Placed } from './finding';
import { listOf, numberOf, readRecords, textOrNull, valuesOf } from './records';

/** The whole data folder: the texts as they stand, and the records with their places. */
export interface Data {
	/** CSV texts by path relative to the folder, e.g. `gm/engine.csv`. */
	readonly files: ReadonlyMap<string, string>;
	readonly rows: readonly Placed<ReferenceRow>[];
	readonly citations: readonly Placed<Citation>[];
	readonly sources: readonly Placed<Source>[];
	readonly claims: readonly Placed<Claim>[];
	readonly exceptions: readonly Placed<Exception>[];
	readonly mapping: readonly Placed<Mapping>[];
	readonly candidates: readonly Placed<Candidate>[];
	readonly rejected: readonly Placed<Rejected>[];
	/** Files and records that are not of their file's shape. */
	readonly unreadable: readonly Finding[];
}

/** The data folder cannot become an edition; `findings` say where. */
export class DataUnreadable extends Error {
	readonly code = 'DATA_UNREADABLE';
	constructor(readonly findings: readonly Finding[]) {
		const [first] = findings;
		super(
			first === undefined
				? 'The data folder cannot be read.'
				: `The data folder cannot be read: ${first.file}:${first.line} ${first.message}`
		);
		this.name = 'DataUnreadable';
	}
}

/** The CSV texts of a data folder by relative path: the files at its top and those of the makers' folders. */
export function readFiles(root: string): Map<string, string> {
	const files = new Map<string, string>();
	for (const folder of ['', ...MAKERS]) {
		const path = join(root, folder);
		if (!existsSync(path)) continue;
		for (const name of readdirSync(path).sort())
			if (name.endsWith('.csv'))
				files.set(
					folder === '' ? name : `${folder}/${name}`,
					readFileSync(join(path, name), 'utf8')
				);
	}
	return files;
}

/** Turns the texts of a data folder into records. */
export function parseData(files: ReadonlyMap<string, string>): Data {
	const unreadable: Finding[] = [];
	const rows: Placed<ReferenceRow>[] = [];
	const citations: Placed<Citation>[] = [];
	const read = readRecords(files, unreadable);
	for (const file of files.keys()) {
		const [, maker, table, kind] = /^([^/]+)\/([^./]+)(\.citations)?\.csv$/.exec(file) ?? [];
		if (maker === undefined) continue;
		if (kind !== undefined)
			citations.push(...read(file, columns.CITATION_COLUMNS, citationSchema, citationCells));
		else
			rows.push(
				...read(file, columns.ROW_COLUMNS, referenceRowSchema, (cells) => ({
					...rowCells(cells),
					maker,
					table
				}))
			);
	}
	return {
		files,
		rows,
		citations,
		sources: read(columns.SOURCES_FILE, columns.SOURCE_COLUMNS, sourceSchema, (cells) => ({
			...cells,
			year: numberOf(cells.year),
			repeats: textOrNull(cells.repeats)
		})),
		claims: read(columns.CLAIMS_FILE, columns.CLAIM_COLUMNS, claimSchema, (cells) => ({
			...cells,
			division: listOf(cells.division),
			line: listOf(cells.line),
			years_from: numberOf(cells.years_from),
			years_to: numberOf(cells.years_to)
		})),
		exceptions: read(
			columns.EXCEPTIONS_FILE,
			columns.EXCEPTION_COLUMNS,
			exceptionSchema,
			(cells) => ({ ...cells, rows: listOf(cells.rows) })
		),
		mapping: read(columns.MAPPING_FILE, columns.MAPPING_COLUMNS, mappingSchema),
		candidates: read(
			columns.CANDIDATES_FILE,
			columns.CANDIDATE_COLUMNS,
			candidateSchema,
			(cells) => ({ ...cells, targets: listOf(cells.targets) })
		),
		rejected: read(columns.REJECTED_FILE, columns.REJECTED_COLUMNS, rejectedSchema),
		unreadable
	};
}

const rowCells = (cells: Record<(typeof columns.ROW_COLUMNS)[number], string>) => ({
	...cells,
	division: listOf(cells.division),
	line: listOf(cells.line),
	body: listOf(cells.body),
	engine: listOf(cells.engine),
	plant: listOf(cells.plant),
	market: listOf(cells.market),
	years_from: numberOf(cells.years_from),
	years_to: numberOf(cells.years_to),
	values: valuesOf(cells.values)
});

const citationCells = (cells: Record<(typeof columns.CITATION_COLUMNS)[number], string>) => ({
	...cells,
	read: textOrNull(cells.read),
	seen_on: textOrNull(cells.seen_on)
});

/** Reads a data folder whole, with places and findings. */
export const readData = (root: string): Data => parseData(readFiles(root));

/** What of the folder goes into an edition. */
export const contentOf = (data: Data): EditionContent => ({
	rows: data.rows.map(({ value }) => value),
	citations: data.citations.map(({ value }) => value),
	sources: data.sources.map(({ value }) => value),
	claims: data.claims.map(({ value }) => value)
});

/**
 * The released baseline of a data folder.
 * @throws DataUnreadable when a file or record has not the shape that its file promises
 */
export function readContent(root: string): EditionContent {
	const data = readData(root);
	if (data.unreadable.length > 0) throw new DataUnreadable(data.unreadable);
	return contentOf(data);
}
