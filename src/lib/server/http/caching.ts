/** Built in from all code that shapes an answer (scripts/vite/reader.ts). */
declare const __ANSWER_DIGEST__: string;

/** FNV-1a over UTF-16 units, going on from a value. */
function hash(text: string, from: number): number {
	let value = from;
	for (let index = 0; index < text.length; index += 1)
		value = Math.imul(value ^ text.charCodeAt(index), 0x01000193);
	return value;
}
let code: number | undefined;
/** Made when first needed: the worker, which is not built, shapes no answers. */
const answerCode = (): number => (code ??= hash(__ANSWER_DIGEST__, 0x811c9dc5));

/**
 * The validator of an answer, made before the answer is. Weak, because the same answer may be sent
 * compressed. Changes with edition, reader, question, and the code that shapes answers.
 * @param digest of the edition, in hexadecimal; empty where no edition is asked
 * @param reader the reader’s short digest; empty where nothing is read
 * @param question path and query, and the media type where an address has several
 */
export const etagOf = (digest: string, reader: string, question: string): string =>
	`W/"${digest.slice(0, 12)}-${reader}-${(hash(question, answerCode()) >>> 0).toString(36)}"`;

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
