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
		dayOfRun: 'day of the run',
		dayCount: 'day count',
		yearFigure: 'year figure',
		yearFigures: 'year figures',
		yearLetter: 'year letter',
		modelYearFigure: 'model year figure',
		modelYearFigures: 'model year figures',
		designYear: 'decade letter and year figure',
		plantLetter: 'plant letter',
		engineLetter: 'engine letter',
		shiftLetter: 'shift letter, if any',
		gearboxLetters: 'letters of the gearbox, if any',
		unitCode: 'code of the unit'
	},

	day: (year: number | null, number: number, day: number): string =>
		withYear(`${day} ${month(number)}`, year),
	weekOfMonth: (year: number | null, number: number, week: number): string =>
		withYear(`${ORDINALS[week - 1]} week of ${month(number)}`, year),
	inMonth: (year: number | null, number: number): string => withYear(month(number), year),
	weekOfYear: (year: number, week: number): string => `week ${week} of ${year}`,
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
			'It dates the body or its tag, not the car. Which days a week holds is common practice, no source.',
		corvetteBody:
			'It dates the body; the car followed days later, and bodies built outside about ten days. The letters of 1970, whose building began in January, may count otherwise.',
		noYear: 'The stamp has no year: the suffix, the partial serial and the casting date settle it.',
		pontiacLetters: 'Sources leave open whether Pontiac left out I: both months are kept.',
		axleLetters: 'Sources differ on whether I was left out: both months are kept.',
		rochesterLetters: 'Whether I was left out is not known: both months are kept. From memory.',
		muncieYear:
			'The figure is the model year of the cars the gearbox was made for; one source reads it as the calendar year.',
		gearboxLetters:
			'The figure is the model year. The month letters are taken to be those of the Muncie gearbox: F, G, I, J, L, N, O and Q left out.',
		turboDays:
			'The three figures count the days from 1 January of the year before the model year: 366 is the next 1 January, or 367 after a leap year.',
		scheduled: 'A scheduled date is a plan: the car may have been built days or weeks from it.',
		dayCount:
			'Four figures count days. That 0001 is 1 August 1961 rests on memory: no dated part was found to check it.',
		weekOfYear: 'Weeks are counted as seven days from 1 January: common practice, no source.',
		weekOfMonth: 'Which days a week of the month holds is common practice, no source.',
		fordPlate:
			'The day scheduled for building. Letters N to Z stand for the second calendar year of a model built for more than twelve months.',
		engineTag: 'The form of the date on the tag is from memory.',
		designYear:
			'The year of the drawing, not of the part: castings were used in later years and other lines.',
		label: 'Month and year of manufacture.',
		amcEngine:
			'The form is from memory. Engines changed by calendar year, so the figure may differ from the car’s model year.',
		glass:
			'Month and year letters of Libbey-Owens-Ford; the letters of the year return every twelve years.'
	},

	nearest: (title: string, message: string) => `${title}. ${message}`,
	noForm: (typed: string) =>
		`${typed} fits none of the date forms that we know. That says nothing against the part.`,
	why: (labels: readonly string[]) => `It fits the form: ${labels.join(', ')}.`,

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
