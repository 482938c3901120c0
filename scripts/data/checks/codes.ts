import { at, type Finding } from '../finding';
import type { Data } from '../read';

export const name = 'codes';

/** Ids of layouts are ours, not stamped. */
const UNSTAMPED: ReadonlySet<string> = new Set(['layout']);

/** Codes stand as stamped: upper case, no spaces at the ends; meanings start like a sentence and end without a stop. */
export function check(data: Data): Finding[] {
	const findings: Finding[] = [];
	for (const row of data.rows) {
		const { table, code, meaning } = row.value;
		if (!UNSTAMPED.has(table) && code !== code.toUpperCase())
			findings.push(at(row, `code ${code} is not in upper case`));
		if (code !== code.trim() || /[\t\n\r]/.test(code))
			findings.push(at(row, `code "${code}" has spaces around it`));
		if (/^\p{Ll}/u.test(meaning))
			findings.push(at(row, `meaning "${meaning}" starts in lower case`));
		if (/[^.]\.$/.test(meaning) && !/\b(Inc|Co|Corp|Jr|etc|St|No|min|max)\.$/.test(meaning))
			findings.push(at(row, `meaning "${meaning}" ends in a full stop`));
		if (meaning !== meaning.trim()) findings.push(at(row, 'meaning has spaces around it'));
	}
	return findings;
}
