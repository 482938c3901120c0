import { describe, expect, it } from 'vitest';
import { invented } from './invented';
import { check } from './sources';

describe('sources', () => {
	it('accepts works that are known and cited', () => {
		expect(check(invented())).toEqual([]);
	});

	it('refuses a citation of an unknown work', () => {
		const data = invented({ 'gm/series.citations.csv': ['kestrel-manual', 'heron-manual'] });
		expect(check(data)).toEqual([
			{
				file: 'gm/series.citations.csv',
				line: 2,
				message: 'source heron-manual is not in sources.csv'
			}
		]);
	});

	it('refuses a work that nothing cites', () => {
		const data = invented({
			'gm/engine.citations.csv': ['gm.engine.k.1,kestrel-register,for,excerpt,,,\n', '']
		});
		expect(check(data)).toEqual([
			{ file: 'sources.csv', line: 3, message: 'nothing cites source kestrel-register' }
		]);
	});

	it.each([
		['itself', 'kestrel-register'],
		['an unknown work', 'heron-manual']
	])('refuses a work that repeats %s', (_, key) => {
		const data = invented({ 'sources.csv': [',,kestrel-manual\n', `,,${key}\n`] });
		expect(check(data)).toEqual([
			{ file: 'sources.csv', line: 3, message: expect.stringContaining(`repeats`) }
		]);
	});
});
