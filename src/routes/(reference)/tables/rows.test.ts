import { compile, type CompiledRow } from '$lib/decoder';
import { describe, expect, it } from 'vitest';
import { INVENTED } from '../../../../tests/fixtures/invented';
import { csvAddress, rowsFor } from './search';
import { readSort, sortChoices, sortColumns, sortName, sortRows } from './sorting';
import { tableEntries } from './table-entries';

const tables = compile(INVENTED);
const keys = (rows: readonly CompiledRow[]) => rows.map(({ row_key }) => row_key);
const lines = rowsFor(tables, '', { maker: 'gm', table: 'line' });

describe('rows that a page shows', () => {
	it('are those with exactly the code, when one or two characters are asked for', () => {
		const found = rowsFor(tables, 'h', { maker: 'gm', table: 'line' });
		expect(found.length).toBeGreaterThan(1);
		expect(new Set(found.map(({ code }) => code))).toEqual(new Set(['H']));
	});

	it('are those with the word, where no code is so short', () => {
		expect(rowsFor(tables, 'Du', { maker: 'gm', table: 'line' })[0]?.meaning).toBe('Dunlin');
	});

	it('are the same as CSV, but for the strength', () => {
		const place = { maker: 'gm', table: 'line' } as const;
		expect(csvAddress({ ...place, division: 'Pontiac', year: 1969, strength: 'firm' }, '')).toBe(
			'/api/v1/tables/gm/line?format=csv&division=Pontiac&year=1969'
		);
		expect(csvAddress(place, 'h')).toBe('/api/v1/tables/gm/line?format=csv&code=h');
		expect(csvAddress(place, 'dunlin')).toBe('/api/v1/tables/gm/line?format=csv&q=dunlin');
		expect(csvAddress({ maker: 'gm' }, 'dunlin')).toBeNull();
	});
});

describe('the order of rows', () => {
	it('is read from an address, and written back', () => {
		expect(readSort('-years')).toEqual({ column: 'years', descending: true });
		for (const name of ['code', '-meaning', 'years', '-strength']) {
			const sort = readSort(name);
			expect(sort && sortName(sort)).toBe(name);
		}
		for (const name of [null, '', 'scope', '--code']) expect(readSort(name)).toBeNull();
	});

	it('goes by any column, both ways, and by code where it leaves two equal', () => {
		const meanings = sortRows(lines, { column: 'meaning', descending: false });
		expect(meanings.map(({ meaning }) => meaning)).toEqual(
			lines.map(({ meaning }) => meaning).sort((a, b) => a.localeCompare(b))
		);
		const years = sortRows(lines, { column: 'years', descending: true });
		expect(years[0]?.years_from).toBe(Math.max(...lines.map(({ years_from }) => years_from ?? 0)));
		const strengths = sortRows(lines, { column: 'strength', descending: false });
		expect(strengths[0]?.strength).toBe('firm');
		expect(keys(sortRows(lines, { column: 'code', descending: false }))).toEqual(keys(lines));
	});

	it('stands in the heads in words, each leading to the other way round', () => {
		const url = new URL('http://127.0.0.1/tables/gm/line?q=h&page=2');
		const heads = sortColumns(url, { column: 'code', descending: false });
		expect(heads.code).toEqual({
			sorted: 'ascending',
			words: 'A to Z',
			href: '/tables/gm/line?q=h&sort=-code#rows'
		});
		expect(heads.years).toEqual({
			sorted: null,
			words: '',
			href: '/tables/gm/line?q=h&sort=years#rows'
		});
	});

	it('is offered to the phone too, by code where rows have codes', () => {
		expect(sortChoices(true, false)[0]).toEqual({ value: 'code', label: 'Code, A to Z' });
		expect(sortChoices(false, true).map(({ value }) => value)).toEqual([
			'',
			'meaning',
			'-meaning',
			'years',
			'-years',
			'strength',
			'-strength'
		]);
	});
});

describe('tables in a list', () => {
	it('are those with rows for the make and year, with links that carry both on', () => {
		const entries = tableEntries(tables, { maker: 'gm', division: 'Pontiac', year: 1971 });
		const line = entries.find(({ label }) => label === 'Car lines');
		expect(line).toMatchObject({
			maker: 'General Motors',
			address: '/tables/gm/line?division=Pontiac&year=1971',
			rows: 2,
			supported: 2
		});
		expect(entries.every(({ rows }) => rows > 0)).toBe(true);
	});
});
