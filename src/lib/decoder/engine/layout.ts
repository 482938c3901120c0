/** What a layout module declares. The engine knows no maker; everything about one stands here. */
import type { FieldName, Maker, StampKind, TableName } from '../../types';
import type { Cell } from './characters';

/** First and last place, 1-based and inclusive. */
export type Span = readonly [from: number, to: number];

/** How a field's characters get their meaning. */
export type FieldReads =
	/**
	 * Looked up. `parts` are the places that make the code, joined by `/` when there are several; the field's own when
	 * left out. `otherwise` are asked when those find no row.
	 */
	| {
			readonly by: 'table';
			readonly table: TableName;
			readonly parts?: readonly Span[];
			readonly otherwise?: readonly Span[];
	  }
	/** The model year, by the layout's `years`. */
	| { readonly by: 'year' }
	/** A running number, held against first and last numbers in table `sequence`. */
	| { readonly by: 'sequence' }
	/** Calculated over all seventeen characters. */
	| { readonly by: 'check_digit' }
	/** The maker decides, and we have no table. */
	| { readonly by: 'unknown' };

export interface PrimaryField {
	readonly name: FieldName;
	readonly label: string;
	readonly from: number;
	readonly to: number;
	/** Characters that may stand here; one entry for all places, or one a place. */
	readonly chars: string | readonly string[];
	readonly reads: FieldReads;
}

export interface DerivedField {
	readonly name: FieldName;
	readonly label: string;
	readonly parents: readonly FieldName[];
	readonly reads:
		| { readonly by: 'value'; readonly key: 'line' | 'series' | 'body_style' | 'cylinders' }
		| {
				readonly by: 'table';
				readonly table: TableName;
				readonly parts: readonly Span[];
				readonly otherwise?: undefined;
		  };
	/** A derived field without a row is left out of the reading unless this says otherwise. */
	readonly always?: boolean;
}

export interface Layout {
	readonly id: string;
	readonly kind: StampKind;
	readonly maker: Maker;
	/** "General Motors, 13 characters, 1965–71". */
	readonly title: string;
	readonly years: readonly [from: number, to: number];
	readonly length: number;
	/** Where the structure is published, in a sentence; its row in table `layout` carries the citations. */
	readonly source: string;
	readonly fields: readonly PrimaryField[];
	readonly derived: readonly DerivedField[];
	/** The order in which fields are looked up, where it is not that of the places. */
	readonly lookFirst?: readonly FieldName[];
	/** The field whose row names the division. */
	readonly divisionFrom: FieldName;
	/** The field whose row names the line. */
	readonly lineFrom: FieldName;
	/** Model years that a text may stand for; null for "the standard leaves it open". Unread places give more years, never fewer. */
	readonly yearsOf: (cells: readonly Cell[]) => readonly (number | null)[];
	/**
	 * Whether the division is inferred from the body rather than struck. Then a running number outside the run of every
	 * division named brings in the divisions whose run holds it.
	 */
	readonly divisionInferred?: boolean;
	/** Whether a beginning without its year is read once, with the year open: nothing in it turns on the year. */
	readonly beginsWithoutYear?: boolean;
	/** A gap of the tables that a line without a row may fall into, in words. */
	readonly gap?: string;
	/** Why the year is what it is, where the layout has more to say than "by the layout". */
	readonly yearDetail?: (cells: readonly Cell[]) => string;
	/** Published examples, real patterns with masked or invented sequence numbers: one that is read, one that is refused. */
	readonly examples: { readonly good: string; readonly bad: string };
}

/** Years by the character in one place. */
export function yearsByCharacter(
	place: number,
	years: Readonly<Record<string, readonly number[]>>
): Layout['yearsOf'] {
	const entries = Object.entries(years);
	const all = entries.flatMap(([, list]) => list);
	const unique = [...new Set(all)].sort((a, b) => a - b);
	return (cells) => {
		const cell = cells[place - 1] as Cell;
		const exact = years[cell];
		if (exact !== undefined) return exact;
		if (cell === '?') return unique;
		return unique.filter((year) => [...cell].some((character) => years[character]?.includes(year)));
	};
}

/** Last digits of a span of years: 1965–71 gives {5: [1965], … 1: [1971]}. */
export function lastDigits(from: number, to: number): Record<string, number[]> {
	const years: Record<string, number[]> = {};
	for (let year = from; year <= to; year += 1) (years[String(year % 10)] ??= []).push(year);
	return years;
}
