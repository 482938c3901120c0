import type { CompiledRow, TableSet } from '$lib/decoder';
import { readingAddress, sourceAddress } from '$lib/format/addresses';
import { day } from '$lib/format/editions';
import { scopeCells, scopeWords, type ScopeCell } from '$lib/format/scope';
import { swatchOf, valueCells, type ValueCell } from '$lib/format/values';
import { yearSpan } from '$lib/format/years';
import { readAgainst, readRequest } from '$lib/server/readings';
import { current } from '$lib/server/reference';
import { readingText } from '$lib/text/en/reading';
import { tablesText } from '$lib/text/en/tables';
import {
	MAKER_NAMES,
	tableDefinition,
	type Maker,
	type Strength,
	type TableName
} from '$lib/types';

const text = tablesText.row;

export interface CitationView {
	readonly title: string;
	readonly address: string;
	/** "club research" */
	readonly kind: string;
	readonly against: boolean;
	readonly locator: string;
	readonly quotation: string;
	/** How much of it was read, and when. */
	readonly read: string;
}
export interface RowView {
	readonly key: string;
	readonly code: string;
	/** Whether the code stands on cars as it stands here. */
	readonly isStamped: boolean;
	readonly meaning: string;
	readonly maker: Maker;
	readonly makerName: string;
	readonly table: TableName;
	readonly label: string;
	/** "Plymouth, Dodge; 1970–71" */
	readonly scopeLine: string;
	readonly scope: readonly ScopeCell[];
	readonly values: readonly ValueCell[];
	readonly hex: string | null;
	readonly note: string;
	readonly strength: Strength;
	readonly why: string;
	readonly citations: readonly CitationView[];
	/** The code as a reading; null where none would find it. */
	readonly reading: string | null;
}

function citationViews(row: CompiledRow, { sources }: TableSet): CitationView[] {
	return row.citations.map((citation) => {
		const source = sources.get(citation.source);
		const read = citation.read ? text.read[citation.read] : '';
		return {
			title: source?.title ?? citation.source,
			address: sourceAddress(citation.source),
			kind: source ? readingText.sourceKinds[source.kind] : '',
			against: citation.stance === 'against',
			locator: citation.locator,
			quotation: citation.quotation,
			read: citation.seen_on ? `${read}, ${text.seenOn(day(citation.seen_on))}` : read
		};
	});
}

/** The address that reads a row's code, if a reading finds it. */
function readingOf(row: CompiledRow): string | null {
	const query = {
		kind: 'code',
		text: row.code,
		maker: row.division.length === 1 ? row.division[0] : row.maker,
		year: row.years_from
	};
	const { readings } = readAgainst(
		current(),
		readRequest({ ...query, year: row.years_from === null ? undefined : String(row.years_from) })
	);
	return readings.length > 0 ? readingAddress(query) : null;
}

/** A row with everything that its page says of it. */
export function rowView(row: CompiledRow, tables: TableSet): RowView {
	const { label, match } = tableDefinition(row.table);
	const isStamped = match === 'exact' && row.table !== 'layout' && row.code !== '';
	return {
		key: row.row_key,
		code: row.code,
		isStamped,
		meaning: row.meaning,
		maker: row.maker,
		makerName: MAKER_NAMES[row.maker],
		table: row.table,
		label,
		scopeLine: `${scopeWords(row)}; ${yearSpan(row.years_from, row.years_to)}`,
		scope: scopeCells(row),
		values: valueCells(row.values).filter(({ name }) => name !== 'hex_approximate'),
		hex: swatchOf(row.values),
		note: row.note,
		strength: row.strength,
		why: row.strength_why,
		citations: citationViews(row, tables),
		reading: isStamped ? readingOf(row) : null
	};
}
