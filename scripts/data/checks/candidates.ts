import { familyOf, type Candidate } from '../collected';
import { at, type Finding } from '../finding';
import type { Data } from '../read';

export const name = 'candidates';

const tableOf = (row_key: string): string => row_key.split('.')[1] ?? '';

/** Tables, or `rejected`, that mapping.csv allows for a label. */
function destinations(data: Data): Map<string, Set<string>> {
	const allowed = new Map<string, Set<string>>();
	for (const { value } of data.mapping) {
		const key = [value.family, value.area, value.field].join('\u0000');
		const own = allowed.get(key);
		if (own === undefined) allowed.set(key, new Set([value.table]));
		else own.add(value.table);
	}
	return allowed;
}

/** Every collected fact became a row that exists, where its label belongs, or stands in REJECTED.csv, once. */
export function check(data: Data): Finding[] {
	const rows = new Set(data.rows.map(({ value }) => value.row_key));
	const rejected = new Set(data.rejected.map(({ value }) => value.candidate));
	const allowed = destinations(data);
	const findings: Finding[] = [];
	const outcomes = new Map<string, Candidate>();
	for (const placed of data.candidates) {
		const one = placed.value;
		outcomes.set(one.candidate, one);
		const say = (message: string) => findings.push(at(placed, `${one.candidate} ${message}`));
		if (one.outcome === 'rejected') {
			if (one.targets.length > 0) say('is rejected and yet names rows');
			if (!rejected.has(one.candidate)) say('is rejected without a reason in REJECTED.csv');
		} else {
			if (one.targets.length === 0) say('names no row');
			if (rejected.has(one.candidate)) say('became a row and stands in REJECTED.csv too');
			for (const target of one.targets)
				if (!rows.has(target)) say(`names ${target}, which is no row`);
		}
		const own = allowed.get([familyOf(one.candidate), one.area, one.field].join('\u0000'));
		if (own === undefined) continue;
		const went = one.outcome === 'rejected' ? ['rejected'] : one.targets.map(tableOf);
		for (const table of new Set(went))
			if (!own.has(table)) say(`went to ${table}, which mapping.csv does not allow for its label`);
	}
	for (const line of data.rejected) {
		const { candidate } = line.value;
		if (outcomes.get(candidate)?.outcome !== 'rejected')
			findings.push(at(line, `candidates.csv does not list ${candidate} as rejected`));
	}
	return findings;
}
