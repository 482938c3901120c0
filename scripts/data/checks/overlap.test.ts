import { describe, expect, it } from 'vitest';
import { invented } from './invented';
import { check } from './overlap';

const MEMORY_BESIDE_CITED = ['Pontiac,,,,,,1966,1967,M', 'Pontiac,,,,,,1966,1967,K'] as const;

describe('overlap', () => {
	it('accepts a narrower row from memory beside a cited one', () => {
		expect(check(invented())).toEqual([]);
	});

	it('refuses memory that contradicts a cited row', () => {
		expect(check(invented({ 'gm/engine.csv': MEMORY_BESIDE_CITED }))).toEqual([
			{
				file: 'gm/engine.csv',
				line: 4,
				message: '"200 six, one-barrel", from memory, contradicts cited gm.engine.k.1'
			}
		]);
	});

	it('accepts a dispute between two published works', () => {
		const data = invented({
			'gm/engine.csv': MEMORY_BESIDE_CITED,
			'gm/engine.citations.csv': [
				'gm.engine.m.1,memory,for,',
				'gm.engine.m.1,kestrel-register,for,excerpt'
			]
		});
		expect(check(data)).toEqual([]);
	});

	it('accepts one code with two meanings in other years', () => {
		const data = invented({
			'gm/engine.csv': ['Pontiac,,,,,,1966,1967,M', 'Pontiac,,,,,,1968,1969,K']
		});
		expect(check(data)).toEqual([]);
	});
});
