/** What a module of one date format declares, and what a date read in it says. */
import type { Dated, Maker } from '../../types';

/**
 * What a part of a date code stands for. `year` is a calendar year, `model_year` the year of the cars a unit is for.
 * Weeks are 1–5 in a month, 1–53 in a year; `day_of_run` counts from 1 January of the year before the model year,
 * `day_count` from the format's `dayZero`. `other` is no part of the date: a plant, a shift, an engine.
 */
export type PartName =
	| 'month'
	| 'day'
	| 'year'
	| 'model_year'
	| 'week'
	| 'week_of_year'
	| 'day_of_year'
	| 'day_of_run'
	| 'day_count'
	| 'other';

/**
 * One part of a date code. `codes` maps what is stamped to what it can stand for: months 1–12, and 13–24 for the months
 * of a second calendar year; years in full, several where one figure returns each ten years.
 */
export interface DatePart {
	readonly name: PartName;
	/** "month letter", "year figure". */
	readonly label: string;
	readonly codes: ReadonlyMap<string, readonly number[]>;
	/** How many characters a code may have. */
	readonly lengths: readonly number[];
	/** Letters that the maker left out, in order. */
	readonly skipped: string;
}

/** A calendar year that a date without a year can be of. */
export interface YearChoice {
	readonly year: number;
	/** False where it holds only for a model that was built unusually long or early. */
	readonly usual: boolean;
}

export interface DateFormat {
	readonly id: string;
	readonly title: string;
	/** Null where makers share it. */
	readonly maker: Maker | null;
	readonly dates: Dated;
	/** The unit that is dated, where the form itself tells. */
	readonly unit?: 'engine' | 'gearbox' | 'axle';
	/** Where the form is described, in a sentence; its row in table `layout` carries the citations. */
	readonly source: string;
	/** Calendar years in which such dates were stamped, as far as is known. */
	readonly years: readonly [from: number, to: number];
	readonly parts: readonly DatePart[];
	/** Day 0 of a day count, as a day number. */
	readonly dayZero?: number;
	/** Which calendar years a month can be of in a model year, for dates that carry no calendar year. */
	readonly yearsOf?: (month: number, modelYear: number) => readonly YearChoice[];
	/** What one must know beside the day: a limit, a rule of thumb. */
	readonly remark?: string;
	/** One code, the car's model year where it is needed, and the days that it stands for. */
	readonly example: {
		readonly text: string;
		readonly year?: number;
		readonly earliest: string;
		readonly latest: string;
	};
}

/** What is known beside the date. It settles decades and orders meanings; it never makes an impossible date possible. */
export interface DateContext {
	/** Model year of the car. */
	readonly year?: number;
	/** Calendar years that the layout or the casting number allow. */
	readonly years?: readonly [from: number, to: number];
}

/** One interval that a date can stand for. */
export interface DateMeaning {
	/** ISO 8601 days, both counted in; null while the year is open. */
	readonly earliest: string | null;
	readonly latest: string | null;
	/** "12 January 1969", "third week of January". */
	readonly words: string;
	readonly year: number | null;
	/** False where it holds only for a model that was built unusually long or early. */
	readonly usual: boolean;
}

export type DateFault = 'shape' | 'no_such_code' | 'skipped_letter' | 'no_such_day' | 'too_open';

export interface DateReading {
	readonly format: DateFormat;
	/** The likeliest first; several while the decade is open, a character unread or the split in doubt; none when impossible. */
	readonly meanings: readonly DateMeaning[];
	/** Why there is no meaning. */
	readonly fault: { readonly code: DateFault; readonly message: string } | null;
	/** How the year was found or why it is open, and the format's remark; may be empty. */
	readonly detail: string;
}
