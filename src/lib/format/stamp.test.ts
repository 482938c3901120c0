import { describe, expect, it } from 'vitest';
import { phoneLines, placesInWords, stampCells } from './stamp';

const spans = (...lengths: number[]) => {
	let from = 1;
	return lengths.map((length) => {
		const span = { from, to: from + length - 1 };
		from += length;
		return span;
	});
};
const lengths = (lines: ReturnType<typeof spans>[]) =>
	lines.map((line) => line.reduce((sum, { from, to }) => sum + to - from + 1, 0));

describe('stampCells', () => {
	it('keeps one character a place, unread and either included', () => {
		expect(stampCells('RM2?[38]')).toEqual(['R', 'M', '2', '?', '38']);
	});
	it('gives no cells for no text', () => expect(stampCells('')).toEqual([]));
});

describe('phoneLines', () => {
	it('breaks 17 characters into 3, 6 and 8', () => {
		expect(lengths(phoneLines(spans(3, 5, 1, 1, 1, 6)))).toEqual([3, 6, 8]);
	});
	it('leaves the seams of the format whole where 3, 6 and 8 would cut a group', () => {
		expect(lengths(phoneLines(spans(3, 5, 3, 6)))).toEqual([8, 9]);
	});
	it('breaks 13 characters before the running number', () => {
		expect(lengths(phoneLines(spans(1, 1, 2, 1, 1, 1, 6)))).toEqual([7, 6]);
		expect(lengths(phoneLines(spans(1, 2, 2, 1, 1, 6)))).toEqual([7, 6]);
	});
	it('breaks 11 characters into 5 and 6', () => {
		expect(lengths(phoneLines(spans(1, 1, 2, 1, 6)))).toEqual([5, 6]);
	});
	it('keeps a short stamp, and one group, in one line', () => {
		expect(lengths(phoneLines(spans(3)))).toEqual([3]);
		expect(lengths(phoneLines(spans(12)))).toEqual([12]);
	});
});

describe('placesInWords', () => {
	it('says one place or a span', () => {
		expect(placesInWords({ from: 5, to: 5 })).toBe('character 5');
		expect(placesInWords({ from: 3, to: 4 })).toBe('characters 3–4');
	});
});
