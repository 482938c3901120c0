/** What the list of sources shows for an address. */
import { pageOfList, withParameters } from '$lib/format/paging';
import { current, sourcesList, type CountedSource } from '$lib/server/reference';
import { readingText } from '$lib/text/en/reading';
import { tablesText } from '$lib/text/en/tables';
import { SOURCE_KINDS, type SourceKind } from '$lib/types';

/** Sources on a page. */
const PAGE = 100;
const SORTS = ['title', 'rows', 'year'] as const;
type Sort = (typeof SORTS)[number];

const ORDERS: Readonly<Record<Sort, (a: CountedSource, b: CountedSource) => number>> = {
	// The list comes by title.
	title: () => 0,
	rows: (a, b) => b.cited_by - a.cited_by,
	year: (a, b) => (b.year ?? 0) - (a.year ?? 0)
};

const folded = (text: string): string => text.normalize('NFKD').toLowerCase();
const has = (source: CountedSource, words: readonly string[]): boolean => {
	const text = folded(`${source.title} ${source.publisher}`);
	return words.every((word) => text.includes(word));
};

/** The page: sources of a kind, with a word in title or publisher, in one of three orders. */
export function sourcesPage(url: URL) {
	const { tables, head } = current();
	const all = sourcesList(tables);
	const asked = (name: string): string => url.searchParams.get(name)?.trim() ?? '';
	const kind = SOURCE_KINDS.find((one) => one === asked('kind'));
	const words = folded(asked('q')).split(/\s+/).filter(Boolean);
	const sort = SORTS.find((one) => one === asked('sort')) ?? 'title';
	const found = all
		.filter((source) => (kind === undefined || source.kind === kind) && has(source, words))
		.sort(ORDERS[sort]);
	const { items, paging } = pageOfList(url, found, PAGE, 'list');
	const count = (one: SourceKind) => all.filter((source) => source.kind === one).length;
	return {
		edition: head.number,
		q: asked('q'),
		kind: kind ?? '',
		sort,
		kinds: [
			{ value: '', label: tablesText.sources.allKinds },
			...SOURCE_KINDS.filter((one) => count(one) > 0).map((one) => ({
				value: one,
				label: `${readingText.sourceKinds[one]} (${count(one)})`
			}))
		],
		all: all.length,
		total: found.length,
		sources: items.map(({ key, title, publisher, year, kind: of, cited_by }) => ({
			key,
			title,
			publisher,
			year,
			kind: readingText.sourceKinds[of],
			cited_by
		})),
		sorts: Object.fromEntries(
			SORTS.map((one) => [one, withParameters(url, { sort: one, page: null }, 'list')])
		) as Record<Sort, string>,
		paging
	};
}
