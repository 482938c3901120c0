import { z } from 'zod';
import type { TableName } from './tables';

const text = z.string().min(1);
const count = z.number().int().nonnegative();
const positive = z.number().positive();
const texts = z.array(text).min(1);
const condition = z.strictObject({
	attribute: text,
	any_of: texts.optional(),
	none_of: texts.optional()
});

/** Typed facts of a row. Units stand in the names; a fact without a place here goes into the meaning or note. */
export const factsSchema = z.strictObject({
	division: text.optional(),
	line: text.optional(),
	series: text.optional(),
	body_style: text.optional(),
	model_year: z.number().int().min(1955).max(2039).optional(),
	displacement_cuin: positive.optional(),
	displacement_l: positive.optional(),
	horsepower_gross: positive.optional(),
	horsepower_net: positive.optional(),
	compression_ratio: positive.optional(),
	bore_in: positive.optional(),
	stroke_in: positive.optional(),
	carburetor_barrels: count.optional(),
	carburetors: count.optional(),
	cylinders: count.optional(),
	doors: count.optional(),
	plant_city: text.optional(),
	plant_region: text.optional(),
	/** The other spelling of the same plant: the serial letter beside a tag abbreviation. */
	plant_code: text.optional(),
	country: text.optional(),
	maker_name: text.optional(),
	hex_approximate: z
		.string()
		.regex(/^#[0-9A-F]{6}$/)
		.optional(),
	first_sequence: count.optional(),
	last_sequence: count.optional(),
	ratio: positive.optional(),
	locking: z.boolean().optional(),
	transmission: text.optional(),
	speeds: count.optional(),
	month: z.number().int().min(1).max(12).optional(),
	units_built: count.optional(),
	/** What a casting, stamp or date belongs to: block, head, intake, gearbox, glass … */
	part: text.optional()
});

/** What a finding can be made about, and how easily it is added to a car later. */
export const itemSchema = z.strictObject({
	place: text,
	added_later: z.enum(['bolted', 'trimmed', 'structural']),
	look_for: text.optional()
});
export const packageSchema = z.strictObject({
	requires: z.array(condition).default([]),
	brings: z.array(z.strictObject({ item: text })).default([]),
	excludes: z.array(condition).default([])
});
export const ruleSchema = z.strictObject({
	when: z.array(condition),
	then: z.array(condition).min(1)
});
export const constraintSchema = z.strictObject({
	left: condition,
	right: condition
});
export const leadTimeSchema = z.strictObject({
	part: text,
	against: z.enum(['assembled', 'body', 'scheduled', 'car_finished']),
	days_min: z.number().int(),
	days_max: z.number().int()
});
export const plantYearsSchema = z.strictObject({
	plant_code: text,
	plant_city: text.optional(),
	plant_region: text.optional()
});

const SPECIAL: Partial<Record<TableName, z.ZodType>> = {
	item: itemSchema,
	package: packageSchema,
	rule: ruleSchema,
	constraint: constraintSchema,
	lead_time: leadTimeSchema,
	plant_years: plantYearsSchema
};

/** The schema that the `values` of a table's rows must meet. */
export const valuesSchemaFor = (table: TableName): z.ZodType => SPECIAL[table] ?? factsSchema;

export type Facts = z.infer<typeof factsSchema>;
export type RowValues = Readonly<Record<string, unknown>>;
