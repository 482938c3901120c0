/** Which calendar year a date is of: what the code says, what the car settles, what stays open. */
import type { DateContext, DateFormat, YearChoice } from './format';

/**
 * So many years before the model year a part may be dated, at most, for its decade to be settled by the car: a model
 * year begins in the summer before, and castings sat in stores for a year (common practice).
 */
const BEFORE_CAR = 2;

export interface Years {
	/** The likeliest first; null where the year is open and nothing lists what it can be. */
	readonly choices: readonly (YearChoice | null)[];
	readonly settled: 'stamped' | 'by_car' | 'open';
}

const usual = (year: number): YearChoice => ({ year, usual: true });

/** What lies in a span; all of it when nothing does, because what is known beside a date never removes a reading. */
const within = (years: readonly number[], [from, to]: readonly [number, number]): number[] => {
	const inside = years.filter((year) => year >= from && year <= to);
	return inside.length > 0 ? inside : [...years];
};

/** The calendar year of a year figure, letter or pair of figures. */
export function stampedYears(
	years: readonly number[],
	format: DateFormat,
	context: DateContext
): Years {
	const known = within(within(years, format.years), context.years ?? format.years);
	if (known.length === 1) return { choices: known.map(usual), settled: 'stamped' };
	const { year } = context;
	if (year === undefined) return { choices: known.map(usual), settled: 'open' };
	const near = known.filter((one) => one <= year && one >= year - BEFORE_CAR);
	if (near.length > 0) return { choices: near.map(usual), settled: 'by_car' };
	const byDistance = [...known].sort((a, b) => Math.abs(a - year) - Math.abs(b - year));
	return { choices: byDistance.map(usual), settled: 'open' };
}

/**
 * The calendar years of a month in a model year (common practice): building began in the summer before and ended in
 * July or August. A model year that ran long, as Chevrolet's 1969 did for Camaro and Corvette, reached into the next
 * autumn: that year stays possible.
 */
export function yearsOfModelYear(month: number, modelYear: number): readonly YearChoice[] {
	const before = modelYear - 1;
	if (month <= 6) return [{ year: modelYear, usual: true }];
	if (month === 7)
		return [
			{ year: modelYear, usual: true },
			{ year: before, usual: false }
		];
	return [
		{ year: before, usual: true },
		{ year: modelYear, usual: month === 8 }
	];
}

/** Months are counted from August, 8 to 24 for the second December: a month stands for one year alone. */
export const fromAugust = (month: number, modelYear: number): readonly YearChoice[] => [
	usual(month > 12 ? modelYear : modelYear - 1)
];

/**
 * A model year from August to July, as Chrysler's. A plan may have been a month early or late at either end (common
 * practice).
 */
export function fromAugustToJuly(month: number, modelYear: number): readonly YearChoice[] {
	const own = usual(month >= 8 ? modelYear - 1 : modelYear);
	if (month !== 7 && month !== 8) return [own];
	return [own, { year: month === 7 ? modelYear - 1 : modelYear, usual: false }];
}

/**
 * Months of Ford plates. 13 to 24 are the months of a second calendar year, which is the model year. The first twelve
 * begin in the summer before; a model that came out in spring, as the first Maverick, has them from the spring before,
 * one that came out late has them to its end (common practice).
 */
export function fordYears(month: number, modelYear: number): readonly YearChoice[] {
	if (month > 12) return [usual(modelYear)];
	const [first, second] = month <= 7 ? [modelYear, modelYear - 1] : [modelYear - 1, modelYear];
	return [usual(first), { year: second, usual: month === 8 }];
}

/** The calendar years of a month in the model year that is stamped; a day of the run is counted from that year itself. */
export function modelYears(
	models: readonly number[],
	month: number | undefined,
	format: DateFormat,
	context: DateContext
): Years {
	const { choices, settled } = stampedYears(models, format, context);
	if (month === undefined) return { choices, settled };
	const choose = format.yearsOf ?? yearsOfModelYear;
	return {
		choices: choices.flatMap((model) => choose(month, (model as YearChoice).year)),
		settled
	};
}

/** As many years are named; of more, the day alone says as much. */
const MOST_NAMED = 10;

/** The calendar years of a date without a year. */
export function unstampedYears(month: number, format: DateFormat, context: DateContext): Years {
	const choose = format.yearsOf ?? yearsOfModelYear;
	if (context.year !== undefined)
		return { choices: choose(month, context.year), settled: 'by_car' };
	const [from, to] = context.years ?? [0, MOST_NAMED];
	if (to - from >= MOST_NAMED) return { choices: [null], settled: 'open' };
	return {
		choices: Array.from({ length: to - from + 1 }, (_, index) => usual(from + index)),
		settled: 'open'
	};
}
