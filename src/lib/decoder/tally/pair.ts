/** What two statements about one attribute come to. */
import type { TallyAttribute, TallyLine, TallyResult } from '../../types';
import { tallyText as text } from '../../text/en/tally';
import { isRead } from '../engine/characters';
import type { CompiledRow, TableSet } from '../engine/table-set';
import { compareCharacters } from './characters';
import { agree, type Company } from './facts';
import { neighborsOf } from './neighbors';
import { inOrder, sideOf } from './sides';
import type { Gap } from './options';
import type { Statement } from './statements';
import { unanimous, type Truth } from './three-valued';
import { lighter } from './weights';

/** Attributes that are the car's own number, so that different characters cannot be of one car. */
const OWN_NUMBERS: ReadonlySet<TallyAttribute> = new Set(['sequence_number', 'order_number']);

interface Outcome {
	readonly result: TallyResult;
	readonly reason: string;
	readonly ground: string;
	readonly rows: readonly CompiledRow[];
}

/** Why a side is silent or not settled, the most telling first. */
const GAPS: readonly Gap[] = ['contested', 'not_used', 'not_listed', 'illegible', 'undecided'];

function lineOf(left: Statement, right: Statement, outcome: Outcome): TallyLine {
	const { result, reason, ground, rows } = outcome;
	return {
		attribute: left.attribute,
		result,
		reason,
		weight: lighter(left.weight, right.weight),
		ground,
		left: sideOf(left),
		right: sideOf(right),
		rows: [...new Set(rows.map(({ row_key }) => row_key))].sort()
	};
}

/** Numbers and codes that are compared as they stand. */
function byCharacters(left: Statement, right: Statement): Outcome {
	const { attribute } = left;
	const { truth, either, lookAlike } = compareCharacters(left.cells, right.cells);
	const ground = text.ground.characters;
	const outcome = (result: TallyResult, reason: string): Outcome => ({
		result,
		reason,
		ground,
		rows: []
	});
	if (truth === true) return outcome('tallies', text.sameCharacters(right.code));
	if (either !== null)
		return outcome('cannot_be_told', text.either(either.agrees, [...either.others]));
	if (truth === null) {
		const read = [...left.cells, ...right.cells].every(isRead);
		return outcome('cannot_be_told', read ? text.otherLength : text.unreadCharacters);
	}
	const certain =
		left.gap !== 'undecided' &&
		right.gap !== 'undecided' &&
		(OWN_NUMBERS.has(attribute) || (left.kind === right.kind && left.kind === 'body_tag'));
	if (!certain) return outcome('cannot_be_told', text.otherCharacters(left.code, right.code));
	const again = lookAlike === null ? '' : ` ${text.lookAlike(lookAlike)}`;
	return outcome('does_not_tally', `${text.differ(attribute)}${again}`);
}

/** Combinations of what the sides allow. */
function truths(left: Statement, right: Statement, company: Company): readonly Truth[] {
	return left.options.flatMap((one) =>
		right.options.map((other) => agree(left.attribute, one.facts, other.facts, company))
	);
}

function besideRows(left: Statement, right: Statement, company: Company, tables: TableSet) {
	return left.options.flatMap((one) =>
		right.options.flatMap((other) =>
			company
				.beside(
					'displacement_cuin',
					String(one.facts.displacement_cuin),
					String(other.facts.displacement_cuin)
				)
				.map((key) => tables.rows.get(key) as CompiledRow)
		)
	);
}

function offers(
	left: Statement,
	right: Statement,
	tables: TableSet,
	company: Company
): readonly string[] {
	const { attribute } = left;
	const near = (side: Statement, other: Statement) =>
		neighborsOf(side, other, attribute, tables, company).map(({ code, place }) =>
			text.neighbor(code, side.label, place)
		);
	return [...near(left, right), ...near(right, left)];
}

/** Two or three offers help, more do not. */
const OFFERS = 2;

function byFacts(left: Statement, right: Statement, tables: TableSet, company: Company): Outcome {
	const { attribute } = left;
	const options = [...left.options, ...right.options];
	const rows = options.flatMap((option) => option.rows);
	const settled = left.gap === 'none' && right.gap === 'none';
	const common = unanimous(truths(left, right, company));
	const supported = options.every((option) => option.supported);
	const near = () => offers(left, right, tables, company).slice(0, OFFERS);
	const cannot = (reason: string): Outcome => ({
		result: 'cannot_be_told',
		reason,
		ground: text.ground.rows(rows),
		rows
	});
	if (settled && common === true) {
		const all = [...rows, ...besideRows(left, right, company, tables)];
		return {
			result: 'tallies',
			reason: text.agree(attribute),
			ground: text.ground.rows(all),
			rows: all
		};
	}
	if (settled && common === false) {
		if (!supported) return cannot([text.thin(attribute), ...near()].join(' '));
		return {
			result: 'does_not_tally',
			reason: [text.differ(attribute), ...near()].join(' '),
			ground: text.ground.rows(rows),
			rows
		};
	}
	const gap = GAPS.find((one) => one === left.gap || one === right.gap);
	if (gap === undefined) return cannot(text.noCommonGround(attribute));
	const side = left.gap === gap ? left : right;
	const listed = gap === 'not_listed' ? near() : [];
	return cannot([text.gap(gap, side.label, side.code), ...listed].join(' '));
}

const CHARACTERS: ReadonlySet<TallyAttribute> = new Set([
	'sequence_number',
	'order_number',
	'body_number',
	'paint',
	'trim',
	'roof'
]);

/**
 * One line for two statements about one attribute. Symmetric: the heavier stands left, whichever came first.
 * "Does not tally" needs firm or fair rows on both sides, or the same characters read from two places.
 */
export function pairLine(
	one: Statement,
	other: Statement,
	tables: TableSet,
	company: Company
): TallyLine {
	const [left, right] = inOrder(one, other);
	const outcome = CHARACTERS.has(left.attribute)
		? byCharacters(left, right)
		: byFacts(left, right, tables, company);
	return lineOf(left, right, outcome);
}
