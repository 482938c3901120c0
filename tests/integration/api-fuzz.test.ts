import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { call, json } from './api-calls';
import { problemDetailsSchema, readAnswerSchema } from '../../src/lib/types';
import { READING_PARAMETERS } from '../../src/lib/server/readings';

const STATUSES = [200, 204, 304, 400, 404, 405, 406, 413, 415, 422];
const anything = fc.oneof(
	fc.string({ unit: 'binary', maxLength: 80 }),
	fc.string({ unit: 'grapheme', maxLength: 80 }),
	fc.stringMatching(/^[A-Z0-9?*[\] -]{1,20}$/)
);
const value = fc.oneof(
	{ weight: 2, arbitrary: anything },
	{
		weight: 3,
		arbitrary: fc.constantFrom(
			'serial',
			'code',
			'gm',
			'Chevy',
			'Pontiac',
			'1967',
			'1',
			'2',
			'engine',
			'json',
			'csv',
			'242377P100123'
		)
	}
);
/** A lone surrogate cannot stand in an address. */
const encoded = (text: string) => encodeURIComponent(text.toWellFormed());
const queryOf = (names: readonly string[]) =>
	fc
		.array(fc.tuple(fc.oneof(fc.constantFrom(...names), fc.string({ maxLength: 8 })), value), {
			maxLength: 5
		})
		.map((pairs) => pairs.map(([name, text]) => `${encoded(name)}=${encoded(text)}`).join('&'));

/** Every answer is one of those that the interface promises, in the shape that it promises. */
async function holds(response: Response): Promise<void> {
	expect(STATUSES).toContain(response.status);
	if (response.status < 400) return;
	expect(response.headers.get('content-type')).toBe('application/problem+json');
	const problem = problemDetailsSchema.parse(await response.json());
	expect(problem.errors.length).toBeGreaterThan(0);
}

describe('whatever is asked', () => {
	it('a reading is answered or refused, never broken', async () => {
		await fc.assert(
			fc.asyncProperty(queryOf(READING_PARAMETERS), async (query) => {
				const response = await call(`/api/v1/readings?${query}`);
				if (response.status === 200) readAnswerSchema.parse(await response.json());
				else await holds(response);
			}),
			{ numRuns: 500 }
		);
	});

	it('any text alone is read or refused by name', async () => {
		await fc.assert(
			fc.asyncProperty(anything, async (text) => {
				const response = await call(`/api/v1/readings?text=${encoded(text)}`);
				expect([200, 422]).toContain(response.status);
				if (response.status === 200) readAnswerSchema.parse(await response.json());
			}),
			{ numRuns: 500 }
		);
	});

	it('a raw query string is answered or refused', async () => {
		await fc.assert(
			fc.asyncProperty(fc.string({ unit: 'binary', maxLength: 60 }), async (query) => {
				await holds(await call(`/api/v1/readings?${query.replaceAll('#', '')}`));
			}),
			{ numRuns: 500 }
		);
	});

	it('a posted body is answered or refused', async () => {
		await fc.assert(
			fc.asyncProperty(fc.oneof(fc.jsonValue(), bodies), async (body) => {
				await holds(await call('/api/v1/readings', json(body)));
			}),
			{ numRuns: 300 }
		);
	});

	it('bytes for a body are answered or refused', async () => {
		await fc.assert(
			fc.asyncProperty(fc.uint8Array({ maxLength: 40 }), anything, async (body, type) => {
				const printable = type.replace(/[^\x20-\x7e]/g, '');
				const contentType = printable.length % 2 ? 'application/json' : printable;
				const headers = { 'content-type': contentType };
				await holds(
					await call('/api/v1/readings', { method: 'POST', headers, body: Buffer.from(body) })
				);
			}),
			{ numRuns: 300 }
		);
	});

	it.each([
		['/tables', ['edition', 'maker', 'limit', 'cursor']],
		[
			'/tables/gm/engine',
			['edition', 'division', 'year', 'code', 'q', 'format', 'limit', 'cursor']
		],
		['/makers', ['limit', 'cursor']],
		['/layouts', ['limit', 'cursor']],
		['/rows/gm.engine.t.1', ['edition']],
		['/rows/gm.engine.t.1/history', ['limit', 'cursor']],
		['/sources', ['edition', 'kind', 'limit', 'cursor']],
		['/sources/marsh-book', ['edition']],
		['/items', ['edition', 'maker', 'limit', 'cursor']],
		['/editions', ['limit', 'cursor']],
		['/editions/2', ['edition']]
	])('%s is answered or refused', async (path, names) => {
		await fc.assert(
			fc.asyncProperty(queryOf(names), anything, async (query, accept) => {
				const printable = accept.replace(/[^\x20-\x7e]/g, '');
				const headers = { accept: printable, 'if-none-match': printable };
				await holds(await call(`/api/v1${path}?${query}`, { headers }));
			}),
			{ numRuns: 100 }
		);
	});

	it('any address under the interface is answered or refused', async () => {
		const roots = ['tables/gm', 'tables', 'rows', 'sources', 'editions', 'readings'];
		await fc.assert(
			fc.asyncProperty(fc.constantFrom(...roots), anything, async (root, name) => {
				const part = encoded(name).replaceAll('.', '%2E') || 'x';
				await holds(await call(`/api/v1/${root}/${part}`));
			}),
			{ numRuns: 300 }
		);
	});
});

const bodies = fc.record(
	{
		text: fc.oneof(anything, fc.jsonValue()),
		kind: fc.oneof(value, fc.jsonValue()),
		year: fc.oneof(fc.integer(), fc.double(), value),
		maker: value,
		edition: fc.oneof(fc.integer(), value),
		explain: fc.oneof(fc.boolean(), value),
		context: fc.oneof(fc.jsonValue(), fc.record({ maker: value, year: value }))
	},
	{ requiredKeys: [] }
);
