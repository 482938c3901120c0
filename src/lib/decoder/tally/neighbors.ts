/** A code one character away that would agree: offered where a row says so, never applied. */
import type { FieldName, TableName, TallyAttribute } from '../../types';
import { isRead } from '../engine/characters';
import { alike } from '../engine/look-alikes';
import { rowsInYear, tableId, type TableSet } from '../engine/table-set';
import { agree, type Company } from './facts';
import type { Statement } from './statements';

/** The table that a field's code stands in. */
const TABLE_OF: Partial<Record<FieldName, TableName>> = {
	engine: 'engine',
	unit_code: 'unit_code',
	casting_number: 'casting_number',
	transmission: 'transmission',
	assembly_plant: 'assembly_plant'
};

export interface Neighbor {
	readonly code: string;
	/** The character to look at again, 1-based. */
	readonly place: number;
}

/** The one place in which codes of one length differ; null when they differ in more. */
function oneApart(code: string, other: string): number | null {
	if (code.length !== other.length) return null;
	const places = [...code].flatMap((character, index) =>
		character === other.charAt(index) ? [] : [index]
	);
	const [place] = places;
	return place !== undefined && places.length === 1 ? place : null;
}

/**
 * The codes one character from a statement's own of which a row of its year says what the other side says; look-alikes
 * first. A code of one character has only look-alikes: every other letter would be one away.
 */
export function neighborsOf(
	statement: Statement,
	other: Statement,
	attribute: TallyAttribute,
	tables: TableSet,
	company: Company
): readonly Neighbor[] {
	const { field, maker, code, cells, year } = statement;
	const table = TABLE_OF[field];
	if (maker === null || table === undefined || !cells.every(isRead)) return [];
	const own = tables.tables.get(tableId(maker, table));
	const found: { readonly neighbor: Neighbor; readonly likely: boolean }[] = [];
	for (const [candidate, entry] of own?.byCode ?? []) {
		const place = oneApart(code, candidate);
		if (place === null) continue;
		const likely = alike(code.charAt(place)).includes(candidate.charAt(place));
		if (code.length === 1 && !likely) continue;
		const agrees = rowsInYear(entry, year).some((row) =>
			other.options.some((option) => agree(attribute, row.values, option.facts, company) === true)
		);
		if (agrees) found.push({ neighbor: { code: candidate, place: place + 1 }, likely });
	}
	const likely = found.filter((one) => one.likely);
	return (likely.length > 0 ? likely : found).map(({ neighbor }) => neighbor);
}
