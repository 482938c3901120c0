import { describe, expect, it } from 'vitest';
import { invented } from './invented';
import { check } from './memory';

describe('memory', () => {
	it('accepts remarks of one scope, and a narrower row beside a wider one', () => {
		expect(check(invented())).toEqual([]);
	});

	it('refuses two rows from memory that give one code two meanings', () => {
		const data = invented({
			'gm/engine.csv': ['Pontiac,,,,,,1966,1967,M', 'Pontiac,Kestrel,,,,,1966,1967,K']
		});
		expect(check(data)).toEqual([
			{
				file: 'gm/engine.csv',
				line: 4,
				message: '"200 six, one-barrel" against gm.engine.k.2, both from memory'
			}
		]);
	});

	it('refuses ranges from memory that meet', () => {
		const data = invented({ 'other/country.csv': ['AJ-AN', 'AG-AN'] });
		expect(check(data).map(({ line }) => line)).toEqual([3]);
	});
});
