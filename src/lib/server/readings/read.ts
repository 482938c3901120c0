import { read } from '../../decoder';
import { MAKER_NAMES, type ReadAnswer, type Reading } from '../../types';
import type { CompiledEdition } from '../reference';
import { READER } from './reader';
import type { ReadRequest } from './request';

/** The corporation by its full name; null where it is none of those whose tables we keep. */
export const named = (reading: Reading): ReadAnswer['readings'][number] => ({
	layout: reading.layout,
	layout_title: reading.layout_title,
	maker: reading.maker === null || reading.maker === 'other' ? null : MAKER_NAMES[reading.maker],
	maker_key: reading.maker,
	division: reading.division,
	model_year: reading.model_year,
	state: reading.state,
	rank: reading.rank,
	why: reading.why,
	fields: reading.fields
});

/** Reads against an edition in memory. Never waits. */
export function readAgainst(
	{ head, tables }: CompiledEdition,
	{ text, fields, kind, context, explain }: ReadRequest
): ReadAnswer {
	const result = read(tables, { text, fields, kind, context, lookups: explain });
	return {
		edition: head.number,
		digest: head.digest,
		reader: READER,
		input: result.input,
		readings: result.readings.map(named),
		more: result.more,
		problems: result.problems
	};
}
