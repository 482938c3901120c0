/**
 * Calendar days as whole numbers: day 0 is 1 January 1970 of the Gregorian calendar. No hours, no time zones.
 * Years 1 to 9999.
 */

/** Year, month 1–12 and day of the month. */
export interface CalendarDay {
	readonly year: number;
	readonly month: number;
	readonly day: number;
}

/** First and last day, both counted in. */
export type DaySpan = readonly [first: number, last: number];

const BEFORE_MONTH = [0, 31, 59, 90, 120, 151, 181, 212, 243, 273, 304, 334] as const;
const LENGTHS = [31, 28, 31, 30, 31, 30, 31, 31, 30, 31, 30, 31] as const;
/** Days from 1 January of year 1 to 1 January 1970. */
const EPOCH = 719162;

export const isLeapYear = (year: number): boolean =>
	year % 4 === 0 && (year % 100 !== 0 || year % 400 === 0);

export const daysInYear = (year: number): number => (isLeapYear(year) ? 366 : 365);

/** Days in a month; of February the longer when the year is open. */
export const daysInMonth = (month: number, year: number | null): number =>
	month === 2 && (year === null || isLeapYear(year)) ? 29 : (LENGTHS[month - 1] as number);

/** Days from 1 January 1970 to the first of a year. */
function firstOfYear(year: number): number {
	const before = year - 1;
	const leaps = Math.floor(before / 4) - Math.floor(before / 100) + Math.floor(before / 400);
	return before * 365 + leaps - EPOCH;
}

/**
 * The number of a calendar day that exists.
 * @example dayNumber(1969, 1, 12) // -354
 */
export function dayNumber(year: number, month: number, day: number): number {
	const leapDay = month > 2 && isLeapYear(year) ? 1 : 0;
	return firstOfYear(year) + (BEFORE_MONTH[month - 1] as number) + leapDay + day - 1;
}

/** The calendar day of a number. */
export function calendarDay(number: number): CalendarDay {
	let year = Math.floor(number / 365.2425) + 1970;
	while (firstOfYear(year) > number) year -= 1;
	while (firstOfYear(year + 1) <= number) year += 1;
	let left = number - firstOfYear(year);
	let month = 1;
	while (left >= daysInMonth(month, year)) {
		left -= daysInMonth(month, year);
		month += 1;
	}
	return { year, month, day: left + 1 };
}

/** The nth day of a year, 1 for 1 January. */
export const dayOfYear = (year: number, n: number): number => firstOfYear(year) + n - 1;

/**
 * Writes a day as ISO 8601.
 * @example isoDay(-354) // '1969-01-12'
 */
export function isoDay(number: number): string {
	const { year, month, day } = calendarDay(number);
	return `${String(year).padStart(4, '0')}-${String(month).padStart(2, '0')}-${String(day).padStart(2, '0')}`;
}

/** The number of a day written as ISO 8601. */
export function dayOfIso(iso: string): number {
	return dayNumber(Number(iso.slice(0, 4)), Number(iso.slice(5, 7)), Number(iso.slice(8, 10)));
}

/**
 * The days of a week of a month, as a trade rule (common practice): week k runs from day 7k−12, not before the first,
 * to day 7k, and the fifth to the month's end.
 */
export function weekOfMonth(year: number, month: number, week: number): DaySpan {
	const last = week === 5 ? daysInMonth(month, year) : 7 * week;
	return [dayNumber(year, month, Math.max(1, 7 * week - 12)), dayNumber(year, month, last)];
}
