import { z } from 'zod';
import {
	citationSchema,
	claimSchema,
	referenceRowSchema,
	rowKeySchema,
	sourceKeySchema,
	sourceKindSchema,
	sourceSchema
} from './rows';
import { valuesSchemaFor } from './values';

/** What a part of a correction can do. */
export const PART_KINDS = [
	'add_row',
	'change_row',
	'retire_row',
	'add_source',
	'correct_source',
	'repeat_source',
	'withdraw_source',
	'add_claim',
	'change_claim',
	'retire_claim'
] as const;
export type PartKind = (typeof PART_KINDS)[number];

/** What a part rests on, as its author says it. Fields that do not apply are empty. */
export const evidenceSchema = z.strictObject({
	kind: sourceKindSchema,
	/** Where in the work: page, sheet, column. */
	locator: z.string().trim().max(200),
	address: z.union([z.literal(''), z.url({ protocol: /^https?$/, error: 'address' }).max(500)]),
	/** A short quotation: the work keeps its rights. */
	quotation: z.string().trim().max(400, 'quotation_long'),
	/** The file with a photograph of the page or plate. */
	photograph: z.string().max(64).nullable()
});
export type Evidence = z.infer<typeof evidenceSchema>;

type Years = { readonly years_from: number | null; readonly years_to: number | null };
const inOrder = ({ years_from, years_to }: Years): boolean =>
	years_from === null || years_to === null || years_from <= years_to;

/** A row as it may be proposed: its facts meet the schema of its table. */
const proposedRowSchema = referenceRowSchema
	.refine(inOrder, { error: 'years_order', path: ['years_to'] })
	.refine(({ table, values }) => valuesSchemaFor(table).safeParse(values).success, {
		error: 'values',
		path: ['values']
	});
const proposedClaimSchema = claimSchema.refine(inOrder, {
	error: 'years_order',
	path: ['years_to']
});

const evidence = z.array(evidenceSchema).max(12).readonly();
const row = <K extends PartKind>(kind: K) =>
	z
		.strictObject({
			kind: z.literal(kind),
			row: proposedRowSchema,
			/** Everything that the row is to rest on, not only what is new. */
			citations: z.array(citationSchema).max(60).readonly(),
			evidence
		})
		.refine((part) => part.citations.every(({ row_key }) => row_key === part.row.row_key), {
			error: 'citation_elsewhere',
			path: ['citations']
		});
const source = <K extends PartKind>(kind: K) =>
	z.strictObject({ kind: z.literal(kind), source: sourceSchema, evidence });
const claim = <K extends PartKind>(kind: K) =>
	z.strictObject({ kind: z.literal(kind), claim: proposedClaimSchema, evidence });

/** One change of the tables. What is wrong with one is told by codes, of which `correctionsText.faults` makes sentences. */
export const correctionPartSchema = z.discriminatedUnion('kind', [
	row('add_row'),
	row('change_row'),
	z.strictObject({ kind: z.literal('retire_row'), row_key: rowKeySchema, evidence }),
	source('add_source'),
	source('correct_source'),
	z.strictObject({
		kind: z.literal('repeat_source'),
		key: sourceKeySchema,
		repeats: sourceKeySchema.nullable(),
		evidence
	}),
	z.strictObject({ kind: z.literal('withdraw_source'), key: sourceKeySchema, evidence }),
	claim('add_claim'),
	claim('change_claim'),
	z.strictObject({
		kind: z.literal('retire_claim'),
		claim_key: claimSchema.shape.claim_key,
		evidence
	})
]);
export type CorrectionPart = z.infer<typeof correctionPartSchema>;
