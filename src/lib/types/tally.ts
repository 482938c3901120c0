import { z } from 'zod';
import { stampKindSchema, type Reading, type StampKind } from './readings';

/**
 * How a line of the tally came out.
 * - `tallies`: the sides agree. - `does_not_tally`: they have no value in common, and what that rests on is firm or fair.
 * - `cannot_be_told`: a value is missing, contested, still one of several, or rests on too little.
 * - `not_looked_at`: the other side has not been examined yet.
 */
export const TALLY_RESULTS = [
	'tallies',
	'does_not_tally',
	'cannot_be_told',
	'not_looked_at'
] as const;
export const tallyResultSchema = z.enum(TALLY_RESULTS);
export type TallyResult = z.infer<typeof tallyResultSchema>;

/** How hard it is to change what a statement stands on: struck or riveted; cast or labelled; bolted, painted or written. */
export const WEIGHTS = ['heavy', 'middling', 'light'] as const;
export const weightSchema = z.enum(WEIGHTS);
export type Weight = z.infer<typeof weightSchema>;

/** What a line is about. Attributes of findings and packages join these. */
export const TALLY_ATTRIBUTES = [
	'maker',
	'division',
	'model_year',
	'line',
	'series',
	'body_style',
	'assembly_plant',
	'sequence_number',
	'engine',
	'transmission',
	'axle',
	'paint',
	'trim',
	'roof',
	'order_number',
	'body_number',
	'date_order',
	'build_window'
] as const;
export const tallyAttributeSchema = z.enum(TALLY_ATTRIBUTES);
export type TallyAttribute = z.infer<typeof tallyAttributeSchema>;

/** One side of a line: where it was read and what it allows. */
export const tallySideSchema = z.object({
	/** Index of the stamp in the request; null for a side that is no stamp. */
	stamp: z.number().int().nonnegative().nullable(),
	kind: stampKindSchema.nullable(),
	/** Where it sits, as given with the stamp. */
	place: z.string().nullable(),
	/** The field's label: "Engine". */
	label: z.string(),
	code: z.string(),
	/** What it can mean, each once; empty when it says nothing. */
	meanings: z.array(z.string()).readonly(),
	/** ISO 8601 days of a date. */
	earliest: z.string().nullable(),
	latest: z.string().nullable()
});
export type TallySide = z.infer<typeof tallySideSchema>;

export const tallyLineSchema = z.object({
	attribute: tallyAttributeSchema,
	result: tallyResultSchema,
	/** In the trade's careful words; never a verdict on the car. */
	reason: z.string(),
	weight: weightSchema,
	/** What the result rests on, in a sentence. */
	ground: z.string(),
	left: tallySideSchema,
	/** Null where only one place says it: not looked at. */
	right: tallySideSchema.nullable(),
	/** Row keys that the result rests on. */
	rows: z.array(z.string()).readonly()
});
export type TallyLine = z.infer<typeof tallyLineSchema>;

/** A stamp of a car for the tally: where it sits, and what it was read to be. */
export interface TallyStamp {
	readonly kind: StampKind;
	readonly place?: string;
	/** As `read` answered it; only readings of the first rank speak. */
	readonly readings: readonly Reading[];
}
