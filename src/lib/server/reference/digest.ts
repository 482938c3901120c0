import { createHash } from 'node:crypto';
import { claimText, entryText, sourceText } from './canonical';
import type { Entries } from './entries';

/**
 * SHA-256 over the canonical content, 64 hexadecimal figures. Neither the order of entries nor that of
 * citations, scopes or values makes a difference; every character of what they say does.
 */
export function digestOf({ rows, sources, claims }: Entries): string {
	const lines = [
		...[...rows.values()].map(entryText),
		...[...sources.values()].map(sourceText),
		...[...claims.values()].map(claimText)
	].sort();
	const hash = createHash('sha256');
	for (const line of lines) hash.update(line).update('\n');
	return hash.digest('hex');
}
