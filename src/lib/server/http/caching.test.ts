import { describe, expect, it } from 'vitest';
import { etagOf, holds } from './caching';

const digest = 'a'.repeat(64);

describe('a validator', () => {
	it('changes with edition, reader and question', () => {
		const tags = [
			etagOf(digest, 'b'.repeat(12), '?text=1'),
			etagOf('c'.repeat(64), 'b'.repeat(12), '?text=1'),
			etagOf(digest, 'd'.repeat(12), '?text=1'),
			etagOf(digest, 'b'.repeat(12), '?text=2')
		];
		expect(new Set(tags).size).toBe(4);
		expect(tags[0]).toMatch(/^W\/"a{12}-b{12}-[0-9a-z]+"$/);
	});

	it('is held when the asker names it, weak or strong, alone or in a list', () => {
		const tag = etagOf(digest, '', '');
		for (const held of [tag, tag.slice(2), `"x", ${tag}`, '*']) expect(holds(held, tag)).toBe(true);
		for (const other of [null, '', '"x"', 'W/"x"']) expect(holds(other, tag)).toBe(false);
	});
});
