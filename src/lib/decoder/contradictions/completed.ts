/** From what a check found to all that a hit tells: its weight, what it rests on, its digest. */
import {
	SCOPE_COLUMNS,
	type Contradiction,
	type ContradictionName,
	type Weight
} from '../../types';
import { canonicalJson } from '../engine/compare';
import { ROW_KEYS } from '../engine/compile';
import type { CompiledRow, TableSet } from '../engine/table-set';
import type { Hit } from './check';
import { digestOf } from './digest';

/** Heavy: a code may be read wrongly. Middling: a row may say too much. Light: something may be lacking. */
const WEIGHT_OF: Readonly<Record<ContradictionName, Weight>> = {
	two_meanings: 'heavy',
	crossing_scopes: 'heavy',
	gap: 'light',
	plant_outside_its_years: 'middling',
	paint_outside_its_years: 'middling',
	engine_in_no_line: 'heavy',
	sequence_beyond_production: 'middling',
	rule_without_rows: 'middling',
	source_without_rows: 'light'
};

/** What a row says and rests on, without what the edition makes of it; the order within a scope says nothing. */
const saidBy = (row: CompiledRow) => ({
	...Object.fromEntries(ROW_KEYS.map((key) => [key, row[key]])),
	...Object.fromEntries(SCOPE_COLUMNS.map((column) => [column, [...row[column]].sort()])),
	citations: row.citations.map((citation) => canonicalJson(citation)).sort()
});

/** A hit with the sources of its rows, how much it weighs, and the digest of all that. */
export function completed(tables: TableSet, hit: Hit): Contradiction {
	const rows = hit.rows.map((key) => tables.rows.get(key) as CompiledRow);
	const cited = rows.flatMap(({ citations }) => citations.map(({ source }) => source));
	const sources = [...new Set([...hit.sources, ...cited])].sort();
	const works = sources.map((key) => tables.sources.get(key));
	return {
		...hit,
		sources,
		weight: WEIGHT_OF[hit.check],
		digest: digestOf(canonicalJson([hit.check, rows.map(saidBy), works]))
	};
}
