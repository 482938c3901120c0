/**
 * Questions over a whole edition: what contradicts itself, crosses, has a hole or rests on nothing. Pure functions over a
 * TableSet, for forms, desk and `data:check` alike. A hit is a question and no fault: sources do differ.
 */
import { CONTRADICTIONS, type Contradiction, type ContradictionName } from '../../types';
import type { TableSet } from '../engine/table-set';
import type { Check } from './check';
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

/** One text for one hit, whatever was found before it. */
const keyOf = ({ check, rows, sources, message }: Contradiction): string =>
	JSON.stringify([CONTRADICTIONS.indexOf(check), rows, sources, message]);

/** Every hit in an edition, by check, then by row. @param only the checks to run; all when left out */
export function contradictionsOf(
	tables: TableSet,
	only: readonly ContradictionName[] = CONTRADICTIONS
): Contradiction[] {
	const hits = only.flatMap((name) => CHECKS[name](tables));
	return hits
		.map((hit) => ({ hit, key: keyOf(hit) }))
		.sort((a, b) => Number(a.key > b.key) - Number(a.key < b.key))
		.map(({ hit }) => hit);
}

/** What a change brings and what it mends. */
export interface ChangedContradictions {
	readonly brought: readonly Contradiction[];
	readonly mended: readonly Contradiction[];
}

/** The hits that one edition has and the one before it has not, and the other way around. */
export function contradictionsAfter(before: TableSet, after: TableSet): ChangedContradictions {
	const [old, now] = [contradictionsOf(before), contradictionsOf(after)];
	const [oldKeys, nowKeys] = [new Set(old.map(keyOf)), new Set(now.map(keyOf))];
	return {
		brought: now.filter((hit) => !oldKeys.has(keyOf(hit))),
		mended: old.filter((hit) => !nowKeys.has(keyOf(hit)))
	};
}
