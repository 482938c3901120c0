import { describe, expect, it } from 'vitest';
import { call, PRESENT } from './api-calls';
import { apiClient, ApiProblem, ApiUnreachable, everyItem } from '../../src/lib/api';

/** The route functions in place of the network. */
const client = apiClient(async (input, init) =>
	call(String(input), {
		method: init?.method,
		headers: init?.headers as Record<string, string>,
		body: init?.body ?? undefined
	})
);

describe('the typed client', () => {
	it('asks every address and takes its answer', async () => {
		const query = { text: '242377P100123', kind: 'serial', maker: 'Pontiac', year: 1967 } as const;
		const read = await client.read(query);
		expect(read.readings[0]?.division).toBe('Pontiac');
		expect(await client.readPosted(query)).toEqual(read);
		expect((await client.makers()).items.length).toBeGreaterThan(0);
		expect((await client.layouts({ limit: 1 })).items).toHaveLength(1);
		expect((await client.tables({ maker: 'gm' })).edition).toBe(2);
		expect((await client.table('gm', 'engine', { code: 'T', year: 1967 })).total).toBe(1);
		expect((await client.row('gm.engine.t.1', { edition: 1 })).edition).toBe(1);
		expect((await client.rowHistory('gm.engine.t.1')).items).toHaveLength(2);
		expect((await client.sources({ kind: 'book' })).items).toHaveLength(1);
		expect((await client.source('marsh-book')).key).toBe('marsh-book');
		expect((await client.items()).items).toHaveLength(1);
		expect((await client.editions()).items).toHaveLength(2);
		expect((await client.edition(2)).digest).toBe(PRESENT.head.digest);
	});

	it('goes through a list to its end', async () => {
		const all = await everyItem((cursor) => client.table('gm', 'engine', { limit: 2, cursor }));
		expect(all).toHaveLength(PRESENT.tables.tables.get('gm/engine')!.rows.length);
	});

	it('throws what the interface refuses, as it says it', async () => {
		const refused = await client.read({ text: '?' }).catch((error: unknown) => error);
		expect(refused).toBeInstanceOf(ApiProblem);
		expect((refused as ApiProblem).status).toBe(422);
		expect((refused as ApiProblem).problem.errors[0]?.code).toBe('nothing_struck');
	});

	it('tells when nothing of ours answers', async () => {
		const gone = apiClient(() => Promise.reject(new TypeError('fetch failed')));
		await expect(gone.makers()).rejects.toBeInstanceOf(ApiUnreachable);
		const other = apiClient(() => Promise.resolve(new Response('<p>', { status: 502 })));
		await expect(other.makers()).rejects.toBeInstanceOf(ApiUnreachable);
	});

	it('lets an abort through', async () => {
		const aborted = apiClient(() => Promise.reject(new DOMException('', 'AbortError')));
		await expect(aborted.makers()).rejects.toBeInstanceOf(DOMException);
	});
});
