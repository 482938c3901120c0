import { describe, expect, it } from 'vitest';
import { divisionNamed, MAKER_LIST, makerNamed } from './aliases';

describe('the name of a maker', () => {
	it.each([
		['GM', { maker: 'gm' }],
		['general  motors', { maker: 'gm' }],
		['g.m.', { maker: 'gm' }],
		['Mopar', { maker: 'chrysler' }],
		['chrysler', { maker: 'chrysler' }],
		['Ford', { maker: 'ford' }],
		['FoMoCo', { maker: 'ford' }],
		['amc', { maker: 'amc' }],
		['Chevy', { maker: 'gm', division: 'Chevrolet' }],
		['OLDS', { maker: 'gm', division: 'Oldsmobile' }],
		['merc', { maker: 'ford', division: 'Mercury' }],
		['gm canada', { maker: 'gm', division: 'GM of Canada' }]
	])('%s stands for %j', (name, named) => {
		expect(makerNamed(name)).toEqual(named);
	});

	it('is not guessed', () => {
		for (const name of ['', '!', 'Tucker', 'chevroletx', '__proto__'])
			expect(makerNamed(name)).toBeNull();
	});

	it('means the division Chrysler only where a division is asked', () => {
		expect(divisionNamed('Chrysler')).toEqual({ maker: 'chrysler', division: 'Chrysler' });
		expect(divisionNamed('GM')).toBeNull();
	});

	it('stands for one thing only', () => {
		const fold = (name: string) => name.toLowerCase().replace(/[^a-z0-9]/g, '');
		const makers = MAKER_LIST.flatMap(({ key, name, aliases }) => [
			...new Set([key, name, ...aliases].map(fold))
		]);
		const divisions = MAKER_LIST.flatMap((maker) =>
			maker.divisions.flatMap(({ name, aliases }) => [...new Set([name, ...aliases].map(fold))])
		);
		expect(new Set(makers).size).toBe(makers.length);
		expect(new Set(divisions).size).toBe(divisions.length);
	});
});
