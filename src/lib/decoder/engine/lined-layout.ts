/** What a layout module declares for a stamp of several fields whose lengths and dividers vary: body tags, pads, castings. */
import type { FieldName, Maker, RowValues, TableName } from '../../types';
import type { DateFormatId } from '../dates';

/** The kinds of stamp that are read line by line. */
export type LinedKind = 'body_tag' | 'engine' | 'casting';

/** First and last place, 1-based and inclusive, counted within the field; -1 is the last place, -2 the one before. */
export type Places = readonly [from: number, to: number];

/**
 * What a field looks like. Dividers typed within it are passed over, and it may end inside a token:
 * `ST70-13637` and `ST 70 13637` match alike; a match that keeps to the dividers goes before one that does not.
 */
export interface TokenShape {
	/** Characters that may stand here: one entry for all places, or one a place (then it sets the length). */
	readonly chars: string | readonly string[];
	/** How many characters, or the fewest and the most. Left out where `chars` has an entry a place. */
	readonly length?: number | readonly [from: number, to: number];
	/** With an entry a place: how many of them are always there, where the last ones may be left out. */
	readonly fewest?: number;
	/** Whether the field must begin and end at a divider: for single characters among longer codes. */
	readonly whole?: true;
}

/** What else the characters of a field say: each a field of its own, derived from it, left out without a row. */
export type AlsoReads = { readonly name: FieldName; readonly label: string } & (
	| /** A fact of the row that the field found. */
	  { readonly by: 'value'; readonly key: keyof RowValues & string }
	  /** Another table under some of the places. */
	| { readonly by: 'table'; readonly table: TableName; readonly parts?: readonly Places[] }
);

/** How a field's characters get their meaning. */
export type LineReads =
	/**
	 * Looked up. `parts` are the places that make the code, joined by `/` when there are several; all of them when left
	 * out. `otherwise` are asked, one list after the other, when those find no row.
	 */
	| {
			readonly by: 'table';
			readonly table: TableName;
			readonly parts?: readonly Places[];
			readonly otherwise?: readonly (readonly Places[])[];
			readonly also?: readonly AlsoReads[];
	  }
	/** A date in a form of `dates/`. */
	| {
			readonly by: 'date';
			readonly format: DateFormatId;
			readonly also?: readonly AlsoReads[];
	  }
	/** The model year, by what is stamped: `{ '70': [1970] }`. */
	| { readonly by: 'year'; readonly years: Readonly<Record<string, readonly number[]>> }
	/**
	 * The car's number, read by serial layouts; its fields become derived ones. `layouts` are ids of `LAYOUTS`; `places`
	 * are the places of that number which stand here, in order, when it is a part of it: [1, 6, 7, 8, 9, 10, 11, 12, 13].
	 */
	| {
			readonly by: 'serial';
			readonly layouts: readonly string[];
			readonly places?: readonly number[];
	  }
	/** A number that stands for itself: body number, order number. */
	| { readonly by: 'number' }
	/** A punched pair, column and figure: the code is `A/5`. */
	| { readonly by: 'columns'; readonly table: TableName }
	/** The maker decides, and we have no table. */
	| { readonly by: 'unknown' };

export interface LineField {
	readonly name: FieldName;
	readonly label: string;
	/** Words printed before it that are no code: ST, TR, PNT. They may be typed or left out. */
	readonly words?: readonly string[];
	/** Words printed after it: BDY, PAINT. */
	readonly wordsAfter?: readonly string[];
	readonly shape: TokenShape;
	/** Whether some plates or plants leave it out. */
	readonly optional?: true;
	/** Whether several may follow each other: option codes. */
	readonly repeats?: true;
	readonly reads: LineReads;
}

/** One line of a stamp, its fields from left to right. */
export interface LineForm {
	/** "Style line", "Trim and paint": stands in problems. */
	readonly label: string;
	readonly optional?: true;
	/** Whether several such lines may follow each other. */
	readonly repeats?: true;
	readonly fields: readonly LineField[];
}

/** A stamp that is read line by line. A plant or a year with another form is a layout of its own. */
export interface LinedLayout {
	/** `gm-fisher-tag-1968`; its row in table `layout` of the maker carries the citations. */
	readonly id: string;
	readonly kind: LinedKind;
	readonly maker: Maker;
	/** "Fisher body tag, 1968–72". */
	readonly title: string;
	readonly years: readonly [from: number, to: number];
	/** Where the form is published, in a sentence. */
	readonly source: string;
	/** The lines, in the order in which they are read. Engine stamps and castings are taken as one line, however typed. */
	readonly lines: readonly LineForm[];
	/** Whether the first of `lines` is the top or the bottom one of the plate. */
	readonly order: 'down' | 'up';
	/** The divisions whose cars carry it; those of the maker when left out. */
	readonly divisions?: readonly string[];
	/** The field whose row names the division, where one does. */
	readonly divisionFrom?: FieldName;
	/** Fields looked up before the others, since these are scoped by what they tell: style, body, plant. */
	readonly lookFirst?: readonly FieldName[];
	/** Published patterns, lines joined by " / ": one that is read without a problem, one that is not. */
	readonly examples: { readonly good: string; readonly bad: string };
}
