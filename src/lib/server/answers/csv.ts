import { stringify } from 'csv-stringify/sync';
import type { CompiledRow } from '../../decoder';
import { SCOPE_COLUMNS } from '../../types';

const COLUMNS = [
	'row_key',
	...SCOPE_COLUMNS,
	'years_from',
	'years_to',
	'code',
	'meaning',
	'values',
	'note',
	'strength',
	'strength_why',
	'sources'
] as const;

/**
 * Rows as CSV: the released cells, then strength and the titles of the sources. Several values of a cell
 * are joined by `|`. A cell that a spreadsheet would take for a formula is put in quotes of its own.
 */
export const rowsAsCsv = (rows: readonly CompiledRow[]): string =>
	stringify(
		rows.map((row) => ({
			...row,
			...Object.fromEntries(SCOPE_COLUMNS.map((column) => [column, row[column].join('|')])),
			values: JSON.stringify(row.values),
			sources: row.sources
				.map(({ title, locator }) => (locator ? `${title}, ${locator}` : title))
				.join('|')
		})),
		{ header: true, columns: [...COLUMNS], escape_formulas: true, record_delimiter: '\n' }
	);
