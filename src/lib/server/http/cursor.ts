import { interfaceText } from '../../text/en/interface';
import { fault, malformed } from './refusal';

/** Where a list goes on: in which edition, after how many, under which filters. */
export interface Place {
	readonly edition: number;
	readonly after: number;
	readonly filters: string;
}

/** Writes a place as an opaque word for an address. */
export const writeCursor = ({ edition, after, filters }: Place): string =>
	Buffer.from(JSON.stringify([edition, after, filters])).toString('base64url');

const whole = (value: unknown): value is number =>
	typeof value === 'number' && Number.isSafeInteger(value) && value >= 0;

function parse(cursor: string): Place | null {
	if (!/^[A-Za-z0-9_-]{1,2000}$/.test(cursor)) return null;
	try {
		const parts: unknown = JSON.parse(Buffer.from(cursor, 'base64url').toString('utf8'));
		if (!Array.isArray(parts) || parts.length !== 3) return null;
		const [edition, after, filters] = parts as unknown[];
		if (!whole(edition) || !whole(after) || typeof filters !== 'string') return null;
		return { edition, after, filters };
	} catch (error) {
		if (error instanceof SyntaxError) return null;
		throw error;
	}
}

/**
 * Reads a cursor that we wrote for the same list.
 * @throws {Refusal} 400 when it is none of ours or belongs to other filters
 */
export function readCursor(cursor: string, filters: string): Place {
	const place = parse(cursor);
	if (place === null || place.filters !== filters)
		throw malformed(fault('cursor', 'cursor_invalid', interfaceText.malformed.cursor));
	return place;
}

export const MOST = 200;
export const USUAL = 50;

/**
 * How many of a list to answer.
 * @throws {Refusal} 400 unless a whole number from 1 to 200
 */
export function readLimit(limit: string | undefined, usual: number = USUAL): number {
	if (limit === undefined) return usual;
	const text = limit.trim();
	const number = /^\d{1,4}$/.test(text) ? Number(text) : 0;
	if (number < 1 || number > MOST)
		throw malformed(fault('limit', 'limit_invalid', interfaceText.malformed.limit(MOST)));
	return number;
}

/** One page of a list and the cursor of the next; `next` is null on the last. */
export interface Page<Item> {
	readonly items: readonly Item[];
	readonly next: string | null;
}

/**
 * The page of a whole list that a request asks for.
 * @param filters everything that picks the list, so that a cursor fits no other
 * @throws {Refusal} 400 for a limit or cursor that cannot be
 */
export function pageOf<Item>(
	all: readonly Item[],
	asked: { limit?: string; cursor?: string },
	edition: number,
	filters: string
): Page<Item> {
	const limit = readLimit(asked.limit);
	const after = asked.cursor === undefined ? 0 : readCursor(asked.cursor, filters).after;
	const end = after + limit;
	return {
		items: all.slice(after, end),
		next: end < all.length ? writeCursor({ edition, after: end, filters }) : null
	};
}
