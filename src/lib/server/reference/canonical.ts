/** One text for one content: what digests and comparisons rest on. */
import {
	SCOPE_COLUMNS,
	type Citation,
	type Claim,
	type ReferenceRow,
	type Source
} from '../../types';
import type { RowEntry } from '../db/repositories';

/** JSON with the keys of every object sorted by code unit. */
export function canonicalJson(value: unknown): string {
	return JSON.stringify(value, (_, inner: unknown) =>
		typeof inner === 'object' && inner !== null && !Array.isArray(inner)
			? Object.fromEntries(Object.entries(inner).sort(([a], [b]) => (a < b ? -1 : 1)))
			: inner
	);
}

const sorted = (values: readonly string[]): string[] => [...values].sort();

const rowParts = (row: ReferenceRow): unknown[] => [
	row.row_key,
	row.maker,
	row.table,
	...SCOPE_COLUMNS.map((column) => sorted(row[column])),
	row.years_from,
	row.years_to,
	row.code,
	row.meaning,
	row.values,
	row.note
];

const citationLine = (citation: Citation): string =>
	JSON.stringify([
		citation.row_key,
		citation.source,
		citation.stance,
		citation.read,
		citation.locator,
		citation.quotation,
		citation.seen_on
	]);

/** A row with its citations, whatever their order and that of its scope. */
export const entryText = ({ row, citations }: RowEntry): string =>
	canonicalJson(['row', ...rowParts(row), citations.map(citationLine).sort()]);

export const sourceText = (source: Source): string =>
	JSON.stringify([
		'source',
		source.key,
		source.title,
		source.publisher,
		source.year,
		source.kind,
		source.seen_at,
		source.licence,
		source.repeats
	]);

export const claimText = (claim: Claim): string =>
	JSON.stringify([
		'claim',
		claim.claim_key,
		claim.maker,
		claim.table,
		sorted(claim.division),
		sorted(claim.line),
		claim.years_from,
		claim.years_to,
		claim.source,
		claim.note
	]);
