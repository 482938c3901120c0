/** The two sides of a line, in an order that does not turn on the order of the stamps. */
import { STAMP_KINDS, type TallySide } from '../../types';
import type { Statement } from './statements';
import { weightRank } from './weights';

/** A side as it is answered. */
export const sideOf = (statement: Statement): TallySide => ({
	stamp: statement.stamp,
	kind: statement.kind,
	place: statement.place,
	label: statement.label,
	code: statement.code,
	meanings: [...new Set(statement.options.map(({ meaning }) => meaning))],
	earliest: null,
	latest: null
});

/** What statements are ordered by: the heavier first, then the kind of stamp, then what stands there. */
export function sortKey(statement: Omit<Statement, 'stamp'>): string {
	const { weight, kind, place, label, field, code, options } = statement;
	const said = options.map(({ meaning }) => meaning).join(' | ');
	return [
		weightRank(weight),
		STAMP_KINDS.indexOf(kind),
		place ?? '',
		label,
		field,
		code,
		said
	].join(' \u0000');
}

/** The heavier side left. */
export function inOrder<One extends Statement>(a: One, b: One): readonly [One, One] {
	return sortKey(a) <= sortKey(b) ? [a, b] : [b, a];
}
