import { z } from 'zod';
import * as api from '../../types/api';
import { tallyLineSchema } from '../../types/tally';
import { readingBodySchema, stampsBodySchema } from '../../types/api-requests';

/** Schemas that the document names. An answer's parts are named too, so that it stays readable. */
export const NAMED = {
	Problem: api.problemDetailsSchema,
	FieldError: api.fieldErrorSchema,
	ReadingBody: readingBodySchema,
	StampsBody: stampsBodySchema,
	ReadAnswer: api.readAnswerSchema,
	StampsAnswer: api.stampsAnswerSchema,
	TallyLine: tallyLineSchema,
	Reading: api.readingSchema,
	ReadingField: api.readingFieldSchema,
	ReadProblem: api.readProblemSchema,
	Alternative: api.alternativeSchema,
	Possible: api.possibleSchema,
	Lookup: api.lookupSchema,
	Values: api.valuesSchema,
	FieldSource: api.fieldSourceSchema,
	Maker: api.makerEntrySchema,
	Makers: api.makersAnswerSchema,
	Layout: api.layoutEntrySchema,
	Layouts: api.layoutsAnswerSchema,
	Table: api.tableEntrySchema,
	Tables: api.tablesAnswerSchema,
	Row: api.rowSchema,
	Rows: api.tableAnswerSchema,
	RowDetail: api.rowDetailSchema,
	RowHistory: api.rowHistoryAnswerSchema,
	Citation: api.citedSchema,
	Source: api.sourceEntrySchema,
	Sources: api.sourcesAnswerSchema,
	SourceDetail: api.sourceDetailSchema,
	Item: api.itemEntrySchema,
	Items: api.itemsAnswerSchema,
	Edition: api.editionSchema,
	EditionDetail: api.editionDetailSchema,
	Editions: api.editionsAnswerSchema
} as const satisfies Record<string, z.ZodType>;
export type SchemaName = keyof typeof NAMED;

/** JSON Schema, draft 2020-12, as OpenAPI 3.1 takes it. */
export type JsonSchema = { [key: string]: unknown };

export const refTo = (name: SchemaName) => `#/components/schemas/${name}`;

/**
 * What zod adds and the document does not want: identifiers that would move the base of references, and
 * the bounds of safe integers. Answers stay open to more members, so that they can grow.
 */
function tidy(schema: unknown, open: boolean): unknown {
	if (Array.isArray(schema)) return schema.map((part) => tidy(part, open));
	if (typeof schema !== 'object' || schema === null) return schema;
	const kept = Object.entries(schema).filter(
		([key, value]) =>
			key !== '$schema' &&
			key !== '$id' &&
			!(key === 'maximum' && value === Number.MAX_SAFE_INTEGER) &&
			!(key === 'minimum' && value === Number.MIN_SAFE_INTEGER) &&
			!(open && key === 'additionalProperties')
	);
	return Object.fromEntries(kept.map(([key, value]) => [key, tidy(value, open)]));
}

/** All named schemas as JSON Schema, referring to one another. */
export function componentSchemas(): Record<SchemaName, JsonSchema> {
	const registry = z.registry<{ id: string }>();
	for (const [id, schema] of Object.entries(NAMED)) registry.add(schema, { id });
	const { schemas } = z.toJSONSchema(registry, { uri: (id) => refTo(id as SchemaName) });
	return Object.fromEntries(
		Object.keys(NAMED).map((name) => [name, tidy(schemas[name], name !== 'ReadingBody')])
	) as Record<SchemaName, JsonSchema>;
}

/** The schema of one parameter. */
export const parameterSchema = (schema: z.ZodType): JsonSchema => {
	const { description: _said, ...rest } = tidy(z.toJSONSchema(schema), false) as JsonSchema;
	return rest;
};
