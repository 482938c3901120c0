/**
 * What the public interface takes: names and meanings of parameters. The routes read them by hand, since
 * they are forgiving about case and space; the OpenAPI document is made from these schemas, and a test
 * holds both to the same names.
 */
import { z } from 'zod';
import { FIELD_NAMES } from './fields';
import { MAX_STAMPS, MAX_TEXT, STAMP_KINDS } from './readings';
import { FIRST_YEAR, LAST_YEAR, SOURCE_KINDS } from './rows';

const maker = z.string().describe('Corporation or division, by any name that /makers lists');
const division = z.string().describe('Division, by any name that /makers lists');
const year = z.int().min(FIRST_YEAR).max(LAST_YEAR).describe('Model year');
const edition = z.int().min(0).describe('Number of an edition; the present one when left out');

const context = {
	field: z.enum(FIELD_NAMES).optional().describe('For one bare code: the field it stands in'),
	maker: maker.optional(),
	division: division
		.optional()
		.describe(
			'Division; Chrysler, Ford and AMC mean the corporation as maker and the division here'
		),
	year: year.optional(),
	plant: z.string().max(3).optional().describe('Assembly plant code'),
	serial: z
		.string()
		.max(MAX_TEXT.serial)
		.optional()
		.describe('The serial of the same car: what it tells scopes the other stamps')
};
const reading = {
	text: z
		.string()
		.min(1)
		.max(MAX_TEXT.body_tag)
		.describe(
			'What is struck on the car. ?, _, a star inside, or a run of lower-case x stand for what cannot be read; [38] for either. ' +
				'Lines of a body tag are joined by " / " or line breaks. 64 characters; engine and casting 120; body_tag 600 and 14 lines'
		),
	kind: z.enum(STAMP_KINDS).optional().describe('Left out: every kind that fits, ranked'),
	...context,
	edition: edition.optional()
};

const fields = z
	.partialRecord(z.enum(FIELD_NAMES), z.string().max(MAX_TEXT.serial))
	.optional()
	.describe('For body_tag in place of text: what stands in each named field');

/** GET /readings. */
export const readingQuerySchema = z.strictObject({
	...reading,
	reader: z
		.string()
		.optional()
		.describe(
			'With edition: makes the address permanent, and the answer cacheable for good as long as this is the reader that answers'
		),
	explain: z.enum(['0', '1']).optional().describe('1: each field tells what it looked up')
});

/** The body of POST /readings: the same, the context beside the text or under `context`. */
export const readingBodySchema = z.strictObject({
	...reading,
	text: reading.text.optional(),
	fields,
	reader: z.string().optional(),
	explain: z.boolean().optional(),
	context: z.strictObject(context).optional()
});

/** The body of POST /readings for several stamps of one car. */
export const stampsBodySchema = z.strictObject({
	stamps: z
		.array(
			z.strictObject({
				kind: reading.kind,
				text: reading.text.optional(),
				fields,
				place: z.string().max(100).optional().describe('Where it sits')
			})
		)
		.min(1)
		.max(MAX_STAMPS)
		.describe('The serial need not come first: it is read first, and scopes the others'),
	context: z.strictObject(context).optional(),
	edition: edition.optional(),
	explain: z.boolean().optional()
});

const list = {
	limit: z.int().min(1).max(200).optional().describe('Most items to answer; 50 when left out'),
	cursor: z.string().optional().describe('`next` of the page before')
};
export const listQuerySchema = z.strictObject(list);
export const editionQuerySchema = z.strictObject({ edition: edition.optional() });
export const tablesQuerySchema = z.strictObject({
	edition: edition.optional(),
	maker: maker.optional(),
	...list
});
export const tableQuerySchema = z.strictObject({
	edition: edition.optional(),
	division: division.optional(),
	year: year.optional(),
	code: z.string().max(64).optional().describe('Exactly this code, case aside'),
	q: z.string().max(100).optional().describe('Words to search for'),
	format: z.enum(['json', 'csv']).optional().describe('Stands before the Accept header'),
	...list
});
export const sourcesQuerySchema = z.strictObject({
	edition: edition.optional(),
	kind: z.enum(SOURCE_KINDS).optional(),
	...list
});
export const itemsQuerySchema = z.strictObject({
	edition: edition.optional(),
	maker: maker.optional(),
	...list
});

export type ReadingQuery = z.input<typeof readingQuerySchema>;
export type ReadingBody = z.input<typeof readingBodySchema>;
export type StampsBody = z.input<typeof stampsBodySchema>;
export type ListQuery = z.input<typeof listQuerySchema>;
export type EditionQuery = z.input<typeof editionQuerySchema>;
export type TablesQuery = z.input<typeof tablesQuerySchema>;
export type TableQuery = z.input<typeof tableQuerySchema>;
export type SourcesQuery = z.input<typeof sourcesQuerySchema>;
export type ItemsQuery = z.input<typeof itemsQuerySchema>;
