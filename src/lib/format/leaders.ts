/** A group of cells above and the column of its field below. */
export interface ColumnNeed {
	/** Cells in the group. */
	readonly cells: number;
	/** Least width of its column in px. */
	readonly width: number;
}

export interface LeaderLayout {
	/** Width of one cell and of the gap between groups, px. */
	readonly cell: number;
	readonly gap: number;
	/** Middle of each bracket, px from the left edge. */
	readonly middles: readonly number[];
	/** Left rule of each column, px from the left edge; multiples of 10. */
	readonly columns: readonly number[];
	/** Width of the stamp, px. */
	readonly stamp: number;
}

/** Width of the full page, px. */
export const BENCH = 1280;
const STEP = 10;
const down = (value: number): number => Math.floor(value / STEP) * STEP;

/** Largest cell whose stamp fits the page. Widths and gaps keep the middles on the grid of 10. */
const SIZES = [
	[80, 40],
	[80, 20],
	[60, 40],
	[60, 20],
	[60, 10],
	[40, 20],
	[40, 10]
] as const;

/** Pushes each column right until it clears the one before, then back until the last one ends on the page. */
function settle(wanted: readonly number[], widths: readonly number[]): number[] {
	const columns = [...wanted];
	for (let i = 1; i < columns.length; i += 1)
		columns[i] = Math.max(columns[i]!, columns[i - 1]! + widths[i - 1]!);
	for (let i = columns.length - 1; i >= 0; i -= 1) {
		const limit = (columns[i + 1] ?? BENCH) - widths[i]!;
		columns[i] = Math.min(columns[i]!, limit);
	}
	return columns;
}

/** Gives neighbors that lean right the same slant where the widths allow, so that their leaders run parallel. */
function parallel(middles: readonly number[], columns: number[], widths: readonly number[]): void {
	const slant = (i: number): number => columns[i]! - middles[i]!;
	for (let i = columns.length - 2; i > 0; i -= 1) {
		const next = slant(i + 1);
		if (slant(i) <= 0 || next <= slant(i)) continue;
		const moved = middles[i]! + next;
		if (moved + widths[i]! <= columns[i + 1]!) columns[i] = moved;
	}
}

/**
 * Where cells, brackets and columns stand on the full page. Order is kept, so no leaders cross; columns stand
 * straight under their bracket where the widths allow, and the rest lean alike. The first column is the page's edge.
 */
export function leaderLayout(needs: readonly ColumnNeed[]): LeaderLayout {
	const cells = needs.reduce((sum, need) => sum + need.cells, 0);
	const widthOf = ([cell, gap]: readonly [number, number]): number =>
		cells * cell + (needs.length - 1) * gap;
	const size = SIZES.find((candidate) => widthOf(candidate) <= BENCH) ?? SIZES[SIZES.length - 1]!;
	const [cell, gap] = size;
	let left = 0;
	const middles = needs.map((need) => {
		const middle = left + (need.cells * cell) / 2;
		left += need.cells * cell + gap;
		return middle;
	});
	const total = needs.reduce((sum, need) => sum + need.width, 0);
	const squeeze = total > BENCH ? BENCH / total : 1;
	const widths = needs.map((need) => down(need.width * squeeze));
	const wanted = middles.map((middle, index) => (index === 0 ? 0 : down(middle)));
	const columns = settle(wanted, widths);
	parallel(wanted, columns, widths);
	return { cell, gap, middles, columns, stamp: widthOf(size) };
}

/** Height of the drawing between brackets and columns, px. */
export const LEADER_HEIGHT = 56;

/** Path of one leader: 14 px down, one oblique, then down as the left rule of its field. */
export function leaderPath(middle: number, column: number): string {
	const from = middle + 0.5;
	const to = column + 0.5;
	return from === to ? `M${from} 4V${LEADER_HEIGHT}` : `M${from} 4V14L${to} 42V${LEADER_HEIGHT}`;
}
