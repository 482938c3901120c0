import type { RowFilters } from '$lib/server/reference';
import { tablesText } from '$lib/text/en/tables';
import { MAKER_NAMES, tableDefinition } from '$lib/types';

const text = tablesText.results;

/**
 * What rows are shown, in words.
 * @example headingOf({ division: 'Plymouth', year: 1970, table: 'engine' }, '383') // 'Plymouth 1970: Engine codes, “383”'
 */
export function headingOf(
	{ maker, division, year, table, strength }: RowFilters,
	query: string
): string {
	const make = division ?? (maker ? MAKER_NAMES[maker] : '');
	const scope = [make, year ?? ''].filter((part) => part !== '').join(' ');
	const what = [
		table ? tableDefinition(table).label : '',
		query && text.quoted(query),
		strength ? text.strength(tablesText.strengthOf[strength]) : ''
	]
		.filter(Boolean)
		.join(', ');
	return [scope, what].filter(Boolean).join(': ') || text.everything;
}
