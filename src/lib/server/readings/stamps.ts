import { readStamps } from '../../decoder';
import type { ReadContext, StampRequest, StampsAnswer } from '../../types';
import type { CompiledEdition } from '../reference';
import { named } from './read';
import { READER } from './reader';

/** What is to be read of one car, checked. */
export interface StampsRequest {
	readonly stamps: readonly StampRequest[];
	readonly context: ReadContext;
	/** Left out: the present edition. */
	readonly edition?: number;
	/** Whether each field tells what it looked up. */
	readonly explain: boolean;
}

/**
 * Reads several stamps of one car against an edition in memory: a result each, in the order asked, and what they
 * say against each other. The serial among them scopes the others. Never waits.
 */
export function readStampsAgainst(
	{ head, tables }: CompiledEdition,
	{ stamps, context, explain }: StampsRequest
): StampsAnswer {
	const result = readStamps(tables, { stamps, context, lookups: explain });
	return {
		edition: head.number,
		digest: head.digest,
		reader: READER,
		stamps: result.stamps.map(({ readings, ...told }) => ({
			...told,
			readings: readings.map(named)
		})),
		lines: result.lines
	};
}
