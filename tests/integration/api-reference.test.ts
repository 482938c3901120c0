import { parse } from 'csv-parse/sync';
import { describe, expect, it } from 'vitest';
import type { z } from 'zod';
import { ADDED, call, PRESENT } from './api-calls';
import { LAYOUTS, LINED_LAYOUTS } from '../../src/lib/decoder';
import * as api from '../../src/lib/types/api';

async function get<T extends z.ZodType>(path: string, schema: T): Promise<z.infer<T>> {
	const response = await call(`/api/v1${path}`);
	expect(response.status).toBe(200);
	expect(response.headers.get('content-type')).toBe('application/json');
	return schema.parse(await response.json());
}
async function refused(path: string, headers?: Record<string, string>): Promise<string[]> {
	const response = await call(`/api/v1${path}`, { headers });
	expect(response.headers.get('content-type')).toBe('application/problem+json');
	const { status, errors } = api.problemDetailsSchema.parse(await response.json());
	return errors.map(({ field, code }) => `${status} ${field} ${code}`);
}
const rowsOf = (maker: string, table: string) =>
	PRESENT.tables.tables.get(`${maker}/${table}`)?.rows ?? [];

describe('makers and layouts', () => {
	it('lists every maker with the names that are taken', async () => {
		const { items } = await get('/makers', api.makersAnswerSchema);
		const gm = items.find(({ key }) => key === 'gm');
		expect(gm?.name).toBe('General Motors');
		expect(gm?.divisions.find(({ name }) => name === 'Chevrolet')?.aliases).toContain('Chevy');
	});

	it('lists every layout with its fields and tables, page by page', async () => {
		const all = await get('/layouts', api.layoutsAnswerSchema);
		const first = await get('/layouts?limit=1', api.layoutsAnswerSchema);
		const second = await get(`/layouts?limit=1&cursor=${first.next}`, api.layoutsAnswerSchema);
		expect([...first.items, ...second.items]).toEqual(all.items.slice(0, 2));
	});

	it('tells of a stamp of lines which they are, from which end they are read, and what stands in them', async () => {
		const { items } = await get('/layouts', api.layoutsAnswerSchema);
		expect(items.map(({ id }) => id)).toEqual([...LAYOUTS, ...LINED_LAYOUTS].map(({ id }) => id));
		const tag = items.find(({ id }) => id === 'chrysler-fender-tag-1969-1974');
		expect(tag).toMatchObject({ kind: 'body_tag', length: null, order: 'up' });
		expect(tag?.derived.map((own) => own.derived_from)).toContainEqual(['trim']);
		expect(tag?.lines.map(({ repeats }) => repeats)).toEqual([false, false, true]);
		expect(tag?.fields[0]).toEqual({
			name: 'engine',
			label: 'Engine',
			line: 1,
			from: null,
			to: null,
			table: 'option'
		});
		const pad = items.find(({ kind }) => kind === 'engine');
		expect(pad?.fields.map(({ line }) => line)).toContain(1);
	});
});

