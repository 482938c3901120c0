import type {
	Citation,
	Claim,
	FieldSource,
	Maker,
	ReferenceRow,
	ScopeColumn,
	Source,
	Strength,
	TableName
} from '../../types';
import { FIRST_YEAR } from '../../types';

/** A row with all that an edition fixes about it: strength, the sentence behind it, its sources. */
export interface CompiledRow extends ReferenceRow {
	readonly strength: Strength;
	readonly strength_why: string;
	readonly sources: readonly FieldSource[];
	readonly citations: readonly Citation[];
	/** Keys of the live rows that say something else of the same code and scope. */
	readonly contested_by: readonly string[];
	/** Whether a citation above memory and common practice speaks for it. */
	readonly cited: boolean;
	/** Scope columns that are set and that a stamp can tell, in the order in which a missing one is named. */
	readonly scoped: readonly Exclude<ScopeColumn, 'market'>[];
	/** How many scope columns are set: a narrower row stands before a wider one. */
	readonly narrowness: number;
}

/** Rows of one code: all of them, and those of each model year (`years[year - 1955]`). */
export interface CodeEntry {
	readonly code: string;
	readonly all: readonly CompiledRow[];
	readonly years: readonly (readonly CompiledRow[] | undefined)[];
}

/** The rows of one maker and table, in canonical order. */
export interface CompiledTable {
	readonly maker: Maker;
	readonly table: TableName;
	readonly rows: readonly CompiledRow[];
	readonly byCode: ReadonlyMap<string, CodeEntry>;
	readonly claims: readonly Claim[];
}

/** Everything one edition says, compiled once and immutable. Unchanged tables are shared between editions. */
export interface TableSet {
	readonly tables: ReadonlyMap<string, CompiledTable>;
	readonly rows: ReadonlyMap<string, CompiledRow>;
	readonly sources: ReadonlyMap<string, Source>;
	readonly claims: readonly Claim[];
}

export const tableId = (maker: Maker, table: TableName): string => `${maker}/${table}`;

const NO_ROWS: readonly CompiledRow[] = [];

/** Rows of an entry that hold in a model year; all of them when the year is open. */
export function rowsInYear(entry: CodeEntry, year: number | null): readonly CompiledRow[] {
	return year === null ? entry.all : (entry.years[year - FIRST_YEAR] ?? NO_ROWS);
}
