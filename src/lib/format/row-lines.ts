import type { CompiledRow } from '../decoder';
import { tableDefinition, type FieldSource, type Strength } from '../types';
import { rowAddress } from './addresses';
import { scopeWords } from './scope';
import { swatchOf } from './values';
import { yearSpan } from './years';

/** A row as lists show it. */
export interface RowLine {
	readonly key: string;
	readonly address: string;
	readonly code: string;
	readonly meaning: string;
	/** What stands beside the meaning; cut short where it is long. */
	readonly note: string;
	/** Label of its table. */
	readonly table: string;
	readonly scope: string;
	readonly years: string;
	readonly strength: Strength;
	/** The first sources, with the place in them. */
	readonly restsOn: readonly string[];
	/** Sources beyond these. */
	readonly more: number;
	readonly hex: string | null;
}

/** Sources named in a list; the row's own page has all. */
const NAMED = 2;
const LONGEST_NOTE = 110;

/** @example shortened('Numbered as in the shop picture of the plate.', 20) // 'Numbered as in the…' */
export function shortened(text: string, most: number): string {
	if (text.length <= most) return text;
	const cut = text.slice(0, most);
	return `${cut.slice(0, Math.max(cut.lastIndexOf(' '), 1)).replace(/[.,;:]$/, '')}…`;
}

/** A work and the place in it. */
export const citedAt = ({ title, locator }: Pick<FieldSource, 'title' | 'locator'>): string =>
	locator ? `${title}, ${locator}` : title;

export function rowLine(row: CompiledRow): RowLine {
	const named = [...new Set(row.sources.map(citedAt))];
	return {
		key: row.row_key,
		address: rowAddress(row.row_key),
		code: row.code,
		meaning: row.meaning,
		note: shortened(row.note, LONGEST_NOTE),
		table: tableDefinition(row.table).label,
		scope: scopeWords(row),
		years: yearSpan(row.years_from, row.years_to),
		strength: row.strength,
		restsOn: named.slice(0, NAMED),
		more: Math.max(0, named.length - NAMED),
		hex: swatchOf(row.values)
	};
}
