import { contradictionText as text } from '../../text/en/contradictions';
import type { CompiledRow } from '../engine/table-set';
import type { Check } from './check';

/** Cited rows that give one code two meanings for the same cars. */
export const twoMeanings: Check = ({ rows }) =>
	[...rows.values()].flatMap((row) =>
		row.contested_by
			.filter((key) => row.row_key < key)
			.map((key) => ({
				check: 'two_meanings',
				rows: [row.row_key, key],
				sources: [],
				message: text.two_meanings(row.code, row.meaning, (rows.get(key) as CompiledRow).meaning)
			}))
	);
