/**
 * What the public interface answers. Tests hold every answer against these schemas, the OpenAPI document
 * is made from them, and the client takes its types from them. Pages import the types alone: this file
 * brings zod with it.
 */
import { z } from 'zod';
import { fieldNameSchema, outcomeSchema, strengthSchema } from './fields';
import { stampKindSchema } from './readings';
import {
	citationSchema,
	EDITION_CAUSES,
	referenceRowSchema,
	sourceKeySchema,
	sourceKindSchema,
	sourceSchema
} from './rows';
import { makerSchema, tableNameSchema } from './name-schemas';
import { tallyLineSchema } from './tally';
import { factsSchema, itemSchema } from './values';

/** One thing wrong with a request: which parameter, why, and what would be taken. */
export const fieldErrorSchema = z.strictObject({
	field: z.string().describe('Parameter, member of the body, or header'),
	code: z.string().describe('Stable; the message may change'),
	message: z.string(),
	accepted: z.array(z.string()).describe('The closed set of values; empty where there is none')
});
export type FieldError = z.infer<typeof fieldErrorSchema>;

/** Problem details as RFC 9457 has them. */
export const problemDetailsSchema = z.strictObject({
	type: z.literal('about:blank'),
	title: z.string(),
	status: z.number().int().min(400).max(599),
	detail: z.string(),
	errors: z.array(fieldErrorSchema)
});
export type ProblemDetails = z.infer<typeof problemDetailsSchema>;

/** Values whose names carry their units; a reader of the interface passes over names it does not know. */
export const valuesSchema = z
	.looseObject({
		...factsSchema.shape,
		earliest: z.iso.date().optional(),
		latest: z.iso.date().optional()
	})
	.describe('Typed facts; units stand in the names');

export const fieldSourceSchema = z.strictObject({
	key: sourceKeySchema,
	title: z.string(),
	locator: z.string(),
	kind: sourceKindSchema
});
export const alternativeSchema = z.strictObject({
	meaning: z.string(),
	values: valuesSchema,
	strength: strengthSchema,
	rows: z.array(z.string()),
	sources: z.array(fieldSourceSchema)
});
export const possibleSchema = z.strictObject({
	code: z.string().optional(),
	meaning: z.string(),
	values: valuesSchema,
	scope: z.string().optional().describe('Where this meaning holds, in words')
});
export const lookupSchema = z.strictObject({
	table: tableNameSchema,
	code: z.string(),
	row_key: z.string().nullable().describe('Null where no row was found')
});
export const readingFieldSchema = z.strictObject({
	name: fieldNameSchema,
	label: z.string(),
	line: z
		.number()
		.int()
		.min(1)
		.optional()
		.describe('Line of a stamp of several lines, from the top as typed'),
	from: z.number().int().min(1).describe('First place in the normalised text, from 1'),
	to: z.number().int().min(1).describe('Last place, inclusive'),
	derived_from: z.array(fieldNameSchema).optional(),
	code: z.string().describe('The characters, ? where unread'),
	outcome: outcomeSchema,
	meaning: z.string().nullable(),
	detail: z.string(),
	values: valuesSchema,
	strength: strengthSchema.nullable(),
	strength_why: z.string(),
	rows: z.array(z.string()),
	sources: z.array(fieldSourceSchema),
	alternatives: z.array(alternativeSchema).describe('All that sources say, where they differ'),
	possible: z.array(possibleSchema).describe('What an unread character could be'),
	lookups: z.array(lookupSchema).optional().describe('Only with explain')
});

const makerName = z.string().describe('Full name of the corporation');
const makerKey = makerSchema.describe('Short key, as in addresses');
const editionNumber = z.number().int().min(0);
const digest = z.string().regex(/^[0-9a-f]{64}$/);
/** What an answer is a function of, beside the request. */
const basis = { edition: editionNumber, digest };

