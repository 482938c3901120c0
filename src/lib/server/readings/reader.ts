/** Built in from the reading code and its layouts (scripts/vite/reader.ts). */
declare const __READER_DIGEST__: string;

/** SHA-256 over the reading code and its layouts, 64 hexadecimal figures: what a saved reading keeps. */
export const READER_DIGEST: string = __READER_DIGEST__;

/** Its first 12 figures: what is shown, and what stands in addresses. */
export const READER: string = READER_DIGEST.slice(0, 12);

/** Whether an address names this reader, short or whole, in any case. */
export function isThisReader(name: string): boolean {
	const given = name.trim().toLowerCase();
	return given === READER || given === READER_DIGEST;
}
