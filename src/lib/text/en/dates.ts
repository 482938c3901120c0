/** Every word that dates are read with. */
import type { Dated } from '../../types';
import { decoderText } from './decoder';

const MONTHS = [
	'January',
	'February',
	'March',
	'April',
	'May',
	'June',
	'July',
	'August',
	'September',
	'October',
	'November',
	'December'
] as const;
const ORDINALS = ['first', 'second', 'third', 'fourth', 'fifth'] as const;

const month = (number: number): string => MONTHS[number - 1] as string;
const withYear = (words: string, year: number | null): string =>
	year === null ? words : `${words} ${year}`;
const or = (parts: readonly string[]): string =>
	decoderText.listed(parts).replace(/ and (?!.* and )/, ' or ');

export const datesText = {
	month,
	or,

	/** What happened on the day. */
	dated: {
		cast: 'Cast',
		part_made: 'Made',
		unit_assembled: 'Assembled',
		designed: 'Designed',
		body_finished: 'Body finished or tag issued',
		scheduled: 'Scheduled',
		car_finished: 'Car finished',
		label_month: 'Month of manufacture'
	} satisfies Record<Dated, string>,

	parts: {
		month: 'month',
		monthLetter: 'month letter',
		day: 'day',
		week: 'week of the month',
		weekOfYear: 'week of the year',
		dayOfYear: 'day of the year',
		dayCount: 'day count',
		yearFigure: 'year figure',
		yearFigures: 'year figures',
		yearLetter: 'year letter',
		plantLetter: 'plant letter'
	},

	day: (year: number | null, number: number, day: number): string =>
		withYear(`${day} ${month(number)}`, year),
	weekOfMonth: (year: number | null, number: number, week: number): string =>
		withYear(`${ORDINALS[week - 1]} week of ${month(number)}`, year),
	inMonth: (year: number | null, number: number): string => withYear(month(number), year),
	weekOfYear: (year: number | null, week: number): string => withYear(`week ${week}`, year),
	dayOfYear: (n: number): string => `day ${n} of the year`,
	between: (from: string, to: string): string => `between ${from} and ${to}`,

	faults: {
		shape: (form: string) => `A date of this form is written: ${form}.`,
		noSuchCode: (code: string, label: string) => `${code} is no ${label} of this form.`,
		skipped: (letter: string, label: string) =>
			`${letter} was left out as ${label}: it is taken for a figure or another letter too easily.`,
		shortMonth: (words: string, days: number) => `${words} has ${days} days.`,
		shortYear: (year: number) => `${year} has 365 days.`,
		tooOpen: 'Too much is unread: the date could be almost any.'
	},

	remarks: {
		fisherWeek:
			'It dates the body or its tag, not the car. Which days a week holds is common practice, no source.'
	},

	/** Where a date leaves several intervals open. */
	several: (words: readonly string[]): string => or(words),

	detail: {
		decadeByCar: (year: number) =>
			`One figure or letter returns every ten or twelve years: taken as ${year}, by the car’s model year.`,
		decadeOpen:
			'One figure or letter returns every ten or twelve years. The casting or part number, or the car’s year, settles it.',
		yearOpen: 'It carries no year. The car’s model year settles it.',
		yearByCar: 'It carries no year: the calendar year is taken from the car’s model year.',
		long: 'The later year holds only where the model year ran long, the earlier only where it began early.'
	}
} as const;