export const readingSchema = z.strictObject({
	layout: z.string().nullable(),
	layout_title: z.string(),
	maker: makerName.nullable(),
	maker_key: makerKey.nullable(),
	division: z.string().nullable(),
	model_year: z.number().int().nullable(),
	state: z.enum(['complete', 'partial']),
	rank: z.number().int().min(1).describe('Equal readings share a rank'),
	why: z.string(),
	fields: z.array(readingFieldSchema)
});
export const readProblemSchema = z.strictObject({
	layout: z.string().optional(),
	position: z.number().int().min(1).optional(),
	line: z.number().int().min(1).optional().describe('Line of a body tag, blank ones not counted'),
	code: z.string(),
	message: z.string(),
	offers: z.array(z.strictObject({ text: z.string(), why: z.string() }))
});
const stampResult = {
	input: z.strictObject({
		kind: stampKindSchema.nullable(),
		text: z.string(),
		normalised: z.string()
	}),
	readings: z.array(readingSchema).max(24),
	more: z.number().int().min(0),
	problems: z.array(readProblemSchema)
};
const readerDigest = z.string().regex(/^[0-9a-f]{12}$/);
export const readAnswerSchema = z.strictObject({
	...basis,
	reader: readerDigest,
	...stampResult
});
/** Several stamps of one car, and the lines in which they say something of each other. */
export const stampsAnswerSchema = z.strictObject({
	...basis,
	reader: readerDigest,
	stamps: z.array(z.strictObject(stampResult)),
	lines: z.array(tallyLineSchema)
});

/** A list, a page of it at a time; `next` is the cursor of the next page. */
export const listOf = <Item extends z.ZodType, More extends z.ZodRawShape = Record<never, never>>(
	item: Item,
	more: More = {} as More
) => z.strictObject({ ...more, items: z.array(item), next: z.string().nullable() });

const named = {
	name: z.string(),
	aliases: z.array(z.string()).describe('Case and signs are free')
};
export const makerEntrySchema = z.strictObject({
	...named,
	key: makerKey,
	divisions: z.array(z.strictObject(named))
});
export const layoutEntrySchema = z.strictObject({
	id: z.string(),
	title: z.string(),
	maker: makerName,
	maker_key: makerKey,
	kind: stampKindSchema,
	years_from: z.number().int(),
	years_to: z.number().int(),
	length: z
		.number()
		.int()
		.min(1)
		.nullable()
		.describe('Characters; null for a stamp of lines, whose lengths vary'),
	source: z.string(),
	example: z.string(),
	order: z
		.enum(['down', 'up'])
		.nullable()
		.describe('From which end of the plate its lines are read; null for a serial number'),
	lines: z
		.array(z.strictObject({ label: z.string(), optional: z.boolean(), repeats: z.boolean() }))
		.describe('In the order in which they are read; none for a serial number'),
	fields: z.array(
		z.strictObject({
			name: fieldNameSchema,
			label: z.string(),
			line: z.number().int().min(1).nullable().describe('Which of `lines`, from 1'),
			from: z.number().int().min(1).nullable().describe('Null where places vary'),
			to: z.number().int().min(1).nullable(),
			table: tableNameSchema.nullable()
		})
	),
	derived: z.array(
		z.strictObject({
			name: fieldNameSchema,
			label: z.string(),
			derived_from: z.array(fieldNameSchema),
			table: tableNameSchema.nullable()
		})
	)
});
const tableNamed = {
	maker: makerName,
	maker_key: makerKey,
	table: tableNameSchema,
	label: z.string(),
	about: z.string()
};
export const tableEntrySchema = z.strictObject({
	...tableNamed,
	rows: z.number().int().min(1)
});

