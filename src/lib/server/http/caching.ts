/** What an answer is a function of, beside its address. */
export interface Basis {
	/** SHA-256 of the edition's content, in hexadecimal. */
	readonly digest: string;
	/** The reader's digest; empty where no reading is made. */
	readonly reader: string;
}

/** FNV-1a over UTF-16 units. */
function hash(text: string): string {
	let value = 0x811c9dc5;
	for (let index = 0; index < text.length; index += 1)
		value = Math.imul(value ^ text.charCodeAt(index), 0x01000193);
	return (value >>> 0).toString(36);
}

/**
 * The validator of an answer. Weak, because the same answer may be sent compressed.
 * @param query the address’s query, and the type where an address has several
 */
export const etagOf = (basis: Basis, query: string): string =>
	`W/"${basis.digest.slice(0, 12)}-${basis.reader || 'x'}-${hash(query)}"`;

const opaque = (tag: string): string => tag.trim().replace(/^W\//, '');

/** Whether the asker already holds the answer of this validator. */
export function holds(ifNoneMatch: string | null, etag: string): boolean {
	if (ifNoneMatch === null) return false;
	if (ifNoneMatch === etag || ifNoneMatch.trim() === '*') return true;
	const wanted = opaque(etag);
	return ifNoneMatch.split(',').some((tag) => opaque(tag) === wanted);
}

/** Ask each time whether it still holds. */
export const REVALIDATE = 'no-cache';
/** Only for an address that carries edition and reader: it can never answer anything else. */
export const IMMUTABLE = 'public, max-age=31536000, immutable';
