/** Characters that are taken for one another on a plate. They are offered, never applied. */
import { isRead, type Cell } from './characters';

const GROUPS = ['O0DQ', 'I1L', 'S5', 'B8', 'Z2', 'G6', 'UV'] as const;
const ALIKE = new Map<string, string>();
for (const group of GROUPS)
	for (const character of group)
		ALIKE.set(character, [...group].filter((other) => other !== character).join(''));

/** What a character may be taken for; empty when it has no look-alike. */
export const alike = (character: string): string => ALIKE.get(character) ?? '';

/** The cells with one place, or two, exchanged for look-alikes; those with one come first. */
export function* exchanged(
	cells: readonly Cell[],
	from: number,
	to: number
): Generator<readonly Cell[]> {
	const swaps: { index: number; character: string }[] = [];
	for (let index = from - 1; index < to; index += 1) {
		const cell = cells[index] as Cell;
		if (isRead(cell)) for (const character of alike(cell)) swaps.push({ index, character });
	}
	const apply = (...list: typeof swaps): Cell[] => {
		const next = [...cells];
		for (const { index, character } of list) next[index] = character;
		return next;
	};
	for (const swap of swaps) yield apply(swap);
	for (const [position, first] of swaps.entries())
		for (const second of swaps.slice(position + 1))
			if (second.index !== first.index) yield apply(first, second);
}
