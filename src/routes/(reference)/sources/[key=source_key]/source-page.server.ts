/** What the page of a source shows. */
import { pageOfList } from '$lib/format/paging';
import { rowLine } from '$lib/format/row-lines';
import { current, sourceWithRows, type CitingRow } from '$lib/server/reference';
import { readingText } from '$lib/text/en/reading';
import { tablesText } from '$lib/text/en/tables';

/** Rows on a page. */
const PAGE = 100;
const text = tablesText.sources;

/** A row as this source speaks of it: where in it, and whether against. */
function citingLine({ row, citations }: CitingRow) {
	const places = citations.map(({ stance, locator }) =>
		[stance === 'against' ? tablesText.row.isAgainst : '', locator].filter(Boolean).join(': ')
	);
	return { ...rowLine(row), restsOn: places.filter(Boolean), more: 0 };
}

/** Only what a browser may open is a link. */
const isAddress = (seen_at: string): boolean => /^https?:\/\//.test(seen_at);

/** The work, and the rows that rest on it. @throws {UnknownSourceError} */
export function sourcePage(url: URL, key: string) {
	const { tables, head } = current();
	const { source, rows, repeated_by } = sourceWithRows(tables, key);
	const { items, paging } = pageOfList(url, rows, PAGE, 'rows');
	const repeats = source.repeats === null ? undefined : tables.sources.get(source.repeats);
	const named = ({ key: of, title }: { key: string; title: string }) => ({ key: of, title });
	return {
		key,
		title: source.title,
		kind: readingText.sourceKinds[source.kind],
		caution: { memory: text.memory, common_practice: text.practice }[source.kind as string] ?? '',
		facts: [
			{ label: text.kind, value: readingText.sourceKinds[source.kind] },
			...(source.publisher ? [{ label: text.publisher, value: source.publisher }] : []),
			...(source.year === null ? [] : [{ label: text.year, value: String(source.year) }]),
			...(source.licence ? [{ label: text.licence, value: source.licence }] : [])
		],
		seenAt: source.seen_at,
		isLink: isAddress(source.seen_at),
		repeats: repeats ? named(repeats) : null,
		repeatedBy: repeated_by.map(named),
		edition: head.number,
		total: rows.length,
		rows: items.map(citingLine),
		paging
	};
}
