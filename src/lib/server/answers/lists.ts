import {
	answerJson,
	etagOf,
	filtersOf,
	pageOf,
	readLimit,
	startOf,
	type Parameters
} from '../http';
import { READER, readEdition } from '../readings';
import type { CompiledEdition } from '../reference';
import { editionAsked } from './edition';

interface Call {
	readonly url: URL;
	readonly request: Request;
}
type ListParameter = 'limit' | 'cursor';

/**
 * Answers a page of a list that an edition holds. A cursor leads on in the edition where its list began,
 * however many came since.
 * @param listed the whole list, filtered and in its order; it is made only when it is needed
 */
export async function answerEditionList(
	{ url, request }: Call,
	asked: Parameters<ListParameter | 'edition'>,
	listed: (edition: CompiledEdition) => readonly unknown[]
): Promise<Response> {
	const filters = filtersOf(url.pathname, asked);
	const limit = readLimit(asked.limit);
	const start = startOf(asked.cursor, filters, readEdition(asked.edition));
	const edition = await editionAsked(start.edition);
	const { number, digest } = edition.head;
	const place = { edition: number, after: start.after, filters };
	const etag = etagOf(digest, '', url.pathname + url.search);
	return answerJson(request, { etag }, () => ({
		edition: number,
		digest,
		...pageOf(listed(edition), limit, place)
	}));
}

/** Answers a page of a list that this code holds, whatever the edition: makers, layouts. */
export function answerFixedList(
	{ url, request }: Call,
	asked: Parameters<ListParameter>,
	all: readonly unknown[]
): Response {
	const filters = filtersOf(url.pathname, asked);
	const limit = readLimit(asked.limit);
	const { after } = startOf(asked.cursor, filters, undefined);
	const etag = etagOf('', READER, url.pathname + url.search);
	return answerJson(request, { etag }, () => pageOf(all, limit, { edition: 0, after, filters }));
}

/** Answers one thing that an edition holds. @throws whatever `found` throws for what is not there */
export async function answerFromEdition(
	{ url, request }: Call,
	asked: Parameters<'edition'>,
	found: (edition: CompiledEdition) => object
): Promise<Response> {
	const edition = await editionAsked(readEdition(asked.edition));
	const { number, digest } = edition.head;
	const answer = found(edition);
	const etag = etagOf(digest, '', url.pathname + url.search);
	return answerJson(request, { etag }, () => ({ edition: number, digest, ...answer }));
}
