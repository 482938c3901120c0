import { tablesText } from '../text/en/tables';
import type { Citation, ReferenceRow } from '../types';
import { citedAt } from './row-lines';
import { scopeCells } from './scope';
import { valueCells } from './values';

/** A cell that differs between two versions of a row. Empty where a version has nothing there. */
export interface CellChange {
	readonly label: string;
	readonly old: string;
	readonly new: string;
}

/** A version of a row with what it rests on. */
interface Version {
	readonly row: ReferenceRow;
	readonly citations: readonly Citation[];
}
/** Title of a source by its key. */
export type TitleOf = (key: string) => string;

const citationWords = (citation: Citation, titleOf: TitleOf): string => {
	const words = citedAt({ title: titleOf(citation.source), locator: citation.locator });
	return citation.stance === 'against' ? `${words} (${tablesText.row.against})` : words;
};

interface Cell {
	readonly label: string;
	readonly value: string;
}

/** Every cell of a version by a name of its own. */
function cellsOf({ row, citations }: Version, titleOf: TitleOf): Map<string, Cell> {
	const { heads, row: words } = tablesText;
	const cells: (Cell & { name?: string })[] = [
		{ label: heads.code, value: row.code },
		{ label: heads.means, value: row.meaning },
		...scopeCells(row),
		...valueCells(row.values),
		{ label: words.note, value: row.note },
		{
			label: heads.restsOn,
			value: citations.map((citation) => citationWords(citation, titleOf)).join('; ')
		}
	];
	return new Map(cells.map((cell) => [cell.name ?? cell.label, cell]));
}

/** What differs between two versions of a row, cell by cell. */
export function cellChanges(old: Version, now: Version, titleOf: TitleOf): CellChange[] {
	const before = cellsOf(old, titleOf);
	const after = cellsOf(now, titleOf);
	return [...new Map([...before, ...after])]
		.map(([name, { label }]) => ({
			label,
			old: before.get(name)?.value ?? '',
			new: after.get(name)?.value ?? ''
		}))
		.filter((change) => change.old !== change.new);
}
