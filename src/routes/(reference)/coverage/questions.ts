/** What the tables leave open, as the coverage page asks it. */
import { contradictionsOf } from '$lib/decoder/contradictions';
import type { TableSet } from '$lib/decoder';
import { rowAddress } from '$lib/format/addresses';
import { contradictionText as text } from '$lib/text/en/contradictions';
import { CONTRADICTIONS } from '$lib/types';

/** Questions shown of each kind. */
const SHOWN = 4;

export interface QuestionGroup {
	readonly name: string;
	/** What an open question of the kind may mean for a reading. */
	readonly weight: string;
	readonly count: number;
	readonly shown: readonly {
		readonly message: string;
		readonly rows: readonly { readonly key: string; readonly address: string }[];
	}[];
}

/** Asked once of an edition: all rows are looked at. */
const known = new WeakMap<TableSet, readonly QuestionGroup[]>();

/** Kinds of question that have some, with the first few of each. */
export function questionsOf(tables: TableSet): readonly QuestionGroup[] {
	const found = known.get(tables);
	if (found) return found;
	const all = contradictionsOf(tables);
	const groups = CONTRADICTIONS.flatMap((check) => {
		const own = all.filter((hit) => hit.check === check);
		return own.slice(0, 1).map(({ weight }) => ({
			name: text.names[check],
			weight: text.weights[weight],
			count: own.length,
			shown: own.slice(0, SHOWN).map(({ message, rows }) => ({
				message,
				rows: rows.map((key) => ({ key, address: rowAddress(key) }))
			}))
		}));
	});
	known.set(tables, groups);
	return groups;
}
