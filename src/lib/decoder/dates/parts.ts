/** The parts that date codes are made of. */
import { datesText as text } from '../../text/en/dates';
import { LETTERS } from '../engine/characters';
import type { DatePart, PartName } from './format';

/** The years that one figure or a cycle of letters can return in. */
const FIRST = 1955;
const LAST = 1989;

const padded = (value: number, length: number): string => String(value).padStart(length, '0');

function part(
	name: PartName,
	label: string,
	codes: Iterable<readonly [string, readonly number[]]>,
	skipped = ''
): DatePart {
	const map = new Map(codes);
	const lengths = [...new Set([...map.keys()].map((code) => code.length))].sort((a, b) => a - b);
	return { name, label, codes: map, lengths, skipped };
}

const numbered = (from: number, to: number, codeOf: (value: number) => readonly string[]) =>
	Array.from({ length: to - from + 1 }, (_, index) => from + index).flatMap((value) =>
		codeOf(value).map((code) => [code, [value]] as const)
	);

/** Month letters over which sources differ: from the tenth on, I was left out or it was not. */
export const monthLettersInDoubt = (): DatePart =>
	part(
		'month',
		text.parts.monthLetter,
		[...'ABCDEFGHIJKLM'].map((letter, index): readonly [string, readonly number[]] => [
			letter,
			index < 9 ? [index + 1] : index === 12 ? [12] : [index, index + 1]
		])
	);

/** Letters or figures in the order of the months, beginning with `first`; what stands past twelve is of a second year. */
export function monthLetters(letters: string, first = 1): DatePart {
	const last = letters.slice(-1);
	const skipped = [...LETTERS].filter((letter) => letter < last && !letters.includes(letter));
	return part(
		'month',
		text.parts.monthLetter,
		[...letters].map((letter, index) => [letter, [first + index]] as const),
		skipped.join('')
	);
}

/** A code with every choice of I for 1 and O for nought. */
function likened(code: string): readonly string[] {
	return [...code].reduce<readonly string[]>(
		(codes, figure) =>
			codes.flatMap((head) => {
				const letter = figure === '1' ? 'I' : figure === '0' ? 'O' : null;
				return letter === null ? [head + figure] : [head + figure, head + letter];
			}),
		['']
	);
}

/** 01–12. */
export const monthFigures = (): DatePart =>
	part(
		'month',
		text.parts.month,
		numbered(1, 12, (value) => [padded(value, 2)])
	);

/** 01–12 and 01–31 as engine plants struck them: a one could be a roman I, and no letter stands here, so that O is a nought. */
export const struckMonthAndDay = (): readonly [DatePart, DatePart] => [
	part(
		'month',
		text.parts.month,
		numbered(1, 12, (value) => likened(padded(value, 2)))
	),
	part(
		'day',
		text.parts.day,
		numbered(1, 31, (value) => likened(padded(value, 2)))
	)
];

/** 1–12 without a leading nought, or with one. */
export const monthNumber = (): DatePart =>
	part(
		'month',
		text.parts.month,
		numbered(1, 12, (value) => (value < 10 ? [String(value), padded(value, 2)] : [String(value)]))
	);

/** 01–31. */
export const dayFigures = (): DatePart =>
	part(
		'day',
		text.parts.day,
		numbered(1, 31, (value) => [padded(value, 2)])
	);

/** 1–31 without a leading nought, or with one. */
export const dayNumberPart = (): DatePart =>
	part(
		'day',
		text.parts.day,
		numbered(1, 31, (value) => (value < 10 ? [String(value), padded(value, 2)] : [String(value)]))
	);

/** A–E, or 1–5, for the week of the month. */
export const weekCodes = (codes: string): DatePart =>
	part(
		'week',
		text.parts.week,
		[...codes].map((code, index) => [code, [index + 1]] as const)
	);

/** 1–53, one figure or two. */
export const weekOfYearPart = (): DatePart =>
	part(
		'week_of_year',
		text.parts.weekOfYear,
		numbered(1, 53, (value) => (value < 10 ? [String(value), padded(value, 2)] : [String(value)]))
	);

/** 001–366. */
export const dayOfYearPart = (): DatePart =>
	part(
		'day_of_year',
		text.parts.dayOfYear,
		numbered(1, 366, (value) => [padded(value, 3)])
	);

/** 001–699, counted from 1 January of the year before the model year. */
export const dayOfRunPart = (): DatePart =>
	part(
		'day_of_run',
		text.parts.dayOfRun,
		numbered(1, 699, (value) => [padded(value, 3)])
	);

/** 0000–9999. */
export const dayCountPart = (): DatePart =>
	part(
		'day_count',
		text.parts.dayCount,
		numbered(0, 9999, (value) => [padded(value, 4)])
	);

const yearsEach = (first: number, step: number): number[] => {
	const years: number[] = [];
	for (let year = first; year <= LAST; year += step) if (year >= FIRST) years.push(year);
	return years;
};
const lastFigures = (): [string, number[]][] =>
	Array.from({ length: 10 }, (_, figure) => [String(figure), yearsEach(1950 + figure, 10)]);
const twoFigures = (): [string, number[]][] =>
	numbered(FIRST, LAST, (year) => [padded(year % 100, 2)]).map(([code, years]) => [
		code,
		[...years]
	]);

/** The last figure of the year. */
export const yearFigure = (): DatePart => part('year', text.parts.yearFigure, lastFigures());

/** The last figure of the model year. */
export const modelYearFigure = (): DatePart =>
	part('model_year', text.parts.modelYearFigure, lastFigures());

/** The last two figures of the model year. */
export const modelYearFigures = (): DatePart =>
	part('model_year', text.parts.modelYearFigures, twoFigures());

/** The last two figures of the year. */
export const yearFigures = (): DatePart => part('year', text.parts.yearFigures, twoFigures());

/** The last figure of the year, or the last two. */
export const yearFigureOrTwo = (): DatePart =>
	part('year', text.parts.yearFigure, [...lastFigures(), ...twoFigures()]);

/** Letters that return in a cycle: the first stands for `first`, the next for the year after. */
export const yearLetters = (letters: string, first: number): DatePart =>
	part(
		'year',
		text.parts.yearLetter,
		[...letters].map((letter, index) => [letter, yearsEach(first + index, letters.length)])
	);

/** Codes that name years in full. */
export const yearCodes = (label: string, codes: Iterable<readonly [string, number]>): DatePart =>
	part(
		'year',
		label,
		[...codes].map(([code, year]) => [code, [year]])
	);

/** What is no part of the date; an empty code means that it may be missing. */
export const otherPart = (label: string, codes: Iterable<string>): DatePart =>
	part(
		'other',
		label,
		[...codes].map((code) => [code, [0]] as const)
	);
