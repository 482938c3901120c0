/** How rows are ordered, and when two of them speak of the same thing. */
import { FIRST_YEAR, LAST_YEAR, SCOPE_COLUMNS, type ReferenceRow } from '../../types';

const byUnit = (a: string, b: string): number => (a < b ? -1 : a > b ? 1 : 0);

/** The canonical order of a table: code, years, division, line, key; by code unit, "no year" first. */
export function compareRows(a: ReferenceRow, b: ReferenceRow): number {
	return (
		byUnit(a.code, b.code) ||
		(a.years_from ?? 0) - (b.years_from ?? 0) ||
		(a.years_to ?? 0) - (b.years_to ?? 0) ||
		byUnit(a.division.join('|'), b.division.join('|')) ||
		byUnit(a.line.join('|'), b.line.join('|')) ||
		byUnit(a.row_key, b.row_key)
	);
}

/** JSON with the keys of every object sorted by code unit: one text for one content. */
export function canonicalJson(value: unknown): string {
	return JSON.stringify(value, (_, inner: unknown) =>
		typeof inner === 'object' && inner !== null && !Array.isArray(inner)
			? Object.fromEntries(Object.entries(inner).sort(([a], [b]) => byUnit(a, b)))
			: inner
	);
}

/** Whether two JSON values are the same, whatever the order of keys. */
export function sameContent(a: unknown, b: unknown): boolean {
	if (a === b) return true;
	if (typeof a !== 'object' || typeof b !== 'object' || a === null || b === null) return false;
	const keys = Object.keys(a);
	if (Array.isArray(a) !== Array.isArray(b) || keys.length !== Object.keys(b).length) return false;
	return keys.every((key) =>
		sameContent((a as Record<string, unknown>)[key], (b as Record<string, unknown>)[key])
	);
}

/** Whether two rows give a code the same meaning and facts; notes do not count. */
export const saysTheSame = (
	a: Pick<ReferenceRow, 'meaning' | 'values'>,
	b: Pick<ReferenceRow, 'meaning' | 'values'>
): boolean => a.meaning === b.meaning && sameContent(a.values, b.values);

/**
 * Whether two rows of one code hold for the same cars: their years meet, and each scope column is either
 * open in both or set in both with a value in common. A narrower row is an exception, not a contradiction.
 */
export function overlaps(a: ReferenceRow, b: ReferenceRow): boolean {
	if ((a.years_from ?? FIRST_YEAR) > (b.years_to ?? LAST_YEAR)) return false;
	if ((b.years_from ?? FIRST_YEAR) > (a.years_to ?? LAST_YEAR)) return false;
	return SCOPE_COLUMNS.every((column) => {
		if (a[column].length === 0 || b[column].length === 0)
			return a[column].length === b[column].length;
		return a[column].some((value) => b[column].includes(value));
	});
}
