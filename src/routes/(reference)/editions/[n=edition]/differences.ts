/** What one edition has and another has not, as the page lists it. */
import { rowAddress, sourceAddress } from '$lib/format/addresses';
import { cellChanges, type CellChange, type TitleOf } from '$lib/format/row-changes';
import { scopeWords } from '$lib/format/scope';
import { yearSpan } from '$lib/format/years';
import type { Difference, EditionDifference, RowEntry } from '$lib/server/reference';
import { editionsText } from '$lib/text/en/editions';
import { readingText } from '$lib/text/en/reading';
import { tablesText } from '$lib/text/en/tables';
import { MAKER_NAMES, tableDefinition, type Claim, type Source } from '$lib/types';

/** One row, source or claim that differs. */
export interface DifferenceView {
	readonly key: string;
	/** Null for what has no page. */
	readonly address: string | null;
	readonly name: string;
	/** Table and scope. */
	readonly detail: string;
	/** Old and new, cell by cell; empty for what was added or retired. */
	readonly changes: readonly CellChange[];
}

const KINDS = ['rows', 'sources', 'claims'] as const;
export type DifferenceKind = (typeof KINDS)[number];
const CHANGES = ['changed', 'added', 'retired'] as const;
export type ChangeKind = (typeof CHANGES)[number];

type Cells = readonly (readonly [label: string, value: string])[];

/** Cells that differ, of things that have the same ones. */
const changesOf = (old: Cells, now: Cells): CellChange[] =>
	now
		.map(([label, value], index) => ({ label, old: old[index]?.[1] ?? '', new: value }))
		.filter((change) => change.old !== change.new);

const rowView = ({ row }: RowEntry): DifferenceView => ({
	key: row.row_key,
	address: rowAddress(row.row_key),
	name: row.code ? `${row.code}: ${row.meaning}` : row.meaning,
	detail: [
		tableDefinition(row.table).label,
		scopeWords(row),
		yearSpan(row.years_from, row.years_to)
	].join('; '),
	changes: []
});

const sourceCells = (source: Source): Cells => {
	const { heads, ...text } = tablesText.sources;
	return [
		[heads.title, source.title],
		[text.publisher, source.publisher],
		[text.year, source.year === null ? '' : String(source.year)],
		[text.kind, readingText.sourceKinds[source.kind]],
		[text.seenAt, source.seen_at],
		[text.licence, source.licence],
		[text.repeats, source.repeats ?? '']
	];
};
const sourceView = (source: Source): DifferenceView => ({
	key: source.key,
	address: sourceAddress(source.key),
	name: source.title,
	detail: readingText.sourceKinds[source.kind],
	changes: []
});

const claimScope = (claim: Claim): string =>
	[
		scopeWords({ ...claim, body: [], engine: [], plant: [], market: [] }),
		yearSpan(claim.years_from, claim.years_to)
	].join('; ');
const claimCells = (claim: Claim, titleOf: TitleOf): Cells => {
	const text = editionsText.claimFields;
	return [
		[text.maker, MAKER_NAMES[claim.maker]],
		[text.table, tableDefinition(claim.table).label],
		[tablesText.heads.scope, claimScope(claim)],
		[text.source, titleOf(claim.source)],
		[text.note, claim.note]
	];
};
const claimView = (claim: Claim): DifferenceView => ({
	key: claim.claim_key,
	address: null,
	name: `${MAKER_NAMES[claim.maker]}: ${tableDefinition(claim.table).label}`,
	detail: claimScope(claim),
	changes: []
});

function list<T>(
	difference: Difference<T>,
	change: ChangeKind,
	viewOf: (entry: T) => DifferenceView,
	between: (old: T, now: T) => CellChange[]
): (() => DifferenceView)[] {
	if (change !== 'changed') return difference[change].map((entry) => () => viewOf(entry));
	return difference.changed.map((pair) => () => ({
		...viewOf(pair.new),
		changes: between(pair.old, pair.new)
	}));
}

/** One list of a difference; each entry is made when it is shown. */
export function differenceList(
	difference: EditionDifference,
	kind: DifferenceKind,
	change: ChangeKind,
	titleOf: TitleOf
): readonly (() => DifferenceView)[] {
	if (kind === 'rows')
		return list(difference.rows, change, rowView, (old, now) => cellChanges(old, now, titleOf));
	if (kind === 'sources')
		return list(difference.sources, change, sourceView, (old, now) =>
			changesOf(sourceCells(old), sourceCells(now))
		);
	return list(difference.claims, change, claimView, (old, now) =>
		changesOf(claimCells(old, titleOf), claimCells(now, titleOf))
	);
}

/** The list that an address asks for; else the first that is not empty, changes before all. */
export function chosenList(
	parameters: URLSearchParams,
	difference: EditionDifference
): { readonly kind: DifferenceKind; readonly change: ChangeKind } {
	const all = KINDS.flatMap((kind) => CHANGES.map((change) => ({ kind, change })));
	const asked = all.find(
		({ kind, change }) => parameters.get('what') === kind && parameters.get('change') === change
	);
	const full = all.find(({ kind, change }) => difference[kind][change].length > 0);
	return asked ?? full ?? { kind: 'rows', change: 'changed' };
}
