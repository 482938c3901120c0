import { describe, expect, it } from 'vitest';
import { call, ROUTES } from './api-calls';
import { EXAMPLES } from '../../src/lib/server/openapi/examples';
import { NAMED, type SchemaName } from '../../src/lib/server/openapi/components';
import { openApiDocument, OPERATIONS } from '../../src/lib/server/openapi';
import { READING_PARAMETERS } from '../../src/lib/server/readings';
import { readingBodySchema, readingQuerySchema } from '../../src/lib/types';

interface Described {
	operationId: string;
	parameters?: { name: string; in: string; required: boolean; schema: object }[];
	responses: Record<string, unknown>;
}
const document = openApiDocument() as {
	openapi: string;
	servers: { url: string }[];
	paths: Record<string, Record<string, Described>>;
	components: { schemas: Record<string, object> };
};
const described = Object.entries(document.paths).flatMap(([path, methods]) =>
	Object.entries(methods).map(([method, operation]) => ({ path, method, operation }))
);

function* refsIn(value: unknown): Generator<string> {
	if (typeof value !== 'object' || value === null) return;
	for (const [key, part] of Object.entries(value)) {
		if (key === '$ref') yield String(part);
		else yield* refsIn(part);
	}
}

describe('the OpenAPI document', () => {
	it('is served as it is made', async () => {
		const response = await call('/api/v1/openapi.json');
		expect(response.headers.get('content-type')).toBe('application/json');
		expect(await response.json()).toEqual(JSON.parse(JSON.stringify(document)));
		expect(document.openapi).toBe('3.1.0');
		const etag = response.headers.get('etag')!;
		const again = await call('/api/v1/openapi.json', { headers: { 'if-none-match': etag } });
		expect(again.status).toBe(304);
	});

	it('describes every address that is served, and serves every one that it describes', () => {
		const served = ROUTES.filter((route) => route.startsWith('/api/v1/'))
			.map((route) => route.slice('/api/v1'.length).replace(/\[(\w+)\]/g, '{$1}'))
			.sort();
		expect(Object.keys(document.paths).sort()).toEqual(served);
		expect(document.servers).toEqual([{ url: '/api/v1' }]);
	});

	it('names the methods that each address takes', async () => {
		for (const [path, methods] of Object.entries(document.paths)) {
			const address = `/api/v1${path.replace(/\{\w+\}/g, 'x')}`;
			const allow = (await call(address, { method: 'OPTIONS' })).headers.get('allow');
			const taken = allow?.split(', ').filter((one) => one !== 'HEAD' && one !== 'OPTIONS');
			expect(taken).toEqual(Object.keys(methods).map((method) => method.toUpperCase()));
		}
	});

	it('refers to nothing that is missing, and has no schema that nobody uses', () => {
		const refs = new Set(refsIn(document));
		const names = Object.keys(document.components.schemas);
		expect([...refs].sort()).toEqual(names.map((name) => `#/components/schemas/${name}`).sort());
	});

	it('gives every operation its own id, a place for each part of its path, and its refusals', () => {
		const ids = described.map(({ operation }) => operation.operationId);
		expect(new Set(ids).size).toBe(ids.length);
		for (const { path, operation } of described) {
			const places = [...path.matchAll(/\{(\w+)\}/g)].map(([, name]) => name);
			const inPath = (operation.parameters ?? []).filter((one) => one.in === 'path');
			expect(inPath.map(({ name }) => name)).toEqual(places);
			expect(inPath.every(({ required }) => required)).toBe(true);
			for (const status of ['200', '400', '405', '406', '429', '503'])
				expect(operation.responses).toHaveProperty(status);
		}
	});

	it('takes the parameters that it names, and no others', async () => {
		for (const { path, query, method } of OPERATIONS) {
			if (method === 'post') continue;
			const address = `/api/v1${path.replace(/\{\w+\}/g, 'x')}`;
			const response = await call(`${address}?no_such_parameter=1`);
			// What is nowhere takes no parameters; the rest says which it takes.
			if (response.status !== 400) continue;
			const { errors } = (await response.json()) as { errors: { accepted: string[] }[] };
			expect(errors[0]?.accepted.toSorted()).toEqual(Object.keys(query?.shape ?? {}).sort());
		}
		expect(Object.keys(readingQuerySchema.shape).sort()).toEqual([...READING_PARAMETERS].sort());
		expect(Object.keys(readingBodySchema.shape).sort()).toEqual(
			[...READING_PARAMETERS, 'context', 'fields'].sort()
		);
	});

	it.each(Object.entries(EXAMPLES))(
		'shows an example of %s that its schema takes',
		(name, shown) => {
			expect(NAMED[name as SchemaName].parse(shown)).toEqual(shown);
		}
	);

	it('has examples of places that are found', async () => {
		const places = OPERATIONS.flatMap(({ places }) => Object.values(places ?? {}));
		expect(places.every(({ values, example }) => !values || values.includes(example))).toBe(true);
	});
});
