/**
 * Questions over a whole edition: what contradicts itself, crosses, has a hole or rests on nothing. Pure functions over a
 * TableSet, for forms, desk and `data:check` alike. A hit is a question and no fault: sources do differ.
 */
import { CONTRADICTIONS, type Contradiction, type ContradictionName } from '../../types';
import type { TableSet } from '../engine/table-set';
import type { Check, Hit } from './check';
import { completed } from './completed';
import { crossingScopes } from './crossing-scopes';
import { engineInNoLine } from './engine-in-no-line';
import { gap } from './gap';
import { paintOutsideItsYears } from './paint-outside-its-years';
import { plantOutsideItsYears } from './plant-outside-its-years';
import { ruleWithoutRows } from './rule-without-rows';
import { sequenceBeyondProduction } from './sequence-beyond-production';
import { sourceWithoutRows } from './source-without-rows';
import { twoMeanings } from './two-meanings';

const CHECKS: Readonly<Record<ContradictionName, Check>> = {
	two_meanings: twoMeanings,
	crossing_scopes: crossingScopes,
	gap,
	plant_outside_its_years: plantOutsideItsYears,
	paint_outside_its_years: paintOutsideItsYears,
	engine_in_no_line: engineInNoLine,
	sequence_beyond_production: sequenceBeyondProduction,
	rule_without_rows: ruleWithoutRows,
	source_without_rows: sourceWithoutRows
};

const byUnit = (a: string, b: string): number => Number(a > b) - Number(a < b);

/** Hits by a text that is each one's own, in the order in which they are told: by check, then by row. */
function hitsOf(tables: TableSet, only: readonly ContradictionName[]): ReadonlyMap<string, Hit> {
	const keyed = only
		.flatMap((name) => CHECKS[name](tables))
		.map((hit): [string, Hit] => [
			JSON.stringify([CONTRADICTIONS.indexOf(hit.check), hit.rows, hit.sources]),
			hit
		]);
	return new Map(keyed.sort(([a], [b]) => byUnit(a, b)));
}

export interface ContradictionOptions {
	/** The checks to run; all when left out. */
	readonly only?: readonly ContradictionName[];
}

/**
 * Every hit in an edition, by check, then by row.
 * @example contradictionsOf(tables, { only: ['gap'] })[0]?.rows // ['gm.trim.402.1', 'gm.trim.402.2']
 */
export function contradictionsOf(
	tables: TableSet,
	{ only = CONTRADICTIONS }: ContradictionOptions = {}
): Contradiction[] {
	return [...hitsOf(tables, only).values()].map((hit) => completed(tables, hit));
}

/** What a change brings and what it mends. */
export interface ChangedContradictions {
	readonly brought: readonly Contradiction[];
	readonly mended: readonly Contradiction[];
}

/**
 * The hits that one edition has and the one before it has not, and the other way around. A hit stays the same while
 * its check asks of the same rows, whatever else those say now.
 */
export function contradictionsAfter(
	before: TableSet,
	after: TableSet,
	{ only = CONTRADICTIONS }: ContradictionOptions = {}
): ChangedContradictions {
	const [old, now] = [hitsOf(before, only), hitsOf(after, only)];
	const without = (hits: typeof old, others: typeof old, tables: TableSet) =>
		[...hits].filter(([key]) => !others.has(key)).map(([, hit]) => completed(tables, hit));
	return { brought: without(now, old, after), mended: without(old, now, before) };
}
