/** Ranges of two characters, as ISO 3780 gives them to countries. */

/** The order in which they run: letters without I, O and Q, then figures, naught last. */
const ORDER = 'ABCDEFGHJKLMNPRSTUVWXYZ1234567890';

const place = (code: string): number =>
	ORDER.indexOf(code.charAt(0)) * ORDER.length + ORDER.indexOf(code.charAt(1));

/**
 * The codes of a range, both ends included.
 * @example codesOf('AA-AC') // ['AA', 'AB', 'AC']
 */
export function codesOf(range: string): string[] {
	const [from = '', to = from] = range.split('-');
	const codes: string[] = [];
	for (let at = place(from); at <= place(to); at += 1)
		codes.push(ORDER.charAt(Math.floor(at / ORDER.length)) + ORDER.charAt(at % ORDER.length));
	return codes;
}
