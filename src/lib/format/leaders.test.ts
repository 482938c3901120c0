import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { BENCH, leaderLayout, leaderPath } from './leaders';

const chrysler = [1, 1, 2, 1, 1, 1, 6].map((cells, index) => ({
	cells,
	width: index === 3 ? 220 : 120
}));

describe('leaderLayout', () => {
	it('gives thirteen characters in seven groups the whole page', () => {
		const { cell, gap, stamp, middles } = leaderLayout(chrysler);
		expect([cell, gap, stamp]).toEqual([80, 40, BENCH]);
		expect(middles).toEqual([40, 160, 320, 480, 600, 720, 1040]);
	});

	it('stands columns straight under their brackets where the widths allow', () => {
		const { columns } = leaderLayout(chrysler);
		expect(columns[0]).toBe(0);
		expect(columns.slice(1, 4)).toEqual([160, 320, 480]);
		expect(columns.at(-1)).toBe(1040);
	});

	it('leans neighbors alike', () => {
		const { columns, middles } = leaderLayout(chrysler);
		expect(columns[4]! - middles[4]!).toBe(columns[5]! - middles[5]!);
	});

	it('makes cells smaller for seventeen characters', () => {
		const layout = leaderLayout([3, 5, 1, 1, 1, 6].map((cells) => ({ cells, width: 150 })));
		expect(layout.cell).toBe(60);
		expect(layout.stamp).toBeLessThanOrEqual(BENCH);
	});

	it('keeps order, least widths and the page, whatever the groups', () => {
		const need = fc.record({
			cells: fc.integer({ min: 1, max: 6 }),
			width: fc.integer({ min: 10, max: 22 }).map((tens) => tens * 10)
		});
		fc.assert(
			fc.property(fc.array(need, { minLength: 1, maxLength: 12 }), (needs) => {
				const { columns } = leaderLayout(needs);
				const total = needs.reduce((sum, { width }) => sum + width, 0);
				const ends = [...columns.slice(1), BENCH];
				columns.forEach((column, index) => {
					expect(column % 10).toBe(0);
					const room = ends[index]! - column;
					if (total <= BENCH) expect(room).toBeGreaterThanOrEqual(needs[index]!.width);
					else expect(room).toBeGreaterThan(0);
				});
				expect(columns[0]).toBeGreaterThanOrEqual(0);
			})
		);
	});
});

describe('leaderPath', () => {
	it('drops straight, or goes down, across and down', () => {
		expect(leaderPath(160, 160)).toBe('M160.5 4V56');
		expect(leaderPath(600, 700)).toBe('M600.5 4V14L700.5 42V56');
	});
});