/** A row as an edition has it: the released cells, and what the edition fixes about them. */
export const rowSchema = z.strictObject({
	...referenceRowSchema.shape,
	maker: makerName,
	maker_key: makerKey,
	values: valuesSchema,
	strength: strengthSchema,
	strength_why: z.string(),
	sources: z.array(fieldSourceSchema),
	contested_by: z.array(z.string()).describe('Rows that say something else of the same code')
});
export type RowAnswer = z.infer<typeof rowSchema>;
export const citedSchema = z.strictObject({
	...citationSchema.omit({ row_key: true }).shape,
	title: z.string(),
	kind: sourceKindSchema
});
export const rowDetailSchema = z.strictObject({
	...basis,
	...rowSchema.shape,
	citations: z.array(citedSchema)
});
/** A row as it stood in editions `edition_from` up to, and without, `edition_to`. */
export const rowVersionSchema = z.strictObject({
	version: z.number().int().min(1),
	edition_from: editionNumber,
	edition_to: editionNumber.nullable().describe('Null while it is live'),
	...referenceRowSchema.shape,
	maker: makerName,
	maker_key: makerKey,
	values: valuesSchema,
	citations: z.array(citationSchema.omit({ row_key: true }))
});
export const sourceEntrySchema = z.strictObject({
	...sourceSchema.shape,
	cited_by: z.number().int().min(0).describe('Rows that cite it')
});
export const sourceDetailSchema = z.strictObject({
	...basis,
	...sourceEntrySchema.shape,
	rows: z.array(z.string()).max(200).describe('Keys of the first 200 rows that cite it'),
	repeated_by: z.array(z.string()).describe('Keys of the sources that copy it')
});
export const itemEntrySchema = z.strictObject({
	...itemSchema.shape,
	row_key: z.string(),
	maker: makerName,
	maker_key: makerKey,
	division: z.array(z.string()),
	years_from: z.number().int().nullable(),
	years_to: z.number().int().nullable(),
	item: z.string(),
	meaning: z.string(),
	strength: strengthSchema
});
export const editionSchema = z.strictObject({
	number: editionNumber,
	parent: editionNumber.nullable(),
	digest,
	cause: z.enum(EDITION_CAUSES),
	cause_id: z.string().nullable(),
	made_at: z.iso.datetime()
});

const changeCounts = z.strictObject({
	added: z.number().int().min(0),
	changed: z.number().int().min(0),
	retired: z.number().int().min(0)
});
/** An edition and what it changed of the one before; null for the first. */
export const editionDetailSchema = z.strictObject({
	...editionSchema.shape,
	changes: z
		.strictObject({ rows: changeCounts, sources: changeCounts, claims: changeCounts })
		.nullable(),
	row_keys: z
		.array(z.strictObject({ row_key: z.string(), change: z.enum(['added', 'changed', 'retired']) }))
		.max(200)
		.describe('The first 200 rows that it changed')
});

export const makersAnswerSchema = listOf(makerEntrySchema);
export const layoutsAnswerSchema = listOf(layoutEntrySchema);
export const tablesAnswerSchema = listOf(tableEntrySchema, basis);
export const tableAnswerSchema = listOf(rowSchema, {
	...basis,
	...tableNamed,
	total: z.number().int().min(0)
});
export const rowHistoryAnswerSchema = listOf(rowVersionSchema);
export const sourcesAnswerSchema = listOf(sourceEntrySchema, basis);
export const itemsAnswerSchema = listOf(itemEntrySchema, basis);
export const editionsAnswerSchema = listOf(editionSchema);

export type MakersAnswer = z.infer<typeof makersAnswerSchema>;
export type LayoutsAnswer = z.infer<typeof layoutsAnswerSchema>;
export type TablesAnswer = z.infer<typeof tablesAnswerSchema>;
export type TableAnswer = z.infer<typeof tableAnswerSchema>;
export type RowDetail = z.infer<typeof rowDetailSchema>;
export type RowHistoryAnswer = z.infer<typeof rowHistoryAnswerSchema>;
export type SourcesAnswer = z.infer<typeof sourcesAnswerSchema>;
export type SourceDetail = z.infer<typeof sourceDetailSchema>;
export type ItemsAnswer = z.infer<typeof itemsAnswerSchema>;
export type EditionsAnswer = z.infer<typeof editionsAnswerSchema>;
export type EditionDetail = z.infer<typeof editionDetailSchema>;
