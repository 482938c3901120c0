import { z } from 'zod';
import { makerSchema, tableNameSchema } from './name-schemas';

/** Model years that the product speaks of. */
export const FIRST_YEAR = 1955;
export const LAST_YEAR = 2039;
export const yearSchema = z.number().int().min(FIRST_YEAR).max(LAST_YEAR);

export const rowKeySchema = z
	.string()
	.max(80)
	.regex(/^[a-z]+\.[a-z_]+\.[a-z0-9-]+\.[0-9]+$/);

/** Scope cells: null is "all"; several values are separated by `|` in the CSV and an array here. */
export const SCOPE_COLUMNS = ['division', 'line', 'body', 'engine', 'plant', 'market'] as const;
export type ScopeColumn = (typeof SCOPE_COLUMNS)[number];
const scope = z.array(z.string().min(1)).readonly();

/** One row of a code table, as released or as a correction left it. Years are model years, both inclusive. */
export const referenceRowSchema = z.object({
	row_key: rowKeySchema,
	maker: makerSchema,
	table: tableNameSchema,
	division: scope,
	line: scope,
	body: scope,
	engine: scope,
	plant: scope,
	market: scope,
	years_from: yearSchema.nullable(),
	years_to: yearSchema.nullable(),
	code: z.string().max(64),
	meaning: z.string().min(1).max(600),
	values: z.record(z.string(), z.unknown()),
	note: z.string().max(1200)
});
export type ReferenceRow = z.infer<typeof referenceRowSchema>;

export const SOURCE_KINDS = [
	'factory_paper',
	'law',
	'standard',
	'book',
	'club_research',
	'magazine',
	'web_page',
	'dataset',
	'car_seen',
	'common_practice',
	'memory'
] as const;
export const sourceKindSchema = z.enum(SOURCE_KINDS);
export type SourceKind = z.infer<typeof sourceKindSchema>;

export const sourceKeySchema = z
	.string()
	.max(80)
	.regex(/^[a-z0-9][a-z0-9-]*$/);

/** A work that rows cite. `repeats` names the source that it copies: copies count once. */
export const sourceSchema = z.object({
	key: sourceKeySchema,
	title: z.string().min(1).max(300),
	publisher: z.string().max(200),
	year: z.number().int().min(1900).max(2039).nullable(),
	kind: sourceKindSchema,
	seen_at: z.string().max(500),
	licence: z.string().max(200),
	repeats: sourceKeySchema.nullable()
});
export type Source = z.infer<typeof sourceSchema>;

/** How much of a source was read before it was cited. `title` alone counts as nothing. */
export const READ_EXTENTS = ['whole', 'page', 'excerpt', 'title'] as const;
export const STANCES = ['for', 'against'] as const;

/** What a row rests on. `read` is null for memory and common practice, where there is nothing to read. */
export const citationSchema = z.object({
	row_key: rowKeySchema,
	source: sourceKeySchema,
	stance: z.enum(STANCES),
	read: z.enum(READ_EXTENTS).nullable(),
	locator: z.string().max(200),
	quotation: z.string().max(400),
	seen_on: z
		.string()
		.regex(/^\d{4}-\d{2}-\d{2}$/)
		.nullable()
});
export type Citation = z.infer<typeof citationSchema>;

/** A named source covers a table and scope completely: a code that it lacks was not used. */
export const claimSchema = z.object({
	claim_key: z
		.string()
		.max(80)
		.regex(/^[a-z0-9][a-z0-9.-]*$/),
	maker: makerSchema,
	table: tableNameSchema,
	division: scope,
	line: scope,
	years_from: yearSchema.nullable(),
	years_to: yearSchema.nullable(),
	source: sourceKeySchema,
	note: z.string().max(600)
});
export type Claim = z.infer<typeof claimSchema>;

/** All live content of one edition: what is compiled, digested, exported. */
export interface EditionContent {
	readonly rows: readonly ReferenceRow[];
	readonly citations: readonly Citation[];
	readonly sources: readonly Source[];
	readonly claims: readonly Claim[];
}

export const EDITION_CAUSES = ['release', 'correction', 'undo'] as const;
export type EditionCause = (typeof EDITION_CAUSES)[number];
/** The head of an edition. `digest` is SHA-256 over the canonical content, 64 hexadecimal figures. */
export interface EditionHead {
	readonly number: number;
	readonly parent: number | null;
	readonly digest: string;
	readonly cause: EditionCause;
	readonly cause_id: string | null;
	/** ISO 8601, UTC. */
	readonly made_at: string;
}
