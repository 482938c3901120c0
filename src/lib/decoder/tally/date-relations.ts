/** Which dates must or should come before which. */
import type { Dated } from '../../types';
import type { DateStatement } from './date-statements';

/** What a lead-time row is held against. */
export type Against = 'assembled' | 'body' | 'scheduled' | 'car_finished';

/**
 * - `hard`: the first can be no later than the second.
 * - `soft`: it should be no later, but the second is a plan or dates the body.
 * - `window`: both date the car, one of them roughly.
 */
export interface Relation {
	readonly sort: 'hard' | 'soft' | 'window';
	readonly first: DateStatement;
	readonly second: DateStatement;
	readonly against: Against;
}

const PARTS: readonly Dated[] = ['cast', 'part_made', 'unit_assembled'];
const PLANS: readonly Dated[] = ['scheduled', 'body_finished'];
const FINISHED: readonly Dated[] = ['car_finished', 'label_month'];

const againstOf = (dates: Dated): Against =>
	dates === 'scheduled' ? 'scheduled' : dates === 'body_finished' ? 'body' : 'car_finished';

function relate(first: DateStatement, second: DateStatement): Relation | null {
	const [a, b] = [first.dates, second.dates];
	if (a === 'cast' && b === 'unit_assembled')
		return first.unit !== null && first.unit === second.unit
			? { sort: 'hard', first, second, against: 'assembled' }
			: null;
	const against = againstOf(b);
	if (PARTS.includes(a) && FINISHED.includes(b)) return { sort: 'hard', first, second, against };
	if (PARTS.includes(a) && PLANS.includes(b)) return { sort: 'soft', first, second, against };
	if (PLANS.includes(a) && FINISHED.includes(b)) return { sort: 'window', first, second, against };
	return null;
}

/** How two dates stand to each other, whichever comes first in the list; null when nothing follows from them. */
export const relationOf = (one: DateStatement, other: DateStatement): Relation | null =>
	relate(one, other) ?? relate(other, one);
