import { stampCells } from '$lib/format/stamp';
import { entryText as words } from '$lib/text/en/entry';

/** Longest code that stands alone. */
const CODE = 5;

/**
 * What a text looks like while it is being typed: counted as the reader counts, named by its length.
 * A first word only; the reading itself decides.
 */
export function detected(text: string): string {
	const struck = text.toUpperCase().replace(/^[\s*]+|[\s*]+$|[^A-Z0-9?_*[\]]/g, '');
	const n = stampCells(struck).length;
	if (n === 0) return '';
	if (n <= CODE) return words.detected.code(n);
	if (/^\d{6}$/.test(struck)) return words.detected.sequence;
	if (n < 10) return words.detected.short(n);
	if (n === 17) return words.detected.seventeen;
	if (n > 17) return words.detected.long(n);
	return words.detected.serial(n);
}
