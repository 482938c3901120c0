import type { RowHistoryAnswer } from '../../types';
import {
	answerJson,
	etagOf,
	filtersOf,
	pageOf,
	readLimit,
	startOf,
	type Parameters
} from '../http';
import type { RowVersion } from '../reference';
import { contentAnswer } from './rows';

/** A version of a row as the interface gives it. */
const versionAnswer = ({
	row,
	citations,
	...span
}: RowVersion): RowHistoryAnswer['items'][number] => ({
	version: span.version,
	edition_from: span.edition_from,
	edition_to: span.edition_to,
	...contentAnswer(row),
	citations: citations.map(({ source, stance, read, locator, quotation, seen_on }) => ({
		source,
		stance,
		read,
		locator,
		quotation,
		seen_on
	}))
});

/**
 * Answers a page of the versions of a row, the latest first.
 * @param versions first to last, one at least
 */
export function answerHistory(
	{ url, request }: { readonly url: URL; readonly request: Request },
	asked: Parameters<'limit' | 'cursor'>,
	versions: readonly RowVersion[]
): Response {
	const filters = filtersOf(url.pathname, asked);
	const limit = readLimit(asked.limit);
	const { after } = startOf(asked.cursor, filters, undefined);
	const last = versions.at(-1);
	const question = `${url.pathname}${url.search} ${last?.version} ${last?.edition_to}`;
	return answerJson(request, { etag: etagOf('', '', question) }, () => {
		const page = pageOf([...versions].reverse(), limit, { edition: 0, after, filters });
		return { items: page.items.map(versionAnswer), next: page.next };
	});
}
