import { CHECK_DIGIT_VALUES, CHECK_DIGIT_WEIGHTS } from '$lib/decoder';

/** The check digit of a 17-character number, place by place, as one would work it by hand. */
export interface CheckDigitWork {
	readonly places: readonly {
		readonly character: string;
		readonly value: number;
		readonly weight: number;
		readonly product: number;
	}[];
	readonly sum: number;
	/** Whole times 11, and what is left over. */
	readonly quotient: number;
	readonly rest: number;
	/** What the rest is written as: a figure, or X for ten. */
	readonly digit: string;
	/** What stands in place 9. */
	readonly stands: string;
}

/**
 * The work of a check digit; null unless all seventeen characters are read and of those that have a value.
 * Place 9 weighs nothing. Source of values and weights: 49 CFR 565.15.
 */
export function checkDigitWork(cells: readonly string[]): CheckDigitWork | null {
	if (cells.length !== CHECK_DIGIT_WEIGHTS.length) return null;
	const places = cells.flatMap((character, index) => {
		const value = CHECK_DIGIT_VALUES.get(character);
		const weight = CHECK_DIGIT_WEIGHTS[index] ?? 0;
		return value === undefined ? [] : [{ character, value, weight, product: value * weight }];
	});
	if (places.length !== cells.length) return null;
	const sum = places.reduce((total, { product }) => total + product, 0);
	const rest = sum % 11;
	return {
		places,
		sum,
		quotient: (sum - rest) / 11,
		rest,
		digit: rest === 10 ? 'X' : String(rest),
		stands: cells[8] ?? ''
	};
}
