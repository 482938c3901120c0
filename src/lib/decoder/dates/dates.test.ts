import { describe, expect, it } from 'vitest';
import { DATE_FORMATS, readDate } from './index';
import { readIn } from './read-date';

describe('every date format', () => {
	it('has an id of its own', () => {
		const ids = DATE_FORMATS.map(({ id }) => id);
		expect(new Set(ids).size).toBe(ids.length);
	});

	it.each(DATE_FORMATS)('reads its own example: $id', (format) => {
		const { text, year, earliest, latest } = format.example;
		const [first] = readIn(format, text, year === undefined ? {} : { year }).meanings;
		expect([first?.earliest, first?.latest]).toEqual([earliest, latest]);
	});
});

describe('a month and week', () => {
	it('is an interval of a calendar year that the model year gives', () => {
		expect(readDate('gm-body-month-week', '01C', { year: 1969 }).meanings).toEqual([
			{
				earliest: '1969-01-09',
				latest: '1969-01-21',
				words: 'third week of January 1969',
				year: 1969,
				usual: true
			}
		]);
	});

	it('leaves the year open where nothing gives it', () => {
		expect(readDate('gm-body-month-week', '01C').meanings).toEqual([
			{ earliest: null, latest: null, words: 'third week of January', year: null, usual: true }
		]);
	});

	it('has one meaning a year of the span that its layout allows', () => {
		const { meanings } = readDate('gm-body-month-week', '01C', { years: [1964, 1966] });
		expect(meanings.map(({ year }) => year)).toEqual([1964, 1965, 1966]);
	});

	it('keeps both calendar years of an autumn month, the usual first', () => {
		const { meanings, detail } = readDate('gm-body-month-week', '10B', { year: 1969 });
		expect(meanings.map(({ year, usual }) => [year, usual])).toEqual([
			[1968, true],
			[1969, false]
		]);
		expect(detail).toContain('ran long');
	});

	it('says which character is no code', () => {
		const { meanings, fault } = readDate('gm-body-month-week', '13C');
		expect(meanings).toEqual([]);
		expect(fault).toEqual({ code: 'no_such_code', message: '13 is no month of this form.' });
	});
});

describe('a casting date', () => {
	it('keeps the decades open until the car settles them', () => {
		const words = (context: { year?: number }) =>
			readDate('gm-casting', 'A129', context).meanings.map((meaning) => meaning.words);
		expect(words({})).toEqual([
			'12 January 1959',
			'12 January 1969',
			'12 January 1979',
			'12 January 1989'
		]);
		expect(words({ year: 1969 })).toEqual(['12 January 1969']);
	});

	it('splits where dividers were typed', () => {
		const words = (text: string) =>
			readDate('gm-casting', text, { year: 1965 }).meanings.map((meaning) => meaning.words);
		expect(words('B165')).toEqual(['1 February 1965', '16 February 1965']);
		expect(words('B 16 5')).toEqual(['16 February 1965']);
		expect(words('B-1-65')).toEqual(['1 February 1965']);
	});

	it('refuses a day that the month does not have', () => {
		const { fault } = readDate('gm-casting', 'B 30 9', { year: 1969 });
		expect(fault).toEqual({ code: 'no_such_day', message: 'February 1969 has 28 days.' });
	});

	it('narrows what is unread', () => {
		expect(readDate('gm-casting', 'A 1? 9', { year: 1969 }).meanings).toEqual([
			{
				earliest: '1969-01-10',
				latest: '1969-01-19',
				words: 'between 10 January 1969 and 19 January 1969',
				year: 1969,
				usual: true
			}
		]);
		expect(readDate('gm-casting', '? ? ?').fault?.code).toBe('too_open');
	});
});

describe('what stands beside a date', () => {
	it('never removes a reading: years that exclude every decade are passed over', () => {
		const { meanings } = readDate('ford-casting', '6 B 10', { years: [1971, 1973] });
		expect(meanings.map(({ year }) => year)).toEqual([1956, 1966, 1976, 1986]);
	});

	it('leaves the decade open when no year of the car’s is near, the nearest first', () => {
		const { meanings, detail } = readDate('ford-casting', '3B10', { year: 1970 });
		expect(meanings.map(({ year }) => year)).toEqual([1973, 1963, 1983]);
		expect(detail).toContain('settles it');
	});
});

describe('a day of the year', () => {
	it('366 is a day of leap years alone', () => {
		expect(readDate('rochester-day-of-year', '3668', { year: 1968 }).meanings[0]?.latest).toBe(
			'1968-12-31'
		);
		expect(readDate('rochester-day-of-year', '3669', { year: 1969 }).fault).toEqual({
			code: 'no_such_day',
			message: '1969 has 365 days.'
		});
	});
});