describe('tables', () => {
	it('lists the tables that have rows, all or of one maker', async () => {
		const all = await get('/tables', api.tablesAnswerSchema);
		expect(all.items).toHaveLength(PRESENT.tables.tables.size);
		const ford = await get('/tables?maker=FoMoCo', api.tablesAnswerSchema);
		expect(new Set(ford.items.map(({ maker }) => maker))).toEqual(new Set(['Ford Motor Company']));
		expect(await refused('/tables?maker=Tucker')).toEqual(['422 maker unknown_maker']);
	});

	it('gives rows with scope, strength and sources', async () => {
		const answer = await get('/tables/gm/engine', api.tableAnswerSchema);
		expect(answer).toMatchObject({ edition: 2, maker: 'General Motors', table: 'engine' });
		expect(answer.total).toBe(rowsOf('gm', 'engine').length);
		const contested = answer.items.find(({ row_key }) => row_key === 'gm.engine.w.1');
		expect(contested).toMatchObject({ strength: 'contested', contested_by: ['gm.engine.w.2'] });
		expect(contested?.sources[0]?.title).toBe('Cars of the Marsh');
	});

	it('leads through a table page by page, in the edition where the list began', async () => {
		const keys: string[] = [];
		let query = 'edition=1&limit=2';
		for (;;) {
			const page = await get(`/tables/gm/engine?${query}`, api.tableAnswerSchema);
			expect(page.edition).toBe(1);
			keys.push(...page.items.map(({ row_key }) => row_key));
			if (page.next === null) break;
			query = `limit=2&cursor=${page.next}`;
		}
		expect(keys).toEqual(
			rowsOf('gm', 'engine')
				.map(({ row_key }) => row_key)
				.filter((key) => key !== ADDED)
		);
	});

	it('filters by division, year and code, and searches', async () => {
		const found = async (query: string) =>
			(await get(`/tables/GM/engine?${query}`, api.tableAnswerSchema)).items.map(
				({ row_key }) => row_key
			);
		expect(await found('code=t&year=1967&division=pontiac')).toEqual(['gm.engine.t.1']);
		expect(await found('code=t&division=Chevy')).toEqual([]);
		expect((await found('q=342'))[0]).toBe('gm.engine.w.2');
	});

	it('gives no rows for a table that has none yet', async () => {
		expect(await get('/tables/amc/engine', api.tableAnswerSchema)).toMatchObject({ total: 0 });
	});

	it('gives all rows as CSV, by Accept or by name', async () => {
		const asked = await call('/api/v1/tables/gm/engine', { headers: { accept: 'text/csv' } });
		const named = await call('/api/v1/tables/gm/engine?format=csv');
		const text = await asked.text();
		expect(await named.text()).toBe(text);
		expect(asked.headers.get('content-type')).toContain('text/csv');
		expect(asked.headers.get('vary')).toBe('accept');
		expect(asked.headers.get('content-disposition')).toContain('gm-engine-edition-2.csv');
		const records = parse(text, { columns: true }) as Record<string, string>[];
		expect(records).toHaveLength(rowsOf('gm', 'engine').length);
		expect(records.find(({ row_key }) => row_key === 'gm.engine.t.1')).toMatchObject({
			division: 'Pontiac',
			years_from: '1966',
			strength: 'firm',
			sources: 'Works manual, p. 12'
		});
	});

	it('gives CSV a page at a time when asked, with the way to the next', async () => {
		const first = await call('/api/v1/tables/gm/engine?format=csv&limit=4');
		const next = /^<(.*)>; rel="next"$/.exec(first.headers.get('link') ?? '')?.[1];
		const second = await call(next ?? '');
		const rows = (text: string) => parse(text, { from_line: 2 }).length;
		expect(rows(await first.text())).toBe(4);
		expect(rows(await second.text())).toBe(rowsOf('gm', 'engine').length - 4);
	});

	it.each([
		['/tables/tucker/engine', '404 maker unknown_maker'],
		['/tables/pontiac/engine', '404 maker unknown_maker'],
		['/tables/gm/hood', '404 table unknown_table'],
		['/tables/gm/engine?edition=9', '404 edition unknown_edition'],
		['/tables/gm/engine?edition=x', '400 edition edition_invalid'],
		['/tables/gm/engine?limit=0', '400 limit limit_invalid'],
		['/tables/gm/engine?limit=201', '400 limit limit_invalid'],
		['/tables/gm/engine?cursor=abc', '400 cursor cursor_invalid'],
		['/tables/gm/engine?format=xml', '400 format unknown_format'],
		['/tables/gm/engine?year=1899', '422 year year_out_of_range'],
		['/tables/gm/engine?year=soon', '422 year year_out_of_range'],
		['/tables/gm/engine?division=Edsel', '422 division unknown_division'],
		[`/tables/gm/engine?q=${'v'.repeat(101)}`, '422 q too_long'],
		['/tables/gm/engine?colour=red', '400 colour unknown_parameter']
	])('refuses %s', async (path, expected) => {
		expect(await refused(path)).toEqual([expected]);
	});

	it('refuses a cursor of other filters', async () => {
		const { next } = await get('/tables/gm/engine?limit=1', api.tableAnswerSchema);
		const other = `/tables/gm/engine?limit=1&year=1967&cursor=${next}`;
		expect(await refused(other)).toEqual(['400 cursor cursor_invalid']);
		const edition = `/tables/gm/engine?edition=1&cursor=${next}`;
		expect(await refused(edition)).toEqual(['400 cursor cursor_invalid']);
	});

	it('refuses a type that we do not write', async () => {
		expect(await refused('/tables/gm/engine', { accept: 'image/png' })).toEqual([
			'406 Accept not_acceptable'
		]);
	});

	it('spares the body when the asker holds it, but not across types', async () => {
		const path = '/api/v1/tables/gm/engine';
		const etag = (await call(path)).headers.get('etag')!;
		expect((await call(path, { headers: { 'if-none-match': etag } })).status).toBe(304);
		const csv = { 'if-none-match': etag, accept: 'text/csv' };
		expect((await call(path, { headers: csv })).status).toBe(200);
	});
});

