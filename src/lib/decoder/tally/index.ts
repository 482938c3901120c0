/** Holds what the stamps of one car say against each other. */
import { constraintSchema, TALLY_ATTRIBUTES, type TallyLine, type TallyStamp } from '../../types';
import { tallyText as text } from '../../text/en/tally';
import type { TableSet } from '../engine/table-set';
import { dateLine } from './date-lines';
import { dateStatementsOf } from './date-statements';
import type { Company } from './facts';
import { pairLine } from './pair';
import { sideOf, sortKey } from './sides';
import { statementsOf, type Statement } from './statements';

export type { Option } from './options';
export { statementsOf, type Statement } from './statements';

/** Lines by edition: asking again for the same edition costs nothing. */
const companies = new WeakMap<TableSet, Company>();

interface Beside {
	readonly key: string;
	readonly fact: string;
	readonly left: readonly string[];
	readonly right: readonly string[];
}

/** What an edition says beside its codes: the names of lines, and which values can stand beside each other. */
function companyOf(tables: TableSet): Company {
	const known = companies.get(tables);
	if (known !== undefined) return known;
	const lines = new Set<string>();
	const beside: Beside[] = [];
	for (const { table, rows } of tables.tables.values())
		for (const row of rows) {
			if (table === 'line' || table === 'series' || table === 'body_serial')
				lines.add(String(row.values.line));
			if (table !== 'constraint') continue;
			const { left, right } = constraintSchema.parse(row.values);
			if (left.attribute === right.attribute)
				beside.push({
					key: row.row_key,
					fact: left.attribute,
					left: left.any_of ?? [],
					right: right.any_of ?? []
				});
		}
	const company: Company = {
		isLine: (name) => lines.has(name),
		beside: (fact, a, b) =>
			beside
				.filter(
					(one) =>
						one.fact === fact &&
						((one.left.includes(a) && one.right.includes(b)) ||
							(one.left.includes(b) && one.right.includes(a)))
				)
				.map(({ key }) => key)
	};
	companies.set(tables, company);
	return company;
}

/** Of several lines for one pair of stamps the one that tells most. */
const TELLING: readonly TallyLine['result'][] = [
	'does_not_tally',
	'tallies',
	'cannot_be_told',
	'not_looked_at'
];
const tells = (line: TallyLine): number => TELLING.indexOf(line.result);

const lineKey = ({ left, right, reason }: TallyLine): string =>
	JSON.stringify([{ ...left, stamp: null }, right && { ...right, stamp: null }, reason]);

/** By code unit, as everything in an edition is ordered. */
const order = (a: string, b: string): number => Number(a > b) - Number(a < b);

/** Of what two voices say of an attribute the line that tells most. */
function bestLine(
	ones: readonly Statement[],
	others: readonly Statement[],
	tables: TableSet,
	company: Company
): TallyLine {
	const lines = ones.flatMap((one) => others.map((other) => pairLine(one, other, tables, company)));
	const sorted = lines
		.map((line) => ({ line, key: lineKey(line) }))
		.sort((a, b) => tells(a.line) - tells(b.line) || order(a.key, b.key));
	return (sorted[0] as (typeof sorted)[number]).line;
}

const inVoices = (statements: readonly Statement[]): (readonly Statement[])[] =>
	[false, true]
		.map((repeated) => statements.filter((one) => one.repeated === repeated))
		.filter((voice) => voice.length > 0);

/**
 * Lines for an attribute that a pair of stamps both tell: one for each result. A number that is repeated on a tag says
 * nothing for what the tag says in codes of its own, so that neither hides the other.
 */
function pairLines(
	ones: readonly Statement[],
	others: readonly Statement[],
	tables: TableSet,
	company: Company
): TallyLine[] {
	const repeats = ([first]: readonly Statement[]): number => Number((first as Statement).repeated);
	const lines = inVoices(ones)
		.flatMap((one) =>
			inVoices(others).map((other) => ({
				line: bestLine(one, other, tables, company),
				repeated: repeats(one) + repeats(other)
			}))
		)
		.map((pair) => ({ ...pair, key: lineKey(pair.line) }))
		// A code of its own goes before the number; among alike ones the order of the stamps says nothing.
		.sort((a, b) => a.repeated - b.repeated || order(a.key, b.key));
	const byResult = new Map<TallyLine['result'], TallyLine>();
	for (const { line } of lines) if (!byResult.has(line.result)) byResult.set(line.result, line);
	return [...byResult.values()];
}

/** An attribute that one stamp alone tells. */
function lonely(statements: readonly Statement[]): TallyLine {
	const [first] = [...statements].sort((a, b) => order(sortKey(a), sortKey(b))) as [Statement];
	return {
		attribute: first.attribute,
		result: 'not_looked_at',
		reason: text.notLookedAt,
		weight: first.weight,
		ground: '',
		left: sideOf(first),
		right: null,
		rows: []
	};
}

function* linesOf(tables: TableSet, stamps: readonly TallyStamp[]): Generator<TallyLine> {
	const company = companyOf(tables);
	const statements = statementsOf(tables, stamps);
	for (const attribute of TALLY_ATTRIBUTES) {
		const groups = stamps
			.map((_, index) =>
				statements.filter((one) => one.attribute === attribute && one.stamp === index)
			)
			.filter((group) => group.length > 0);
		const [only] = groups;
		if (only !== undefined && groups.length === 1) yield lonely(only);
		for (const [index, one] of groups.entries())
			for (const other of groups.slice(index + 1)) yield* pairLines(one, other, tables, company);
	}
	const dates = dateStatementsOf(tables, stamps);
	for (const [index, one] of dates.entries())
		for (const other of dates.slice(index + 1)) {
			const line = dateLine(one, other, tables);
			if (line !== null) yield line;
		}
}

/**
 * A line for everything that two stamps of a car both tell, and one for what only one of them does. The order of the
 * stamps changes no result: it only stands in `stamp` of the sides. No line says that a car is or is not genuine.
 * With fewer than two stamps there is nothing to hold against anything.
 */
export function tallyStamps(tables: TableSet, stamps: readonly TallyStamp[]): TallyLine[] {
	if (stamps.length < 2) return [];
	return [...linesOf(tables, stamps)]
		.map((line) => ({ line, key: lineKey(line) }))
		.sort(
			(a, b) =>
				TALLY_ATTRIBUTES.indexOf(a.line.attribute) - TALLY_ATTRIBUTES.indexOf(b.line.attribute) ||
				tells(a.line) - tells(b.line) ||
				order(a.key, b.key)
		)
		.map(({ line }) => line);
}
