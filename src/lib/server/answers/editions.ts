import { interfaceText } from '../../text/en/interface';
import type { EditionDetail, EditionHead, EditionsAnswer } from '../../types';
import {
	answerJson,
	etagOf,
	fault,
	filtersOf,
	MOST,
	notFound,
	readLimit,
	startOf,
	writeCursor,
	type Parameters
} from '../http';
import {
	compareEditions,
	current,
	editionHead,
	editions,
	type Difference,
	type EditionDifference
} from '../reference';

interface Call {
	readonly url: URL;
	readonly request: Request;
}

const headAnswer = (head: EditionHead): EditionsAnswer['items'][number] => ({
	number: head.number,
	parent: head.parent,
	digest: head.digest,
	cause: head.cause,
	cause_id: head.cause_id,
	made_at: head.made_at
});

/** Answers a page of the editions, the latest first. */
export async function answerEditions(
	{ url, request }: Call,
	asked: Parameters<'limit' | 'cursor'>
): Promise<Response> {
	const filters = filtersOf(url.pathname, asked);
	const limit = readLimit(asked.limit);
	const { after } = startOf(asked.cursor, filters, undefined);
	// A cursor leads on below a number, so that a new edition shifts nothing.
	const heads = await editions({ below: after === 0 ? undefined : after, limit: limit + 1 });
	const items = heads.slice(0, limit).map(headAnswer);
	const last = items.at(-1);
	const next =
		heads.length > limit && last
			? writeCursor({ edition: last.number, after: last.number, filters })
			: null;
	const question = `${url.pathname}${url.search} ${heads[0]?.number}`;
	return answerJson(request, { etag: etagOf(heads[0]?.digest ?? '', '', question) }, () => ({
		items,
		next
	}));
}

/**
 * The number of an edition as it stands in an address.
 * @throws {Refusal} 404 for what is no number
 */
export function editionNumber(text: string): number {
	if (/^\d{1,9}$/.test(text)) return Number(text);
	throw notFound(fault('edition', 'unknown_edition', interfaceText.unknown.edition(text)));
}

const counts = ({ added, changed, retired }: Difference<unknown>) => ({
	added: added.length,
	changed: changed.length,
	retired: retired.length
});

function changedRows({ rows }: EditionDifference): EditionDetail['row_keys'] {
	const key = (change: EditionDetail['row_keys'][number]['change']) => (row_key: string) => ({
		row_key,
		change
	});
	return [
		...rows.added.map(({ row }) => row.row_key).map(key('added')),
		...rows.changed.map((pair) => pair.new.row.row_key).map(key('changed')),
		...rows.retired.map(({ row }) => row.row_key).map(key('retired'))
	].slice(0, MOST);
}

/** Answers one edition and what it changed of the one before. @throws {UnknownEditionError} */
export async function answerEdition({ url, request }: Call, number: number): Promise<Response> {
	const present = current().head;
	const head = number === present.number ? present : await editionHead(number);
	const made = head.parent === null ? null : await compareEditions(head.parent, number);
	return answerJson(request, { etag: etagOf(head.digest, '', url.pathname) }, () => ({
		...headAnswer(head),
		changes: made && {
			rows: counts(made.rows),
			sources: counts(made.sources),
			claims: counts(made.claims)
		},
		row_keys: made === null ? [] : changedRows(made)
	}));
}
