/** From the content of an edition to the immutable tables that readings ask. */
import {
	FIRST_YEAR,
	LAST_YEAR,
	SCOPE_COLUMNS,
	tableDefinition,
	type Citation,
	type EditionContent,
	type ReferenceRow,
	type Source
} from '../../types';
import { compareRows, overlaps, sameContent, saysTheSame } from './compare';
import { codesOf } from './ranges';
import { strengthOf } from './strength';
import {
	tableId,
	type CodeEntry,
	type CompiledRow,
	type CompiledTable,
	type TableSet
} from './table-set';

/** Rows compiled between two yields: well under a few milliseconds. */
const STEP = 150;

/** Market is never known from a stamp. */
const TOLD_COLUMNS = ['division', 'line', 'body', 'engine', 'plant'] as const;

interface Draft {
	row: ReferenceRow;
	finding: ReturnType<typeof strengthOf>;
	citations: readonly Citation[];
	contested_by: string[];
}

function group<K, V>(items: readonly V[], keyOf: (item: V) => K): Map<K, V[]> {
	const groups = new Map<K, V[]>();
	for (const item of items) {
		const key = keyOf(item);
		const list = groups.get(key);
		if (list === undefined) groups.set(key, [item]);
		else list.push(item);
	}
	return groups;
}

/** Two cited rows that say different things of one code and scope contest each other. */
function markContested(drafts: readonly Draft[]): void {
	for (const list of group(drafts, (draft) => draft.row.code).values()) {
		const cited = list.filter((draft) => draft.finding.cited);
		cited.forEach((one, index) => {
			for (const other of cited.slice(index + 1)) {
				if (saysTheSame(one.row, other.row) || !overlaps(one.row, other.row)) continue;
				one.contested_by.push(other.row.row_key);
				other.contested_by.push(one.row.row_key);
			}
		});
	}
}

function finish(draft: Draft, sources: ReadonlyMap<string, Source>): CompiledRow {
	const { row, finding, citations, contested_by } = draft;
	return {
		...row,
		strength: contested_by.length > 0 ? 'contested' : finding.strength,
		strength_why: finding.why,
		cited: finding.cited,
		citations,
		contested_by,
		scoped: TOLD_COLUMNS.filter((column) => row[column].length > 0),
		narrowness: SCOPE_COLUMNS.filter((column) => row[column].length > 0).length,
		sources: citations
			.filter((citation) => citation.stance === 'for')
			.flatMap((citation) => {
				const source = sources.get(citation.source);
				return source === undefined
					? []
					: [
							{
								key: source.key,
								title: source.title,
								locator: citation.locator,
								kind: source.kind
							}
						];
			})
	};
}

function entryOf(code: string, rows: readonly CompiledRow[]): CodeEntry {
	const years: CompiledRow[][] = [];
	for (const row of rows) {
		const from = row.years_from ?? FIRST_YEAR;
		const to = row.years_to ?? LAST_YEAR;
		for (let year = from; year <= to; year += 1) (years[year - FIRST_YEAR] ??= []).push(row);
	}
	return { code, all: rows, years };
}

/** Sources that say what they said in the edition before, and so do the works that they copy. */
function steadySources(
	sources: ReadonlyMap<string, Source>,
	previous: TableSet | undefined
): ReadonlySet<string> {
	const changed = (key: string, seen: readonly string[] = []): boolean => {
		const source = sources.get(key);
		if (!sameContent(source, previous?.sources.get(key))) return true;
		const repeats = source?.repeats ?? null;
		return repeats !== null && !seen.includes(repeats) && changed(repeats, [...seen, key]);
	};
	return new Set(previous === undefined ? [] : [...sources.keys()].filter((key) => !changed(key)));
}

/** What a row says, without what an edition makes of it. */
export const ROW_KEYS = [
	'row_key',
	'maker',
	'table',
	...SCOPE_COLUMNS,
	'years_from',
	'years_to',
	'code',
	'meaning',
	'values',
	'note'
] as const satisfies readonly (keyof ReferenceRow)[];

const sameRow = (a: ReferenceRow, b: ReferenceRow): boolean =>
	ROW_KEYS.every((key) => sameContent(a[key], b[key]));

/**
 * Compiles in steps, so that a server can answer requests in between.
 * Tables whose rows, citations, sources and claims did not change are taken over from `previous`.
 * The order of rows, citations, sources and claims in the content makes no difference.
 */
export function* compileInSteps(
	content: EditionContent,
	previous?: TableSet
): Generator<void, TableSet, void> {
	const sources = new Map(content.sources.map((source) => [source.key, source]));
	const steady = steadySources(sources, previous);
	const citationsOf = group(content.citations, (citation) => citation.row_key);
	yield;
	const claims = [...content.claims].sort((a, b) => (a.claim_key < b.claim_key ? -1 : 1));
	const claimsOf = group(claims, (claim) => tableId(claim.maker, claim.table));
	const rowsOf = group(content.rows, (row) => tableId(row.maker, row.table));
	yield;
	const tables = new Map<string, CompiledTable>();
	const rows = new Map<string, CompiledRow>();
	for (const id of [...rowsOf.keys()].sort()) {
		const list = (rowsOf.get(id) as ReferenceRow[]).sort(compareRows);
		const known = previous?.tables.get(id);
		const own = claimsOf.get(id) ?? [];
		let same =
			known !== undefined && known.rows.length === list.length && sameContent(known.claims, own);
		const drafts: Draft[] = [];
		for (const [index, row] of list.entries()) {
			const citations = (citationsOf.get(row.row_key) ?? []).sort((a, b) =>
				`${a.source} ${a.stance}` < `${b.source} ${b.stance}` ? -1 : 1
			);
			drafts.push({ row, finding: strengthOf(citations, sources), citations, contested_by: [] });
			const before = known?.rows[index];
			same &&=
				before !== undefined &&
				sameRow(before, row) &&
				sameContent(before.citations, citations) &&
				citations.every(({ source }) => steady.has(source));
			if (index % STEP === STEP - 1) yield;
		}
		if (known !== undefined && same) {
			tables.set(id, known);
			for (const row of known.rows) rows.set(row.row_key, row);
			yield;
			continue;
		}
		// What is known beside the codes has no code that two rows could share.
		if (tableDefinition((list[0] as ReferenceRow).table).sort === 'code') markContested(drafts);
		yield;
		const compiled: CompiledRow[] = [];
		for (const [index, draft] of drafts.entries()) {
			const row = finish(draft, sources);
			compiled.push(row);
			rows.set(row.row_key, row);
			if (index % STEP === STEP - 1) yield;
		}
		const { maker, table } = compiled[0] as CompiledRow;
		const byCode = new Map<string, CodeEntry>();
		const ranges = tableDefinition(table).match === 'range';
		const spelled = compiled.flatMap((row) =>
			(ranges ? codesOf(row.code) : [row.code]).map((code) => ({ code, row }))
		);
		for (const [code, own] of group(spelled, (one) => one.code))
			byCode.set(
				code,
				entryOf(
					code,
					own.map(({ row }) => row)
				)
			);
		tables.set(id, {
			maker,
			table,
			rows: compiled,
			byCode,
			claims: own
		});
		yield;
	}
	return { tables, rows, sources, claims };
}

/** Compiles at once. */
export function compile(content: EditionContent, previous?: TableSet): TableSet {
	const steps = compileInSteps(content, previous);
	for (;;) {
		const step = steps.next();
		if (step.done === true) return step.value;
	}
}
