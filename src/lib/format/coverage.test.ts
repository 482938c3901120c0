import { describe, expect, it } from 'vitest';
import { coverageAddress, coverageGroups, COVERAGE_YEARS, drawnCoverage } from './coverage';

const divisions = [
	{ maker: 'gm', division: 'Pontiac', years: [{ year: 1969, rows: 40, supported: 10 }] },
	{ maker: 'gm', division: 'Cadillac', years: [] },
	{
		maker: 'chrysler',
		division: 'Imperial',
		years: [
			{ year: 1955, rows: 3, supported: 3 },
			{ year: 1966, rows: 3, supported: 0 }
		]
	},
	{ maker: 'ford', division: 'Ford', years: [{ year: 1955, rows: 1, supported: 1 }] }
] as const;

describe('coverage as it is drawn', () => {
	const groups = coverageGroups(drawnCoverage(divisions), { division: 'Pontiac', year: 1969 });
	const cell = (division: string, year: number) =>
		groups
			.flatMap(({ strips }) => strips)
			.find((strip) => strip.division === division)
			?.cells.find((one) => one.year === year);

	it('leaves out makes without rows in the years of the drawing, and keeps corporations together', () => {
		expect(
			groups.map(({ name, strips }) => [name, strips.map(({ division }) => division)])
		).toEqual([
			['General Motors', ['Pontiac']],
			['Chrysler Corporation', ['Imperial']]
		]);
	});

	it('has a cell for each year, filled to the share that is firm or fair', () => {
		expect(groups[0]?.strips[0]?.cells.map(({ year }) => year)).toEqual(COVERAGE_YEARS);
		expect(cell('Pontiac', 1969)).toEqual({
			year: 1969,
			rows: 40,
			share: 25,
			blank: false,
			chosen: true,
			address: '/tables?division=Pontiac&year=1969#find',
			title: 'Pontiac 1969: 40 rows, 25 % firm or fair'
		});
		expect(cell('Imperial', 1966)).toMatchObject({ rows: 3, share: 0, chosen: false });
	});

	it('tells years without rows from years without cars', () => {
		expect(cell('Imperial', 1975)).toMatchObject({ rows: 0, blank: false });
		expect(cell('Imperial', 1976)).toMatchObject({ rows: 0, blank: true });
		expect(cell('Pontiac', 1976)).toMatchObject({ rows: 0, blank: false });
	});

	it('leads from a make to its tables', () => {
		expect(coverageAddress('GM of Canada')).toBe('/tables?division=GM+of+Canada#find');
	});
});
