import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import {
	calendarDay,
	dayNumber,
	dayOfIso,
	dayOfYear,
	daysInMonth,
	daysInYear,
	isLeapYear,
	isoDay,
	weekOfMonth
} from './days';

const MS = 86_400_000;

describe('day numbers', () => {
	it('agree with Date.UTC on every day from 1850 to 2100', () => {
		const last = Date.UTC(2100, 11, 31) / MS;
		for (let number = Date.UTC(1850, 0, 1) / MS; number <= last; number += 1) {
			const date = new Date(number * MS);
			const [year, month, day] = [date.getUTCFullYear(), date.getUTCMonth() + 1, date.getUTCDate()];
			if (dayNumber(year, month, day) !== number) throw new Error(`${year}-${month}-${day}`);
			const own = calendarDay(number);
			if (own.year !== year || own.month !== month || own.day !== day) throw new Error(`${number}`);
		}
		expect(isoDay(last)).toBe('2100-12-31');
	});

	it('go to text and back', () => {
		fc.assert(
			fc.property(fc.integer({ min: -700_000, max: 2_900_000 }), (number) => {
				expect(dayOfIso(isoDay(number))).toBe(number);
			})
		);
	});

	it('count days of a year', () => {
		expect(isoDay(dayOfYear(1968, 366))).toBe('1968-12-31');
		expect(isoDay(dayOfYear(1969, 60))).toBe('1969-03-01');
	});
});

describe('leap years', () => {
	// Explanatory Supplement's rule, as the U.S. Naval Observatory states it: 1700, 1800, 1900 and 2100 are none, 1600 and 2000 are.
	it.each([
		[1600, true],
		[1700, false],
		[1800, false],
		[1900, false],
		[1964, true],
		[1967, false],
		[1968, true],
		[2000, true],
		[2100, false]
	])('%i: %s', (year, leap) => {
		expect(isLeapYear(year)).toBe(leap);
		expect(daysInYear(year)).toBe(leap ? 366 : 365);
		expect(daysInMonth(2, year)).toBe(leap ? 29 : 28);
	});

	it('may be any while the year is open', () => {
		expect(daysInMonth(2, null)).toBe(29);
		expect(daysInMonth(4, null)).toBe(30);
	});
});

describe('weeks of a month', () => {
	it('overlap, and the fifth ends with the month', () => {
		const iso = (week: number) => weekOfMonth(1968, 2, week).map(isoDay);
		expect(iso(1)).toEqual(['1968-02-01', '1968-02-07']);
		expect(iso(5)).toEqual(['1968-02-23', '1968-02-29']);
	});
});
