import { describe, expect, it } from 'vitest';
import { INVENTED } from '../../../../tests/fixtures/invented';
import { compile } from '../../decoder';
import { searchRows } from './search';

const tables = compile(INVENTED);
const keys = (query: string, filters = {}) =>
	searchRows(tables, query, filters).items.map(({ row_key }) => row_key);

describe('a search', () => {
	it('without a query answers all that fit, in the order of the tables', () => {
		const found = searchRows(tables, '  ');
		expect(found.total).toBe(INVENTED.rows.length);
		expect(found.items[0]?.row_key).toBe('gm.layout.gm-invented-9.1');
		expect(found.items.at(-1)?.maker).toBe('other');
	});

	it('finds words wherever they stand, and all of them', () => {
		expect(keys('convertible')[0]).toBe('gm.body_style.67.1');
		expect(keys('300 carburetor')[0]).toBe('gm.engine.t.1');
		expect(keys('convertible plovertown')).toEqual([]);
	});

	it('forgives a slip of spelling', () => {
		expect(keys('carburettor')).toContain('gm.engine.t.1');
	});

	it('finds nothing but what was typed, in any case, where there is such a thing', () => {
		for (const query of ['plover', 'PLOVER', 'Plôver'])
			for (const row of searchRows(tables, query).items)
				expect(`${row.meaning} ${row.line.join(' ')} ${row.note}`).toMatch(/plover/i);
	});

	it('puts a code typed exactly first, in any case', () => {
		expect(keys('w', { maker: 'gm', table: 'engine' }).slice(0, 2)).toEqual([
			'gm.engine.w.1',
			'gm.engine.w.2'
		]);
	});

	it('is narrowed by maker, table, division, year and strength', () => {
		expect(keys('', { maker: 'chrysler' })).toEqual([
			'chrysler.price_class.h.1',
			'chrysler.engine.g.1'
		]);
		expect(keys('', { table: 'line', division: 'Pontiac', year: 1970 })).toEqual([
			'gm.line.h.2',
			'gm.line.k.1'
		]);
		expect(keys('', { strength: 'contested' })).toEqual(['gm.engine.w.1', 'gm.engine.w.2']);
	});

	it('is answered in pages', () => {
		const first = searchRows(tables, '', {}, { limit: 30 });
		expect([first.items.length, first.next, first.total]).toEqual([30, 30, 42]);
		const second = searchRows(tables, '', {}, { offset: 30, limit: 30 });
		expect([second.items.length, second.next]).toEqual([12, null]);
	});

	it('takes any text', () => {
		for (const query of ['!=^$', "'|", '\u0000', '💡', 'x'.repeat(5000), 'a '.repeat(200)])
			expect(() => searchRows(tables, query)).not.toThrow();
	});
});
