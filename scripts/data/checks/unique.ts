import { at, type Finding, type Placed } from '../finding';
import type { Data } from '../read';

export const name = 'unique';

function repeated<T>(items: readonly Placed<T>[], keyOf: (value: T) => string): Finding[] {
	const first = new Map<string, Placed<T>>();
	return items.flatMap((item) => {
		const key = keyOf(item.value);
		const known = first.get(key);
		if (known === undefined) {
			first.set(key, item);
			return [];
		}
		return [at(item, `${key} stands at ${known.file}:${known.line} too`)];
	});
}

/** No key, claim, collected fact or citation stands twice. */
export const check = (data: Data): Finding[] => [
	...repeated(data.rows, (row) => row.row_key),
	...repeated(data.citations, ({ row_key, source, stance }) => `${row_key} ${source} ${stance}`),
	...repeated(data.sources, (source) => source.key),
	...repeated(data.claims, (claim) => claim.claim_key),
	...repeated(data.mapping, (one) => [one.family, one.area, one.field, one.table].join(', ')),
	...repeated(data.candidates, (one) => one.candidate),
	...repeated(data.rejected, (one) => one.candidate)
];
