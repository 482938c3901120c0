import { createHash } from 'node:crypto';
import type { Finding } from '../finding';
import type { Data } from '../read';

export const name = 'words';

/** What is not curated here, as salted hashes: naming it, even to forbid it, would put it in. */
const HASHES: ReadonlySet<string> = new Set([
	'c40acabb8de5aea2',
	'77b0bed6cf074873',
	'e56380677ccfdc3b',
	'ab0569edcf4ff434',
	'10f72f1185f9490b',
	'968c2c7cf167bd63',
	'65c53801afad3a0c',
	'386a6834efff2a26',
	'286e525d65eb7737',
	'c3bad7a1d5013855',
	'3380e9811efc8b2c',
	'8f9ce0798dc49d67',
	'3f2dea7021c243f6'
]);

/** First sixteen figures of the SHA-256 of a word, salted. */
export const hashOf = (word: string): string =>
	createHash('sha256').update(`tp:${word}`).digest('hex').slice(0, 16);

/** Single words and neighboring pairs, in lower case. */
function* wordsOf(line: string): Generator<string> {
	const words = line.toLowerCase().match(/[a-z][a-z'’-]+/g) ?? [];
	for (const [index, word] of words.entries()) {
		yield word;
		const next = words[index + 1];
		if (next !== undefined) yield `${word} ${next}`;
	}
}

/** Words that must not be there: one Ford line of April 1964 and what is named after it. */
export function check(data: Data, hashes: ReadonlySet<string> = HASHES): Finding[] {
	const judged = new Map<string, boolean>();
	const findings: Finding[] = [];
	for (const [file, text] of data.files)
		for (const [index, line] of text.split('\n').entries())
			for (const word of wordsOf(line)) {
				let unwanted = judged.get(word);
				if (unwanted === undefined) judged.set(word, (unwanted = hashes.has(hashOf(word))));
				if (unwanted)
					findings.push({ file, line: index + 1, message: 'holds a word that must not be there' });
			}
	return findings;
}
