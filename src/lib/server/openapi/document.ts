import { interfaceText } from '../../text/en/interface';
import {
	componentSchemas,
	parameterSchema,
	refTo,
	type JsonSchema,
	type SchemaName
} from './components';
import { EXAMPLES } from './examples';
import { OPERATIONS, type Operation } from './operations';

const PROBLEM = { 'application/problem+json': { schema: { $ref: refTo('Problem') } } };
const REFUSALS: Readonly<Record<number, string>> = {
	304: 'What the asker holds still stands',
	400: 'The query or the body is malformed, or a parameter is unknown',
	404: 'There is no such edition, table, row or source',
	405: 'Another method is asked for; Allow lists those that are taken',
	406: 'No type that the asker takes can be answered',
	413: 'The body is too large',
	415: 'The body is not JSON',
	422: 'A parameter asks for what cannot be: `errors` names it and what is accepted',
	429: 'Too many requests from one address; Retry-After says when to ask again',
	503: 'The tables are not in memory yet; Retry-After says when to ask again'
};
const ALWAYS = [400, 405, 406, 429, 503] as const;

function refusal(status: number): JsonSchema {
	const waits = status === 429 || status === 503;
	return {
		description: REFUSALS[status],
		...(waits && {
			headers: { 'Retry-After': { description: 'Seconds', schema: { type: 'integer' } } }
		}),
		...(status === 405 && { headers: { Allow: { schema: { type: 'string' } } } }),
		content: PROBLEM
	};
}

function success({ answers, csv, method }: Operation): JsonSchema {
	const json = answers === undefined ? { schema: { type: 'object' } } : contentOf(answers);
	return {
		description: 'The answer',
		...(method === 'get' && {
			headers: {
				ETag: { description: 'Edition, reader and question', schema: { type: 'string' } }
			}
		}),
		content: {
			'application/json': json,
			...(csv && { 'text/csv': { schema: { type: 'string' } } })
		}
	};
}

const exampleOf = (name: SchemaName) => (EXAMPLES[name] ? { example: EXAMPLES[name] } : {});

/** A schema with its example, or the several that it may be. */
function contentOf(names: SchemaName | readonly SchemaName[]): JsonSchema {
	if (typeof names === 'string') return { schema: { $ref: refTo(names) }, ...exampleOf(names) };
	const shown = names.filter((name) => EXAMPLES[name]);
	return {
		schema: { oneOf: names.map((name) => ({ $ref: refTo(name) })) },
		examples: Object.fromEntries(shown.map((name) => [name, { value: EXAMPLES[name] }]))
	};
}

function parametersOf({ places, query }: Operation): JsonSchema[] {
	const inPath = Object.entries(places ?? {}).map(([name, { description, example, values }]) => ({
		name,
		in: 'path',
		required: true,
		description,
		schema: { type: 'string', ...(values && { enum: values }) },
		example
	}));
	const inQuery = Object.entries(query?.shape ?? {}).map(([name, schema]) => ({
		name,
		in: 'query',
		required: !schema.isOptional(),
		...(schema.description && { description: schema.description }),
		schema: parameterSchema(schema)
	}));
	return [...inPath, ...inQuery];
}

function describe(operation: Operation): JsonSchema {
	const { id, summary, description, body, method, refuses } = operation;
	const parameters = parametersOf(operation);
	const statuses = [...ALWAYS, ...refuses].sort((a, b) => a - b);
	return {
		operationId: id,
		summary,
		...(description && { description }),
		...(parameters.length > 0 && { parameters }),
		...(body && {
			requestBody: {
				required: true,
				content: { 'application/json': contentOf(body) }
			}
		}),
		responses: {
			200: success(operation),
			...(method === 'get' && { 304: { description: REFUSALS[304] } }),
			...Object.fromEntries(statuses.map((status) => [status, refusal(status)]))
		}
	};
}

/** The OpenAPI 3.1 document of the interface. */
export function openApiDocument(): JsonSchema {
	const paths: Record<string, JsonSchema> = {};
	for (const operation of OPERATIONS)
		paths[operation.path] = {
			...paths[operation.path],
			[operation.method]: describe(operation)
		};
	return {
		openapi: '3.1.0',
		info: {
			title: 'Tallyplate',
			version: '1',
			summary: interfaceText.document.summary,
			description: interfaceText.document.description,
			license: { name: 'AGPL-3.0-or-later', identifier: 'AGPL-3.0-or-later' }
		},
		servers: [{ url: '/api/v1' }],
		paths,
		components: { schemas: componentSchemas() }
	};
}

let written: string | undefined;
/** The document as JSON, written once. */
export const openApiJson = (): string => (written ??= JSON.stringify(openApiDocument()));
