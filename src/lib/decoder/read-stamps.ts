/** Reads several stamps of one car: each by itself, and what they say against each other. */
import type { ReadContext, ReadResult, StampRequest, StampsResult, TallyStamp } from '../types';
import type { LinedLayout } from './engine/lined-layout';
import type { PreparedLayout } from './engine/plan';
import type { TableSet } from './engine/table-set';
import { read } from './read';
import { tallyStamps } from './tally';

export interface StampsRequest {
	readonly stamps: readonly StampRequest[];
	readonly context?: ReadContext;
	readonly lookups?: boolean;
	readonly layouts?: readonly PreparedLayout[];
	readonly lined?: readonly LinedLayout[];
}

/**
 * Reads the stamps of one car. The serial is read first, and what it tells scopes the others; the answers stand in
 * the order asked. Never throws.
 */
export function readStamps(tables: TableSet, request: StampsRequest): StampsResult {
	const { stamps, context = {}, ...how } = request;
	const readOne = ({ kind, text = '', fields }: StampRequest, own: ReadContext): ReadResult =>
		read(tables, {
			...how,
			text,
			context: own,
			...(kind === undefined ? {} : { kind }),
			...(fields === undefined ? {} : { fields })
		});
	const results = stamps.map((stamp) =>
		stamp.kind === undefined || stamp.kind === 'serial' ? readOne(stamp, context) : null
	);
	const serial = results.find((result) => result?.input.kind === 'serial')?.input.text;
	const beside = serial === undefined ? context : { serial, ...context };
	const told = stamps.map((stamp, index) => {
		const before = results[index];
		return before?.input.kind === 'serial' ? before : readOne(stamp, beside);
	});
	const places = stamps.map(({ kind, place }, index): TallyStamp => {
		const { input, readings } = told[index] as ReadResult;
		return {
			kind: kind ?? input.kind ?? 'code',
			readings,
			...(place === undefined ? {} : { place })
		};
	});
	return { stamps: told, lines: tallyStamps(tables, places) };
}
