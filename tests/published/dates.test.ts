/**
 * Worked dates as published pages print them. Each line of `dates/dates.csv` names its source: `expect` is an ISO day
 * that must be among the meanings, or words that stand in one; `years` are the casting number's.
 */
import { describe, expect, it } from 'vitest';
import { DATE_FORMATS, readIn, type DateFormat } from '../../src/lib/decoder/dates';
import { dayNumber, dayOfYear, isoDay } from '../../src/lib/decoder/dates/days';
import { samples } from './samples';

const list = samples('dates/dates.csv');

describe('published dates', () => {
	it.each(list.map((sample) => [sample.format, sample.text, sample.expect, sample] as const))(
		'%s %s is %s',
		(id, text, expected, { year, years }) => {
			const format = DATE_FORMATS.find((one) => one.id === id) as DateFormat;
			const span = (years ?? '').split('-').map(Number);
			const { meanings } = readIn(format, text ?? '', {
				...(year ? { year: Number(year) } : {}),
				...(years ? { years: [span[0] as number, span[1] as number] } : {})
			});
			const day = /^\d{4}-\d{2}-\d{2}$/.test(expected ?? '');
			if (day)
				expect(meanings.map(({ earliest, latest }) => [earliest, latest])).toContainEqual([
					expected,
					expected
				]);
			else expect(meanings.map(({ words }) => words).join(' or ')).toContain(expected);
		}
	);

	it('name their source each, forty or more', () => {
		expect(list.length).toBeGreaterThanOrEqual(40);
		expect(list.filter(({ source }) => source === '')).toEqual([]);
	});
});

describe('days that published pages count', () => {
	// ChevelleStuff, Transmission identification 1970: the 298th day of 1969 is October 25, the 212th of 1970 July 31.
	it.each([
		[1969, 298, '1969-10-25'],
		[1970, 212, '1970-07-31']
	])('%i, day %i', (year, n, iso) => expect(isoDay(dayOfYear(year, n))).toBe(iso));

	// Weekdays named beside a date: 76vette.com, the NCRS forum, the 1970 GTX Registry. Day 0 was a Thursday.
	it.each([
		['Thursday', 1975, 10, 9],
		['Monday', 1969, 12, 15],
		['Saturday', 1969, 8, 2]
	] as const)('%s, %i-%i-%i', (weekday, year, month, day) => {
		const names = ['Thursday', 'Friday', 'Saturday', 'Sunday', 'Monday', 'Tuesday', 'Wednesday'];
		const number = dayNumber(year, month, day);
		expect(names[((number % 7) + 7) % 7]).toBe(weekday);
	});
});

describe('common practice, no source', () => {
	it('the third week of January runs from the ninth to the twenty-first, E to the month’s end', () => {
		const format = DATE_FORMATS.find(({ id }) => id === 'gm-body-month-week') as DateFormat;
		const spans = ['01A', '01B', '01C', '01D', '01E'].map((text) => {
			const [first] = readIn(format, text, { year: 1969 }).meanings;
			return [first?.earliest, first?.latest];
		});
		expect(spans).toEqual([
			['1969-01-01', '1969-01-07'],
			['1969-01-02', '1969-01-14'],
			['1969-01-09', '1969-01-21'],
			['1969-01-16', '1969-01-28'],
			['1969-01-23', '1969-01-31']
		]);
	});
});
