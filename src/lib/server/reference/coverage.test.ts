import { describe, expect, it } from 'vitest';
import { INVENTED } from '../../../../tests/fixtures/invented';
import { compile } from '../../decoder';
import { coverage } from './coverage';

const tables = compile(INVENTED);

describe('the coverage of an edition', () => {
	it('counts rows of code tables by division and year, and those well supported', () => {
		const { first_year, last_year, divisions } = coverage(tables);
		expect([first_year, last_year]).toEqual([1965, 1972]);
		const chevrolet = divisions.find(({ division }) => division === 'Chevrolet');
		expect(chevrolet?.years.map(({ year }) => year)).toEqual([
			1965, 1966, 1967, 1968, 1969, 1970, 1971, 1972
		]);
		expect(divisions.find(({ division }) => division === 'Cadillac')?.years).toEqual([]);
	});

	it('lets rows without a year or division count where the division is covered', () => {
		const plymouth = coverage(tables).divisions.find(({ division }) => division === 'Plymouth');
		expect(plymouth?.years).toEqual(
			[1968, 1969, 1970].map((year) => ({ year, rows: 2, supported: 1 }))
		);
		const mercury = coverage(tables).divisions.find(({ division }) => division === 'Mercury');
		expect(mercury?.years).toEqual([1966, 1967].map((year) => ({ year, rows: 2, supported: 1 })));
	});
});
