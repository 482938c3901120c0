/** One place of a stamp: its character, `?` when it cannot be read, several when it could be any of them. */
export type StampCell = string;

/** Cells that belong together, with their first and last place (1-based, inclusive). */
export interface CellSpan {
	readonly from: number;
	readonly to: number;
}

/**
 * Cells of a normalised text.
 * @example stampCells('RM2?[38]') // ['R', 'M', '2', '?', '38']
 */
export function stampCells(normalised: string): StampCell[] {
	return [...normalised.matchAll(/\[([^\]]+)\]|[^[\]]/g)].map((match) => match[1] ?? match[0]);
}

const lengthOf = (spans: readonly CellSpan[]): number =>
	spans.reduce((sum, span) => sum + span.to - span.from + 1, 0);

/** Most cells that stand in one line on a phone. */
export const PHONE_LINE = 8;

/**
 * Breaks a stamp into lines for a narrow screen, at the seams of its format: 3 + 6 + 8 for 17 characters,
 * otherwise two lines as even as the seams allow (7 + 6 for 13, 5 + 6 for 11).
 */
export function phoneLines<Span extends CellSpan>(spans: readonly Span[]): Span[][] {
	const last = spans.at(-1)?.to ?? 0;
	if (last <= PHONE_LINE) return [[...spans]];
	if (last === 17) {
		const lines = [
			spans.filter((span) => span.to <= 3),
			spans.filter((span) => span.from > 3 && span.to <= 9),
			spans.filter((span) => span.from > 9)
		];
		if (lengthOf(lines.flat()) === last) return lines.filter((line) => line.length > 0);
	}
	const cuts = spans.slice(0, -1).map((_, index) => index + 1);
	const longest = (cut: number): number =>
		Math.max(lengthOf(spans.slice(0, cut)), lengthOf(spans.slice(cut)));
	const cut = cuts.reduce<number | undefined>(
		(best, candidate) =>
			best === undefined || longest(candidate) <= longest(best) ? candidate : best,
		undefined
	);
	if (cut === undefined) return [[...spans]];
	return [spans.slice(0, cut), spans.slice(cut)];
}

/** "character 5", "characters 3–4". */
export const placesInWords = ({ from, to }: CellSpan): string =>
	from === to ? `character ${from}` : `characters ${from}–${to}`;
