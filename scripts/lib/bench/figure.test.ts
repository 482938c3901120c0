import { describe, expect, it } from 'vitest';
import { median, ratioOf } from '../../../tests/bench/lib/rounds';
import { holds, shown, tableOf, withTable } from './figure.mjs';

const figure = (value: number, direction: 'at least' | 'at most' = 'at least') => ({
	name: 'serials read',
	bound: 150_000,
	unit: 'a second',
	direction,
	value
});

describe('holds', () => {
	it('looks at the direction of the bound', () => {
		expect(holds(figure(150_000))).toBe(true);
		expect(holds(figure(149_999))).toBe(false);
		expect(holds(figure(149_999, 'at most'))).toBe(true);
	});

	it('takes nothing that is no number', () => {
		expect(holds(figure(NaN, 'at most'))).toBe(false);
	});
});

describe('tableOf', () => {
	it('is aligned Markdown that marks what is missed', () => {
		expect(tableOf([figure(212_345.6), figure(1)])).toBe(
			[
				'| Figure       | Measured         | Bound                     | Holds  |',
				'| ------------ | ---------------- | ------------------------- | ------ |',
				'| serials read | 212,346 a second | at least 150,000 a second | yes    |',
				'| serials read | 1 a second       | at least 150,000 a second | **no** |'
			].join('\n')
		);
	});

	it('shows three digits that count', () => {
		expect([0.8512, 4.0049, 99.96, 1234.5].map(shown)).toEqual(['0.851', '4', '100', '1,235']);
	});
});

describe('withTable', () => {
	const README = 'before\n<!-- bench:begin -->\nold\n<!-- bench:end -->\nafter\n';

	it('replaces what stands between the marks', () => {
		expect(withTable(README, '| new |')).toBe(
			'before\n<!-- bench:begin -->\n\n| new |\n\n<!-- bench:end -->\nafter\n'
		);
	});

	it('says so when there are no marks', () => {
		expect(() => withTable('nothing', '')).toThrow('bench:begin');
	});
});

describe('rounds', () => {
	it('have a median', () => {
		expect(median([3, 1, 2])).toBe(2);
		expect(median([4, 1, 2, 3])).toBe(2.5);
	});

	it('are measured in turns, the first one to warm up', async () => {
		const order: string[] = [];
		const measure = (name: string, value: number) => () => {
			order.push(name);
			return value;
		};
		expect(await ratioOf(measure('a', 8), measure('b', 10), 2)).toBe(0.8);
		expect(order.join('')).toBe('abbaab');
	});
});
