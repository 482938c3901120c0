import { overlaps, saysTheSame } from '../../src/lib/decoder/engine/compare';
import { tableDefinition, type ReferenceRow } from '../../src/lib/types';
import type { Placed } from './finding';
import type { Data } from './read';

const UNPUBLISHED: ReadonlySet<string> = new Set(['memory', 'common_practice']);

/** Keys of the rows for which something above memory and common practice speaks. */
export function citedRows(data: Data): Set<string> {
	const kinds = new Map(data.sources.map(({ value }) => [value.key, value.kind]));
	const cited = new Set<string>();
	for (const { value } of data.citations) {
		const kind = kinds.get(value.source);
		if (kind === undefined || UNPUBLISHED.has(kind)) continue;
		if (value.stance === 'for' && value.read !== 'title') cited.add(value.row_key);
	}
	return cited;
}

/** ISO 3780: the order in which ranges of two characters run. */
const ORDER = 'ABCDEFGHJKLMNPRSTUVWXYZ1234567890';
const place = (code: string): number =>
	ORDER.indexOf(code.charAt(0)) * ORDER.length + ORDER.indexOf(code.charAt(1));
const ends = (code: string): [from: number, to: number] => {
	const [from = '', to = from] = code.split('-');
	return [place(from), place(to)];
};

function rangesMeet(a: string, b: string): boolean {
	const [fromA, toA] = ends(a);
	const [fromB, toB] = ends(b);
	return fromA <= toB && fromB <= toA;
}

/** Rows of one table that can be asked with the same code. */
function* sharingCode(
	rows: readonly Placed<ReferenceRow>[]
): Generator<readonly [Placed<ReferenceRow>, Placed<ReferenceRow>]> {
	const groups = new Map<string, Placed<ReferenceRow>[]>();
	const ranges: Placed<ReferenceRow>[] = [];
	for (const row of rows) {
		const { maker, table, code } = row.value;
		const { match } = tableDefinition(table);
		if (match === 'none') continue;
		if (match === 'range') {
			for (const other of ranges)
				if (other.value.maker === maker && rangesMeet(other.value.code, code)) yield [other, row];
			ranges.push(row);
			continue;
		}
		const key = `${maker} ${table} ${code}`;
		const group = groups.get(key);
		if (group === undefined) groups.set(key, [row]);
		else {
			for (const other of group) yield [other, row];
			group.push(row);
		}
	}
}

/** Pairs of rows that give one code, for the same cars, different meanings. Tables found by scope have none. */
export function* differingPairs(
	data: Data
): Generator<readonly [Placed<ReferenceRow>, Placed<ReferenceRow>]> {
	for (const [a, b] of sharingCode(data.rows))
		if (!saysTheSame(a.value, b.value) && overlaps(a.value, b.value)) yield [a, b];
}
