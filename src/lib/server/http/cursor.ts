import { createHash } from 'node:crypto';
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
	if (!/^[A-Za-z0-9_-]{1,200}$/.test(cursor)) return null;
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
	const place = parse(cursor.trim());
	if (place === null || place.filters !== filters)
		throw malformed(fault('cursor', 'cursor_invalid', interfaceText.malformed.cursor));
	return place;
}

const NO_FILTER: readonly string[] = ['cursor', 'edition', 'format', 'limit'];

/** Names a list and the filters on it, in a few characters, so that a cursor fits no other. */
export function filtersOf(path: string, asked: Readonly<Record<string, string>>): string {
	const filters = Object.entries(asked)
		.filter(([name]) => !NO_FILTER.includes(name))
		.sort(([a], [b]) => (a < b ? -1 : 1));
	return createHash('sha256')
		.update(JSON.stringify([path, filters]))
		.digest('base64url')
		.slice(0, 12);
}

/**
 * Where a page of a list begins: where its cursor says, in the edition in which the list began.
 * @throws {Refusal} 400 for a cursor of another list, or of another edition than the address names
 */
export function startOf(
	cursor: string | undefined,
	filters: string,
	edition: number | undefined
): { readonly after: number; readonly edition: number | undefined } {
	if (cursor === undefined) return { after: 0, edition };
	const place = readCursor(cursor, filters);
	if (edition !== undefined && edition !== place.edition)
		throw malformed(
			fault('cursor', 'cursor_invalid', interfaceText.malformed.cursorEdition(place.edition))
		);
	return place;
}

export const MOST = 200;
export const USUAL = 50;

/**
 * How many of a list to answer.
 * @throws {Refusal} 400 unless a whole number from 1 to 200
 */
export function readLimit(limit: string | undefined): number {
	if (limit === undefined) return USUAL;
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

/** The page of a whole list that begins at a place. */
export function pageOf<Item>(all: readonly Item[], limit: number, place: Place): Page<Item> {
	const end = place.after + limit;
	return {
		items: all.slice(place.after, end),
		next: end < all.length ? writeCursor({ ...place, after: end }) : null
	};
}
