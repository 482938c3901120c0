import { FIRST_YEAR, LAST_YEAR, type Division } from '../../../src/lib/types';
import { at, type Finding } from '../finding';
import type { Data } from '../read';

export const name = 'years';

type Life = readonly [first: number, last: number];
const ALWAYS: Life = [FIRST_YEAR, LAST_YEAR];

/** First and last model year of the divisions that ended. */
const LIVES: Partial<Record<Division, Life>> = {
	Pontiac: [1926, 2010],
	Oldsmobile: [1897, 2004],
	Plymouth: [1928, 2001],
	Imperial: [1955, 1983],
	Mercury: [1939, 2011],
	AMC: [1955, 1988]
};

/** Model years: both or neither, first before last, inside our time and the division's life. */
export function check(data: Data): Finding[] {
	const findings: Finding[] = [];
	for (const scoped of [...data.rows, ...data.claims]) {
		const { years_from: from, years_to: to, division } = scoped.value;
		if (from === null && to === null) continue;
		if (from === null || to === null) {
			findings.push(at(scoped, 'years: both or neither'));
			continue;
		}
		if (from > to) findings.push(at(scoped, `years run backwards: ${from} to ${to}`));
		const lives = division.map((one) => LIVES[one as Division] ?? ALWAYS);
		if (lives.length === 0) continue;
		const first = Math.min(...lives.map((life) => life[0]));
		const last = Math.max(...lives.map((life) => life[1]));
		if (from < first || to > last)
			findings.push(at(scoped, `${division.join('|')} built no cars in part of ${from} to ${to}`));
	}
	return findings;
}
