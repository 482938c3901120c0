/** From the values of the parts to intervals of days and their words. */
import { datesText as text } from '../../text/en/dates';
import {
	calendarDay,
	dayNumber,
	dayOfYear,
	daysInMonth,
	daysInYear,
	isoDay,
	weekOfMonth,
	type DaySpan
} from './days';
import type { DateMeaning, PartName } from './format';

/** What one combination of part values names: a span of days, its words, or why there is none. */
export type Told =
	{ readonly span: DaySpan | null; readonly words: string } | { readonly impossible: string };

/** Part values of one combination; months of a second year are folded to 1–12 before. */
export type Values = Partial<Record<PartName, number>>;

const wordsOfDay = (number: number): string => {
	const { year, month, day } = calendarDay(number);
	return text.day(year, month, day);
};
const oneDay = (number: number): Told => ({ span: [number, number], words: wordsOfDay(number) });

/** Seven days from the first of the year on; the last week ends with the year. */
function weekOfYear(year: number, week: number): Told {
	const last = Math.min(7 * week, daysInYear(year));
	return {
		span: [dayOfYear(year, 7 * week - 6), dayOfYear(year, last)],
		words: text.weekOfYear(year, week)
	};
}

function nthDay(year: number, n: number): Told {
	if (n > daysInYear(year)) return { impossible: text.faults.shortYear(year) };
	return oneDay(dayOfYear(year, n));
}

/** Within a month. Only a day or a week can come without a year. */
function inMonth(year: number | null, month: number, { day, week }: Values): Told {
	if (day !== undefined) {
		const longest = daysInMonth(month, year);
		if (day > longest)
			return { impossible: text.faults.shortMonth(text.inMonth(year, month), longest) };
		if (year !== null) return oneDay(dayNumber(year, month, day));
		return { span: null, words: text.day(null, month, day) };
	}
	if (week !== undefined) {
		const span = year === null ? null : weekOfMonth(year, month, week);
		return { span, words: text.weekOfMonth(year, month, week) };
	}
	const own = year as number;
	return {
		span: [dayNumber(own, month, 1), dayNumber(own, month, daysInMonth(month, own))],
		words: text.inMonth(own, month)
	};
}

/**
 * The days that a combination of values names. The year is null only where the code has none and nothing else gives it,
 * and then there is a month.
 */
export function tell(values: Values, year: number | null, dayZero: number): Told {
	if (values.day_count !== undefined) return oneDay(dayZero + values.day_count);
	if (values.month !== undefined) return inMonth(year, values.month, values);
	const own = year as number;
	if (values.day_of_year !== undefined) return nthDay(own, values.day_of_year);
	if (values.day_of_run !== undefined) return oneDay(dayOfYear(own - 1, values.day_of_run));
	if (values.week_of_year !== undefined) return weekOfYear(own, values.week_of_year);
	return { span: [dayOfYear(own, 1), dayOfYear(own, daysInYear(own))], words: String(own) };
}

const LISTED = 3;

interface Named {
	readonly span: DaySpan | null;
	readonly words: string;
}

/** Two or three by name, more as a span. */
function wordsOf(told: readonly Named[]): string {
	const names = [...new Set(told.map(({ words }) => words))];
	return names.length <= LISTED
		? text.or(names)
		: text.between(names[0] as string, names[names.length - 1] as string);
}

/** One meaning of combinations that differ only in what is unread: the hull of their days. */
export function together(told: readonly Named[], year: number | null, usual: boolean): DateMeaning {
	if (year === null) return { earliest: null, latest: null, words: wordsOf(told), year, usual };
	const spans = told.map(({ span }) => span as DaySpan);
	const earliest = Math.min(...spans.map(([from]) => from));
	const latest = Math.max(...spans.map(([, to]) => to));
	const sorted = [...told].sort((a, b) => (a.span as DaySpan)[0] - (b.span as DaySpan)[0]);
	return {
		earliest: isoDay(earliest),
		latest: isoDay(latest),
		words: wordsOf(sorted),
		year: calendarDay(earliest).year,
		usual
	};
}
