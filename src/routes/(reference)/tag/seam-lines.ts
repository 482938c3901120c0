/** What tag and serial say against each other, as the seam shows it. */
import { RESULTS, type Result } from '$lib/components/result/result';
import { stampCells } from '$lib/format/stamp';
import { tagText } from '$lib/text/en/tag';
import type { TallyAttribute, TallyLine, TallySide, Weight } from '$lib/types';

export interface SeamSide {
	readonly label: string;
	readonly cells: readonly string[];
	readonly meaning: string;
}
export interface SeamLine {
	readonly key: string;
	readonly result: Result;
	readonly paper: SeamSide;
	readonly metal: SeamSide;
	readonly reason: string;
	/** "Middling. Rests on two firm rows." */
	readonly ground: string;
}
export interface Seam {
	readonly summary: string;
	/** Those that need a second look, the heaviest first in each group. */
	readonly open: readonly SeamLine[];
	readonly tallies: readonly SeamLine[];
	/** What only one of the two says, in a sentence; empty for nothing. */
	readonly lonely: string;
}

const WEIGHTS: readonly Weight[] = ['heavy', 'middling', 'light'];

const sideView = (side: TallySide, attribute: TallyAttribute): SeamSide => ({
	// A form as a whole has no code, and its title stands in place of a label.
	label: side.code === '' ? tagText.seam.attribute(attribute) : side.label,
	cells: stampCells(side.code),
	meaning: side.meanings.join(', ')
});

/** @param serial index of the serial among the stamps */
function lineView(line: TallyLine, right: TallySide, serial: number, index: number): SeamLine {
	const [paper, metal] = right.stamp === serial ? [right, line.left] : [line.left, right];
	return {
		key: `${line.attribute}-${index}`,
		result: line.result,
		paper: sideView(paper, line.attribute),
		metal: sideView(metal, line.attribute),
		reason: line.reason,
		ground: tagText.seam.weight(tagText.seam.weights[line.weight], line.ground)
	};
}

/** Lines by result and weight; what one stamp alone says is named and no more. */
export function seamOf(lines: readonly TallyLine[], serial: number): Seam {
	const sorted = [...lines].sort(
		(a, b) =>
			RESULTS.indexOf(a.result) - RESULTS.indexOf(b.result) ||
			WEIGHTS.indexOf(a.weight) - WEIGHTS.indexOf(b.weight)
	);
	const views = sorted.flatMap((line, index) =>
		line.right === null ? [] : [lineView(line, line.right, serial, index)]
	);
	const of = (result: Result) => views.filter((view) => view.result === result);
	const lonely = sorted.filter(({ right }) => right === null).map(({ left }) => left.label);
	const not = of('does_not_tally');
	const untold = of('cannot_be_told');
	const tallies = of('tallies');
	return {
		summary: tagText.seam.counts(not.length, untold.length, tallies.length),
		open: [...not, ...untold],
		tallies,
		lonely: lonely.length === 0 ? '' : tagText.seam.lonely([...new Set(lonely)])
	};
}
