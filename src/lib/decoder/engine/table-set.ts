import type {
	Citation,
	Claim,
	FieldSource,
	Maker,
	ReferenceRow,
	Source,
	Strength,
	TableName
} from '../../types';

/** A row with all that an edition fixes about it: strength, the sentence behind it, its sources. */
export interface CompiledRow extends ReferenceRow {
	readonly strength: Strength;
	readonly strength_why: string;
	readonly sources: readonly FieldSource[];
	readonly citations: readonly Citation[];
	/** Keys of the live rows that say something else of the same code and scope. */
	readonly contested_by: readonly string[];
}

/** The rows of one maker and table, in canonical order. */
export interface CompiledTable {
	readonly maker: Maker;
	readonly table: TableName;
	readonly rows: readonly CompiledRow[];
	/** Rows by code and, within it, by model year; `years[y - 1955]`. Frozen by convention, never changed. */
	readonly byCode: ReadonlyMap<string, readonly (readonly CompiledRow[] | undefined)[]>;
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