describe('rows', () => {
	it('gives a row with what it rests on', async () => {
		const row = await get('/rows/gm.engine.x.1', api.rowDetailSchema);
		expect(row.citations.map(({ stance, title }) => `${stance}: ${title}`).sort()).toEqual([
			'against: A Heron seen in 1999',
			'for: Cars of the Marsh'
		]);
	});

	it('knows in which edition a row stands', async () => {
		await get(`/rows/${ADDED}?edition=2`, api.rowDetailSchema);
		expect(await refused(`/rows/${ADDED}?edition=1`)).toEqual(['404 row_key unknown_row']);
		expect(await refused('/rows/nonsense')).toEqual(['404 row_key unknown_row']);
	});

	it('gives every version of a row, the latest first', async () => {
		const path = '/rows/gm.engine.t.1/history';
		const { items } = await get(path, api.rowHistoryAnswerSchema);
		expect(items.map(({ version, edition_to }) => [version, edition_to])).toEqual([
			[2, null],
			[1, 2]
		]);
		const first = await get(`${path}?limit=1`, api.rowHistoryAnswerSchema);
		const second = await get(`${path}?limit=1&cursor=${first.next}`, api.rowHistoryAnswerSchema);
		expect(second.items[0]?.version).toBe(1);
		expect(await refused('/rows/gm.engine.none.1/history')).toEqual(['404 row_key unknown_row']);
	});
});

describe('sources and items', () => {
	it('lists sources with the number of rows that cite them, all or of a kind', async () => {
		const all = await get('/sources?limit=200', api.sourcesAnswerSchema);
		expect(all.items).toHaveLength(PRESENT.tables.sources.size);
		const books = await get('/sources?kind=Book', api.sourcesAnswerSchema);
		expect(books.items.map(({ key }) => key)).toEqual(['marsh-book']);
		expect(books.items[0]?.cited_by).toBeGreaterThan(3);
		expect(await refused('/sources?kind=rumor')).toEqual(['422 kind unknown_kind']);
	});

	it('gives a source with the rows that cite it and the works that copy it', async () => {
		const source = await get('/sources/web-one', api.sourceDetailSchema);
		expect(source.rows).toContain('gm.body_style.45.1');
		expect(source.repeated_by).toEqual(['web-copy']);
		expect(await refused('/sources/hearsay')).toEqual(['404 key unknown_source']);
	});

	it('lists items, typed', async () => {
		const { items } = await get('/items', api.itemsAnswerSchema);
		expect(items).toMatchObject([
			{ item: 'GRILLE-BADGE', added_later: 'bolted', look_for: 'Two studs' }
		]);
		expect((await get('/items?maker=amc', api.itemsAnswerSchema)).items).toEqual([]);
	});
});

describe('editions', () => {
	it('lists them, the latest first, page by page', async () => {
		const { items } = await get('/editions', api.editionsAnswerSchema);
		expect(items.map(({ number }) => number)).toEqual([2, 1]);
		const first = await get('/editions?limit=1', api.editionsAnswerSchema);
		const second = await get(`/editions?limit=1&cursor=${first.next}`, api.editionsAnswerSchema);
		expect(second.items.map(({ number }) => number)).toEqual([1]);
		expect(second.next).toBeNull();
	});

	it('gives one and what it changed', async () => {
		const second = await get('/editions/2', api.editionDetailSchema);
		expect(second.changes?.rows).toEqual({ added: 1, changed: 0, retired: 0 });
		expect(second.row_keys).toEqual([{ row_key: ADDED, change: 'added' }]);
		expect((await get('/editions/1', api.editionDetailSchema)).changes).toBeNull();
	});

	it.each(['/editions/3', '/editions/latest', '/editions/-1'])('refuses %s', async (path) => {
		expect(await refused(path)).toEqual(['404 edition unknown_edition']);
	});
});

describe('unknown addresses', () => {
	it.each(['/api', '/api/v2', '/api/v1', '/api/v1/reading', '/api/v1/tables/gm'])(
		'%s is 404 by any method',
		async (path) => {
			for (const method of ['GET', 'POST', 'DELETE', 'OPTIONS']) {
				const response = await call(path, { method });
				expect(response.status).toBe(404);
				expect(response.headers.get('content-type')).toBe('application/problem+json');
			}
		}
	);
});
