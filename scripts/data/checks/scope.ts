import { DIVISIONS, type Maker } from '../../../src/lib/types';
import { at, type Finding } from '../finding';
import type { Data } from '../read';

export const name = 'scope';

const MARKETS: ReadonlySet<string> = new Set(['US', 'Canada', 'export']);

/** Lines by maker: the names that rows give in `values.line`. */
function linesOf(data: Data): Map<Maker, Set<string>> {
	const lines = new Map<Maker, Set<string>>();
	for (const { value } of data.rows) {
		const { line } = value.values;
		if (typeof line !== 'string') continue;
		const own = lines.get(value.maker);
		if (own === undefined) lines.set(value.maker, new Set([line]));
		else own.add(line);
	}
	return lines;
}

/** Scope names something that exists: divisions of the maker, lines that a row names, the three markets. */
export function check(data: Data): Finding[] {
	const lines = linesOf(data);
	const findings: Finding[] = [];
	for (const scoped of [...data.rows, ...data.claims]) {
		const { maker, division, line } = scoped.value;
		const own: readonly string[] = DIVISIONS[maker];
		for (const one of division)
			if (!own.includes(one)) findings.push(at(scoped, `${one} is no division of ${maker}`));
		for (const one of line)
			if (lines.get(maker)?.has(one) !== true)
				findings.push(at(scoped, `no row of ${maker} names the line ${one}`));
	}
	for (const row of data.rows)
		for (const one of row.value.market)
			if (!MARKETS.has(one)) findings.push(at(row, `${one} is no market`));
	return findings;
}
