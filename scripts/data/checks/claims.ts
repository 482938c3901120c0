import { at, type Finding } from '../finding';
import type { Data } from '../read';

export const name = 'claims';

/** A claim of completeness rests on a work that lists every code, never on memory. */
export function check(data: Data): Finding[] {
	const kinds = new Map(data.sources.map(({ value }) => [value.key, value.kind]));
	const tables = new Set(data.rows.map(({ value }) => `${value.maker}/${value.table}`));
	const findings: Finding[] = [];
	for (const claim of data.claims) {
		const { claim_key, maker, table, source } = claim.value;
		const kind = kinds.get(source);
		if (kind === 'memory' || kind === 'common_practice')
			findings.push(at(claim, `${claim_key} rests on ${source}, which lists nothing`));
		if (maker === 'ford')
			findings.push(
				at(claim, `${claim_key}: Ford's tables leave out a line on purpose and are never complete`)
			);
		if (!tables.has(`${maker}/${table}`))
			findings.push(at(claim, `${claim_key}: there is no table ${maker}/${table}`));
	}
	return findings;
}
