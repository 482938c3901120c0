import type { Finding } from '../finding';
import { contentOf, type Data } from '../read';
import { collectedFiles, editionFiles, exceptionFiles } from '../write';

export const name = 'canonical';

const values = <T>(placed: readonly { readonly value: T }[]): T[] =>
	placed.map(({ value }) => value);

/** Each file is byte for byte what writing its records gives: order, quotes, line ends, JSON. */
export function check(data: Data): Finding[] {
	const canonical = new Map([
		...editionFiles(contentOf(data)),
		...collectedFiles({
			mapping: values(data.mapping),
			candidates: values(data.candidates),
			rejected: values(data.rejected)
		}),
		...exceptionFiles(values(data.exceptions))
	]);
	const unreadable = new Set(data.unreadable.map(({ file }) => file));
	const findings: Finding[] = [];
	for (const [file, text] of data.files) {
		if (unreadable.has(file)) continue;
		const carriageReturn = text.indexOf('\r');
		if (carriageReturn !== -1) {
			const line = text.slice(0, carriageReturn).split('\n').length;
			findings.push({ file, line, message: 'holds a carriage return' });
			continue;
		}
		const expected = canonical.get(file);
		if (expected === undefined) findings.push({ file, line: 1, message: 'holds no record' });
		else if (expected !== text) findings.push(firstDifference(file, text, expected));
	}
	return findings;
}

function firstDifference(file: string, text: string, expected: string): Finding {
	const stands = text.split('\n');
	const wanted = expected.split('\n');
	const index = wanted.findIndex((line, position) => stands[position] !== line);
	const line = index === -1 ? wanted.length : index + 1;
	const next = wanted[line - 1] || 'the end';
	return { file, line, message: `is not in canonical form or order; expected here: ${next}` };
}
