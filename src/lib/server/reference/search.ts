import Fuse from 'fuse.js';
import { compareRows, type CompiledRow, type CompiledTable, type TableSet } from '../../decoder';
import { MAKERS, TABLE_NAMES, type Maker, type Strength, type TableName } from '../../types';
import { findAsTyped, folded, type Found } from './search-as-typed';

/** What narrows a search. Everything is optional; a row that is open in a column fits every value of it. */
export interface RowFilters {
	readonly maker?: Maker;
	readonly table?: TableName;
	/** A division's full name. */
	readonly division?: string;
	/** A model year. */
	readonly year?: number;
	readonly strength?: Strength;
}
export interface RowPage {
	readonly items: readonly CompiledRow[];
	/** How many rows fit in all. */
	readonly total: number;
	/** Where the next page begins; null after the last. */
	readonly next: number | null;
}

/** Words of a query that are heeded, and characters of one: a longer one only costs time. */
const MOST_WORDS = 6;
const LONGEST_WORD = 32;

const KEYS = [
	{ name: 'code', weight: 3 },
	{ name: 'meaning', weight: 2 },
	{ name: 'line', weight: 1 },
	{ name: 'division', weight: 1 },
	{ name: 'note', weight: 0.5 }
];

/** Built when a table is first searched; a table that two editions share is indexed once. */
const indexes = new WeakMap<CompiledTable, Fuse<CompiledRow>>();

function indexOf(table: CompiledTable): Fuse<CompiledRow> {
	let index = indexes.get(table);
	if (!index) {
		index = new Fuse(table.rows, {
			keys: KEYS,
			threshold: 0.3,
			ignoreLocation: true,
			ignoreDiacritics: true,
			includeScore: true
		});
		indexes.set(table, index);
	}
	return index;
}

const wordsOf = (query: string): string[] =>
	query
		.trim()
		.split(/\s+/)
		.filter(Boolean)
		.slice(0, MOST_WORDS)
		.map((word) => word.slice(0, LONGEST_WORD));

/** Rows of one table that have every word somewhere, slips of spelling forgiven. */
function find(table: CompiledTable, words: readonly string[]): Found[] {
	const found = indexOf(table).search({
		$and: words.map((word) => ({ $or: KEYS.map(({ name }) => ({ [name]: word })) }))
	});
	return found.map(({ item, score }) => ({ row: item, score: score ?? 1 }));
}

/** Slips of spelling are forgiven where no row has the words as they were typed. */
function findIn(
	tables: readonly CompiledTable[],
	words: readonly string[],
	filters: RowFilters
): Found[] {
	const fitting = (found: readonly Found[]) => found.filter(({ row }) => fits(row, filters));
	const typed = words.map(folded);
	const asTyped = tables.flatMap((table) => fitting(findAsTyped(table, typed)));
	if (asTyped.length > 0) return asTyped;
	return tables.flatMap((table) => fitting(find(table, words)));
}

function fits(row: CompiledRow, { division, year, strength }: RowFilters): boolean {
	if (strength !== undefined && row.strength !== strength) return false;
	if (division !== undefined && row.division.length > 0 && !row.division.includes(division))
		return false;
	if (year === undefined || row.years_from === null || row.years_to === null) return true;
	return row.years_from <= year && year <= row.years_to;
}

/** The tables of a set by maker and then in the order of their definitions. */
export const tablesInOrder = (tables: TableSet, search: RowFilters = {}): CompiledTable[] =>
	[...tables.tables.values()]
		.filter(({ maker }) => search.maker === undefined || maker === search.maker)
		.filter(({ table }) => search.table === undefined || table === search.table)
		.sort(
			(a, b) =>
				MAKERS.indexOf(a.maker) - MAKERS.indexOf(b.maker) ||
				TABLE_NAMES.indexOf(a.table) - TABLE_NAMES.indexOf(b.table)
		);

/**
 * Rows that fit the filters and have every word of the query, by how well they match; without a query all
 * that fit, in the order of the tables. Slips of spelling are forgiven where nothing else is found.
 * @param page where to begin and how many to answer at most; all of them unless told
 */
export function searchRows(
	tables: TableSet,
	query: string,
	filters: RowFilters = {},
	{ offset = 0, limit = Infinity }: { offset?: number; limit?: number } = {}
): RowPage {
	const words = wordsOf(query);
	const searched = tablesInOrder(tables, filters);
	const rows =
		words.length === 0
			? searched.flatMap((table) => table.rows.filter((row) => fits(row, filters)))
			: findIn(searched, words, filters)
					.sort((a, b) => a.score - b.score || compareRows(a.row, b.row))
					.map(({ row }) => row);
	const end = offset + limit;
	return {
		items: rows.slice(offset, end),
		total: rows.length,
		next: end < rows.length ? end : null
	};
}
