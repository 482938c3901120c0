import { describe, expect, it } from 'vitest';
import { markOf, strengthLine, type LineMark } from './strength-line';

const MARKS: LineMark[] = ['firm', 'fair', 'thin', 'contested', 'not_rated', 'no_row'];

describe('strengthLine', () => {
	it('draws each mark in its own way, so that none is told by color', () => {
		const drawn = MARKS.map((mark) => JSON.stringify(strengthLine(mark)));
		expect(new Set(drawn).size).toBe(MARKS.length);
	});
	it('draws no line where there is no row', () => {
		const across = strengthLine('no_row').strokes.filter(({ from, to }) => from[0] !== to[0]);
		expect(across).toEqual([]);
	});
});

describe('markOf', () => {
	it('is the strength of what was found', () => {
		expect(markOf({ outcome: 'found', strength: 'thin' })).toBe('thin');
		expect(markOf({ outcome: 'found', strength: null })).toBe('not_rated');
	});
	it('is contested where sources differ, and no row where nothing was found', () => {
		expect(markOf({ outcome: 'contested', strength: 'contested' })).toBe('contested');
		for (const outcome of ['not_listed', 'not_used', 'illegible'])
			expect(markOf({ outcome, strength: null })).toBe('no_row');
	});
});
