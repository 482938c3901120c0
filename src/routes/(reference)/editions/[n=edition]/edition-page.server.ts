/** What the page of an edition shows. */
import { day } from '$lib/format/editions';
import { pageOfList, withParameters } from '$lib/format/paging';
import {
	compareEditions,
	current,
	editionHead,
	type EditionDifference
} from '$lib/server/reference';
import { editionsText as text } from '$lib/text/en/editions';
import { countsOf } from '../counts.server';
import { chosenList, differenceList } from './differences';

/** Differences on a page. */
const PAGE = 50;
const KINDS = ['rows', 'sources', 'claims'] as const;
const CHANGES = ['added', 'changed', 'retired'] as const;

/** The edition to compare with: the one asked for, else the one before. */
function comparedWith(url: URL, number: number, parent: number | null, newest: number) {
	const asked = url.searchParams.get('with')?.trim() ?? '';
	if (asked === '') return { asked: '', other: parent, fault: null };
	const other = Number(asked);
	if (!/^\d+$/.test(asked) || other < 1 || other > newest)
		return { asked, other: null, fault: text.compareFault(newest) };
	if (other === number) return { asked, other: null, fault: text.compareSame };
	return { asked, other, fault: null };
}

function differenceView(url: URL, difference: EditionDifference) {
	const { sources } = current().tables;
	const chosen = chosenList(url.searchParams, difference);
	const list = differenceList(
		difference,
		chosen.kind,
		chosen.change,
		(key) => sources.get(key)?.title ?? key
	);
	const { items, paging } = pageOfList(url, list, PAGE, 'list');
	return {
		from: difference.from.number,
		to: difference.to.number,
		counts: KINDS.map((kind) => {
			const counts = countsOf(difference[kind]);
			return {
				kind,
				cells: CHANGES.map((change) => ({
					change,
					count: counts[change],
					chosen: kind === chosen.kind && change === chosen.change,
					address: withParameters(url, { what: kind, change, page: null }, 'list')
				}))
			};
		}),
		chosen,
		total: list.length,
		items: items.map((make) => make()),
		paging
	};
}

/**
 * The edition, and how it differs from another.
 * @throws {UnknownEditionError} @throws {DatabaseAwayError}
 */
export async function editionPage(url: URL, number: number) {
	const present = current();
	const isPresent = number === present.head.number;
	const head = isPresent ? present.head : await editionHead(number);
	const { asked, other, fault } = comparedWith(url, number, head.parent, present.head.number);
	const { rows, sources, claims } = present.tables;
	return {
		number,
		day: day(head.made_at),
		cause: text.causeOf(head.cause, head.cause_id),
		digest: head.digest,
		isPresent,
		isFirst: head.parent === null,
		present: present.head.number,
		holds: isPresent ? text.holdsWords(rows.size, sources.size, claims.length) : null,
		asked,
		fault,
		difference: other === null ? null : differenceView(url, await compareEditions(other, number))
	};
}
