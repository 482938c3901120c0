/** What a code means that comes without its car. */
import { saysTheSame } from './compare';
import { choose, type Answer, type Scope } from './look-up';
import type { CompiledRow } from './table-set';

/**
 * A bare code comes without its car: one meaning is enough, wherever it holds.
 * Without a year, rows of different years do not contradict each other: the code means several things.
 */
export function answerAlone(rows: readonly CompiledRow[], scope: Scope): Answer {
	const answer = choose(rows, scope);
	if (answer.kind === 'depends') {
		const [first] = answer.rows as readonly [CompiledRow, ...CompiledRow[]];
		const one = answer.rows.every((row) => saysTheSame(first, row));
		return one ? { kind: 'found', rows: answer.rows } : answer;
	}
	if (answer.kind !== 'contested' || scope.year !== null) return answer;
	const all = answer.groups.flat();
	const contested = all.every((row) =>
		all.every((other) => saysTheSame(row, other) || row.contested_by.includes(other.row_key))
	);
	return contested ? answer : { kind: 'depends', on: 'line', rows: all };
}
