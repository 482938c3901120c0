import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { pageOf, readCursor, readLimit, writeCursor } from './cursor';
import { Refusal } from './refusal';

const all = Array.from({ length: 7 }, (_, n) => n);

describe('a cursor', () => {
	it('leads through a list page by page, each item once', () => {
		const seen: number[] = [];
		let cursor: string | undefined;
		do {
			const page = pageOf(all, { limit: '3', cursor }, 4, 'all');
			seen.push(...page.items);
			cursor = page.next ?? undefined;
		} while (cursor !== undefined);
		expect(seen).toEqual(all);
	});

	it('has no next page when the last is just full', () => {
		expect(pageOf(all, { limit: '7' }, 4, 'all').next).toBeNull();
	});

	it('fits the list that it was written for and no other', () => {
		const cursor = writeCursor({ edition: 4, after: 3, filters: 'gm' });
		expect(readCursor(cursor, 'gm')).toEqual({ edition: 4, after: 3, filters: 'gm' });
		expect(() => readCursor(cursor, 'ford')).toThrow(Refusal);
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
