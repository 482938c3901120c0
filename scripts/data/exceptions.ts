/** Questions over the tables that somebody looked into and closed: what `exceptions.csv` holds. */
import { z } from 'zod';
import { contradictionSchema, sourceKeySchema, type Contradiction } from '../../src/lib/types';

/** A closed question. It holds while the rows and sources say what they said: the digest is that of the hit. */
export const exceptionSchema = contradictionSchema
	.pick({ check: true, rows: true, digest: true })
	.extend({ source: sourceKeySchema, reason: z.string().min(1).max(600) });
export type Exception = z.infer<typeof exceptionSchema>;

/** One text for the question that an exception closes. */
export const questionKey = ({ check, rows }: Pick<Exception, 'check' | 'rows'>): string =>
	[check, ...rows].join(' ');

/**
 * Hits without an exception that holds, and the exceptions that hold no more: a row or source changed, or nothing is
 * asked there now.
 */
export function openQuestions<E extends Exception>(
	hits: readonly Contradiction[],
	exceptions: readonly E[]
): { readonly open: readonly Contradiction[]; readonly lapsed: readonly E[] } {
	const nameOf = (one: Pick<Exception, 'check' | 'rows' | 'digest'>): string =>
		`${questionKey(one)} ${one.digest}`;
	const asked = new Set(hits.map(nameOf));
	const closed = new Set(exceptions.map(nameOf));
	return {
		open: hits.filter((hit) => !closed.has(nameOf(hit))),
		lapsed: exceptions.filter((one) => !asked.has(nameOf(one)))
	};
}
