/** Dates of stamps against each other, a line each. */
import type { TallyLine, TallyResult, TallySide } from '../../types';
import { tallyText as text } from '../../text/en/tally';
import { isoDay, type DaySpan } from '../dates/days';
import type { TableSet } from '../engine/table-set';
import { relationOf, type Relation } from './date-relations';
import type { DateStatement } from './date-statements';
import { leadTimeOf, type LeadTime } from './lead-times';
import { lighter } from './weights';

/** Days between two dates over everything that they can be. */
interface Gap {
	/** By how many days the first is certainly later; nought or less when it need not be. */
	readonly later: number;
	/** Whether the first is no later, whatever both are. */
	readonly inOrder: boolean;
	/** The least number of days from the first to the second. */
	readonly least: number;
}

function gapOf(first: readonly DaySpan[], second: readonly DaySpan[]): Gap {
	const pairs = first.flatMap((a) => second.map((b) => [a, b] as const));
	return {
		later: Math.min(...pairs.map(([a, b]) => a[0] - b[1])),
		inOrder: pairs.every(([a, b]) => a[1] <= b[1]),
		least: Math.min(...pairs.map(([a, b]) => b[0] - a[1]))
	};
}

interface Outcome {
	readonly result: TallyResult;
	readonly reason: string;
	/** Whether the lead-time row took part. */
	readonly byRow: boolean;
}

/** What is said when the first is certainly later than the second. */
function whenLater(relation: Relation, later: number, lead: LeadTime | null): Outcome {
	const { sort, first, second } = relation;
	if (sort !== 'hard') {
		if (lead === null)
			return { result: 'cannot_be_told', reason: text.dates.noRule(later), byRow: false };
		if (later <= -lead.daysMin)
			return {
				result: 'cannot_be_told',
				reason: text.dates.mayHaveSlipped(second.dates, later, -lead.daysMin),
				byRow: true
			};
	}
	if (!first.supported || !second.supported)
		return { result: 'cannot_be_told', reason: text.dates.thin(later), byRow: false };
	// The row only ever excuses: what does not tally rests on the dates themselves.
	return {
		result: 'does_not_tally',
		reason: text.dates.later(first.dates, later, sort, -(lead?.daysMin ?? 0)),
		byRow: false
	};
}

function outcomeOf(relation: Relation, lead: LeadTime | null): Outcome {
	const { first, second } = relation;
	if (first.spans.length === 0 || second.spans.length === 0)
		return { result: 'cannot_be_told', reason: text.dates.open, byRow: false };
	const { later, inOrder, least } = gapOf(first.spans, second.spans);
	if (later > 0) return whenLater(relation, later, lead);
	if (!inOrder && first.spans.length * second.spans.length > 1)
		return { result: 'cannot_be_told', reason: text.dates.decade, byRow: false };
	if (!inOrder && relation.sort === 'hard')
		return { result: 'cannot_be_told', reason: text.dates.reaches, byRow: false };
	if (lead !== null && least > lead.daysMax)
		return {
			result: 'cannot_be_told',
			reason: text.dates.early(least, lead.daysMax),
			byRow: true
		};
	return {
		result: 'tallies',
		reason: text.dates.agree(relation.sort, lead !== null),
		byRow: lead !== null
	};
}

function sideOf({ stamp, kind, place, label, code, words, spans }: DateStatement): TallySide {
	const days = spans.length === 0 ? null : spans;
	return {
		stamp,
		kind,
		place,
		label,
		code,
		meanings: words === '' ? [] : [words],
		earliest: days && isoDay(Math.min(...days.map(([from]) => from))),
		latest: days && isoDay(Math.max(...days.map(([, to]) => to)))
	};
}

/** The line of two dates; null where nothing follows from them. The part or the rougher date stands left. */
export function dateLine(
	one: DateStatement,
	other: DateStatement,
	tables: TableSet
): TallyLine | null {
	const relation = relationOf(one, other);
	if (relation === null) return null;
	const { first, second, sort, against } = relation;
	const lead = leadTimeOf(tables, first, against);
	const { result, reason, byRow } = outcomeOf(relation, lead);
	const rows = [...first.rows, ...second.rows];
	const row = byRow && lead !== null ? [lead.row] : [];
	return {
		attribute: sort === 'window' ? 'build_window' : 'date_order',
		result,
		reason,
		weight: lighter(first.weight, second.weight),
		ground: text.ground.dates(rows, row.length > 0),
		left: sideOf(first),
		right: sideOf(second),
		rows: [...new Set([...rows, ...row].map(({ row_key }) => row_key))].sort()
	};
}
