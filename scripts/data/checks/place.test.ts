import { describe, expect, it } from 'vitest';
import { invented } from './invented';
import { check } from './place';

describe('place', () => {
	it('accepts keys that carry maker, table and code', () => {
		expect(check(invented())).toEqual([]);
	});

	it.each([
		['another code', 'gm.paint.a.1', 'gm.paint.b.1'],
		['another table', 'gm.paint.a.1', 'gm.roof.a.1'],
		['another maker', 'gm.paint.a.1', 'ford.paint.a.1']
	])('refuses a key of %s', (_, from, to) => {
		expect(check(invented({ 'gm/paint.csv': [from, to] }))).toEqual([
			{ file: 'gm/paint.csv', line: 2, message: `${to} should be gm.paint.a.<number>` }
		]);
	});

	it('refuses a citation in the file of another table', () => {
		const data = invented({ 'gm/paint.citations.csv': ['gm.paint.a.1', 'gm.series.42.1'] });
		expect(check(data)).toEqual([
			{
				file: 'gm/paint.citations.csv',
				line: 2,
				message: 'gm.series.42.1 belongs to another file'
			}
		]);
	});
});
