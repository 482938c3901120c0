import { z } from 'zod';

/** What a field of a reading is about. Closed: the interface promises these names. */
export const FIELD_NAMES = [
	'maker',
	'division',
	'country',
	'wmi',
	'line',
	'series',
	'price_class',
	'body_style',
	'model_year',
	'assembly_plant',
	'engine',
	'transmission',
	'sequence_number',
	'check_digit',
	'restraint',
	'cylinder_group',
	'paint',
	'paint_upper',
	'roof',
	'trim',
	'build_date',
	'body_number',
	'axle',
	'sales_district',
	'option',
	'order_number',
	'partial_serial',
	'casting_number',
	'casting_date',
	'assembly_date',
	'unit_code',
	'filler',
	'unknown'
] as const;
export const fieldNameSchema = z.enum(FIELD_NAMES);
export type FieldName = z.infer<typeof fieldNameSchema>;

/**
 * How a field came out.
 * - `found`: a row, or the layout itself, says what the characters mean.
 * - `not_listed`: we have no row. Says nothing against the car.
 * - `not_used`: a claim of completeness covers this scope, and the factory used no such code.
 * - `illegible`: a character that decides is unread; `possible` lists what it could be.
 * - `contested`: sources differ; `alternatives` lists all, and `meaning` is null.
 */
export const OUTCOMES = ['found', 'not_listed', 'not_used', 'illegible', 'contested'] as const;
export const outcomeSchema = z.enum(OUTCOMES);
export type Outcome = z.infer<typeof outcomeSchema>;

/** How well a row is supported. Computed from its citations, never typed. */
export const STRENGTHS = ['firm', 'fair', 'thin', 'contested', 'not_rated'] as const;
export const strengthSchema = z.enum(STRENGTHS);
export type Strength = z.infer<typeof strengthSchema>;
