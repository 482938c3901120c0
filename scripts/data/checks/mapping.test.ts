import { describe, expect, it } from 'vitest';
import { invented } from './invented';
import { check } from './mapping';

describe('mapping', () => {
	it('accepts labels that all have a place', () => {
		expect(check(invented())).toEqual([]);
	});

	it('refuses a label without a place, and a place without a label', () => {
		expect(check(invented({ 'mapping.csv': ['paint,code', 'paint,name'] }))).toEqual([
			{
				file: 'candidates.csv',
				line: 3,
				message: 'label birds, paint, code is not in mapping.csv'
			},
			{
				file: 'mapping.csv',
				line: 4,
				message: 'no collected fact carries the label birds, paint, name'
			}
		]);
	});
});
