/** One text for one content: what digests and comparisons rest on. */
import {
	SCOPE_COLUMNS,
	type Citation,
	type Claim,
	type ReferenceRow,
	type Source
} from '../../types';
import type { RowEntry } from '../db/repositories';

/** The same value with the keys of every object sorted by code unit. */
function inOrder(value: unknown): unknown {
	if (typeof value !== 'object' || value === null) return value;
	if (Array.isArray(value)) return value.map(inOrder);
	const entries = Object.entries(value).sort(([a], [b]) => (a < b ? -1 : 1));
	return Object.fromEntries(entries.map(([key, inner]) => [key, inOrder(inner)]));
}

/** One value, whatever the order of its keys. */
export const valueText = (value: unknown): string => JSON.stringify(inOrder(value) ?? null);

const sorted = (values: readonly string[]): readonly string[] =>
	values.length < 2 ? values : [...values].sort();

const rowParts = (row: ReferenceRow): unknown[] => [
	row.row_key,
	row.maker,
	row.table,
	...SCOPE_COLUMNS.map((column) => sorted(row[column])),
	row.years_from,
	row.years_to,
	row.code,
	row.meaning,
	inOrder(row.values),
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

/** A merge asks for the same text several times. */
const texts = new WeakMap<RowEntry, string>();

/** A row with its citations, whatever their order and that of its scope. */
export function entryText(entry: RowEntry): string {
	let text = texts.get(entry);
	if (text === undefined) {
		const citations = entry.citations.map(citationLine).sort();
		text = JSON.stringify(['row', ...rowParts(entry.row), citations]);
		texts.set(entry, text);
	}
	return text;
}

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
