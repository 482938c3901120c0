import { describe, expect, it } from 'vitest';
import { readFilters } from './filters';
import { headingOf } from './heading';

const read = (query: string) => readFilters(new URLSearchParams(query));

describe('what a page of tables is asked to show', () => {
	it('is everything when nothing is asked', () => {
		expect(read('')).toEqual({
			asked: { q: '', table: '', division: '', year: '', strength: '' },
			filters: {},
			query: '',
			faults: []
		});
	});

	it('is read whatever the case and the space around it', () => {
		const { filters, query, faults } = read(
			'q=+hemi+&table=Body-Style&division=plymouth&year=1970&strength=Not+rated'
		);
		expect(filters).toEqual({
			maker: 'chrysler',
			division: 'Plymouth',
			table: 'body_style',
			year: 1970,
			strength: 'not_rated'
		});
		expect([query, faults]).toEqual(['hemi', []]);
	});

	it('takes a name that is both for the make, and as a maker for the corporation', () => {
		expect(read('division=Ford').filters).toEqual({ maker: 'ford', division: 'Ford' });
		expect(read('division=Ford+Motor+Company').filters).toEqual({ maker: 'ford' });
		expect(read('maker=ford').filters).toEqual({ maker: 'ford' });
		expect(read('maker=mercury').filters).toEqual({ maker: 'ford', division: 'Mercury' });
		expect(read('division=chevy').asked.division).toBe('Chevrolet');
	});

	it('says beside each field what cannot be, keeps it there, and heeds the rest', () => {
		const { asked, filters, faults } = read('table=gears&division=DeSoto&year=70&strength=strong');
		expect(faults.map(({ field }) => field)).toEqual(['table', 'division', 'year', 'strength']);
		expect(asked).toEqual({
			q: '',
			table: 'gears',
			division: 'DeSoto',
			year: '70',
			strength: 'strong'
		});
		expect(filters).toEqual({});
		expect(read('year=2040').faults[0]?.message).toBe(
			'A model year is a whole number from 1955 to 2039.'
		);
	});

	it('does not search for more than a hundred characters', () => {
		const { query, faults } = read(`q=${'a'.repeat(101)}`);
		expect([query, faults.length]).toEqual(['', 1]);
	});
});

describe('the heading over what is shown', () => {
	it('names it', () => {
		expect(headingOf({}, '')).toBe('All rows');
		expect(headingOf({ maker: 'chrysler' }, '')).toBe('Chrysler Corporation');
		expect(
			headingOf({ maker: 'chrysler', division: 'Plymouth', year: 1970, table: 'engine' }, '383')
		).toBe('Plymouth 1970: Engine codes, “383”');
		expect(headingOf({ strength: 'thin' }, '')).toBe('thin only');
	});
});
