import { describe, expect, it } from 'vitest';
import { invented } from './invented';
import { check } from './schema';

describe('schema', () => {
	it('accepts records of the right shape', () => {
		expect(check(invented())).toEqual([]);
	});

	it('refuses a fact that its table does not know', () => {
		const data = invented({ 'gm/paint.csv': ['hex_approximate', 'gloss'] });
		expect(check(data)).toEqual([
			{ file: 'gm/paint.csv', line: 2, message: expect.stringContaining('gloss') }
		]);
	});

	it('refuses a code table without a code', () => {
		const data = invented({ 'gm/series.csv': ['1967,42,', '1967,,'] });
		expect(check(data)).toEqual([
			{ file: 'gm/series.csv', line: 2, message: 'a row of series needs a code' }
		]);
	});

	it('refuses values that are no JSON, years that are no figures, and rows of too few cells', () => {
		const data = invented({
			'gm/series.csv': ['"{""line"":""Kestrel""}"', 'Kestrel'],
			'gm/paint.csv': ['1966,1966', '1966,late'],
			'gm/note.csv': ['A first remark,{},', 'A first remark']
		});
		expect(check(data).map(({ file, line }) => `${file}:${line}`)).toEqual([
			'gm/series.csv:2',
			'gm/paint.csv:2',
			'gm/note.csv:2'
		]);
	});

	it('refuses a file with other columns, of no table, or that is no CSV', () => {
		const data = invented({
			'claims.csv': ['claim_key,maker', 'claim_key,corporation'],
			'gm/series.citations.csv': ['page 3', '"page 3']
		});
		expect(check(data).map(({ file }) => file)).toEqual(['gm/series.citations.csv', 'claims.csv']);
	});
});
