import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { filtersOf, pageOf, readCursor, readLimit, startOf, writeCursor } from './cursor';
import { Refusal } from './refusal';

const all = Array.from({ length: 7 }, (_, n) => n);

describe('a cursor', () => {
	it('leads through a list page by page, each item once, in the edition where it began', () => {
		const seen: number[] = [];
		let place = { after: 0, edition: 4, filters: 'all' };
		for (;;) {
			const { items, next } = pageOf(all, 3, place);
			seen.push(...items);
			if (next === null) break;
			const start = startOf(next, 'all', undefined);
			expect(start.edition).toBe(4);
			place = { ...place, after: start.after };
		}
		expect(seen).toEqual(all);
	});

	it('has no next page when the last is just full', () => {
		expect(pageOf(all, 7, { after: 0, edition: 4, filters: 'all' }).next).toBeNull();
	});

	it('fits the list, filters and edition that it was written for and no other', () => {
		const filters = filtersOf('/tables/gm/engine', { year: '1967', limit: '2', edition: '4' });
		expect(filters).toBe(filtersOf('/tables/gm/engine', { year: '1967', cursor: 'x' }));
		const cursor = writeCursor({ edition: 4, after: 3, filters });
		expect(readCursor(cursor, filters)).toEqual({ edition: 4, after: 3, filters });
		expect(startOf(cursor, filters, 4).after).toBe(3);
		expect(() => startOf(cursor, filters, 5)).toThrow(Refusal);
		for (const other of [filtersOf('/tables/gm/engine', {}), filtersOf('/', { year: '1967' })])
			expect(() => readCursor(cursor, other)).toThrow(Refusal);
	});

	it('is refused when it is none of ours, whatever it is', () => {
		const forged = ['[1,2]', '[1,-2,""]', '{"a":1}', '[1,2,3]', '[0.5,1,""]'].map((text) =>
			Buffer.from(text).toString('base64url')
		);
		for (const cursor of forged) expect(() => readCursor(cursor, '')).toThrow(Refusal);
		fc.assert(
			fc.property(fc.string({ unit: 'binary' }), (text) => {
				expect(() => readCursor(text, '')).toThrow(Refusal);
			})
		);
	});
});

describe('a limit', () => {
	it('is a whole number from 1 to 200', () => {
		expect(readLimit(undefined)).toBe(50);
		expect(readLimit(' 200 ')).toBe(200);
		for (const limit of ['0', '201', '-1', '1.5', 'all', '99999'])
			expect(() => readLimit(limit)).toThrow(Refusal);
	});
});
