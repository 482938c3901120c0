import { describe, expect, it } from 'vitest';
import { check } from './candidates';
import { invented } from './invented';

describe('candidates', () => {
	it('accepts facts that became rows or were rejected', () => {
		expect(check(invented())).toEqual([]);
	});

	it.each([
		['a fact that became a row which is not there', 'row,gm.paint.a.1', 'row,gm.paint.a.9'],
		['a fact that became nothing', 'row,gm.paint.a.1', 'row,'],
		['a table that the label does not allow', 'row,gm.paint.a.1', 'row,gm.series.42.1'],
		['a rejected fact with rows', 'ad,rejected,', 'ad,rejected,gm.engine.k.1']
	])('refuses %s', (_, from, to) => {
		expect(check(invented({ 'candidates.csv': [from, to] }))).toHaveLength(1);
	});

	it('refuses a fact that is in both lists', () => {
		const data = invented({ 'candidates.csv': ['ad,rejected,', 'ad,row,gm.engine.m.1'] });
		expect(check(data).map(({ file, message }) => `${file} ${message}`)).toEqual([
			'candidates.csv birds-10 became a row and stands in REJECTED.csv too',
			'REJECTED.csv candidates.csv does not list birds-10 as rejected'
		]);
	});

	it('refuses a rejected fact without a reason, and a reason without a fact', () => {
		const data = invented({ 'REJECTED.csv': ['birds-10', 'birds-11'] });
		expect(check(data).map(({ file }) => file)).toEqual(['candidates.csv', 'REJECTED.csv']);
	});
});
