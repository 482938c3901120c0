/** A short name for a text, to see whether it is still the same. */

const START = 0xcbf29ce484222325n;
const PRIME = 0x100000001b3n;

/**
 * FNV-1a over the text's UTF-16 units, 64 bits, as sixteen hexadecimal figures. It tells that something changed;
 * it keeps nobody from making two texts of one digest on purpose.
 * @source https://www.rfc-editor.org/rfc/rfc9923
 * @example digestOf('') // 'cbf29ce484222325'
 */
export function digestOf(text: string): string {
	let digest = START;
	for (let at = 0; at < text.length; at += 1)
		digest = BigInt.asUintN(64, (digest ^ BigInt(text.charCodeAt(at))) * PRIME);
	return digest.toString(16).padStart(16, '0');
}
