import { describe, expect, it } from 'vitest';
import { check } from './citations';
import { invented } from './invented';

describe('citations', () => {
	it('accepts rows that rest on something', () => {
		expect(check(invented())).toEqual([]);
	});

	it.each([
		['a row for which nothing speaks', 'gm.engine.m.1,memory,for', 'gm.engine.m.1,memory,against'],
		['a published work without how much was read', 'for,page,page 4', 'for,,page 4'],
		['memory that was read', 'gm.engine.m.1,memory,for,,', 'gm.engine.m.1,memory,for,whole,']
	])('refuses %s', (_, from, to) => {
		expect(check(invented({ 'gm/engine.citations.csv': [from, to] }))).toHaveLength(1);
	});

	it('refuses a citation without its row', () => {
		const data = invented({ 'gm/paint.citations.csv': ['gm.paint.a.1', 'gm.paint.a.7'] });
		expect(check(data).map(({ message }) => message)).toEqual([
			'there is no row gm.paint.a.7',
			'nothing speaks for gm.paint.a.1'
		]);
	});
});
