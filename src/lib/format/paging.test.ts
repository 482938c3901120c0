import { describe, expect, it } from 'vitest';
import { pageOfList, withParameters } from './paging';

const url = (search: string) => new URL(`http://127.0.0.1/tables${search}`);
const numbers = Array.from({ length: 25 }, (_, n) => n + 1);

describe('a page of a list', () => {
	it('is the first unless another is asked for, and leads to its neighbors', () => {
		const { items, paging } = pageOfList(url('?q=red&table='), numbers, 10, 'rows');
		expect(items).toEqual(numbers.slice(0, 10));
		expect(paging).toEqual({ page: 1, of: 3, previous: null, next: '/tables?q=red&page=2#rows' });
	});

	it('keeps the first page’s address free of its number', () => {
		const { items, paging } = pageOfList(url('?page=2'), numbers, 10);
		expect(items).toEqual(numbers.slice(10, 20));
		expect(paging).toMatchObject({ previous: '/tables', next: '/tables?page=3' });
	});

	it.each(['0', '-1', '99', '1.5', 'x', ''])('makes a page of page=%s too', (page) => {
		const { items, paging } = pageOfList(url(`?page=${page}`), numbers, 10);
		expect(items.length).toBeGreaterThan(0);
		expect(paging.of).toBe(3);
	});

	it('is one empty page of nothing', () => {
		expect(pageOfList(url(''), [], 10)).toEqual({
			items: [],
			paging: { page: 1, of: 1, previous: null, next: null }
		});
	});
});

describe('an address with other parameters', () => {
	it('keeps the rest, in its order, and leaves out what is empty', () => {
		expect(withParameters(url('?q=a%26b&year=&sort=code'), { sort: '-code', page: null })).toBe(
			'/tables?q=a%26b&sort=-code'
		);
		expect(withParameters(url('?q=a'), { q: null })).toBe('/tables');
	});
});
