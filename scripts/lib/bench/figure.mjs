// A figure that is measured and has a bound.

/**
 * What a module under tests/bench exports: one of these by its named exports, or several as `figures`.
 * @typedef {object} Figure
 * @property {string} name what is measured, as it stands in the README
 * @property {number} bound
 * @property {string} unit after the number; empty for a ratio
 * @property {'at least' | 'at most'} direction
 * @property {() => number | Promise<number>} run measures it
 *
 * @typedef {Omit<Figure, 'run'> & { value: number }} Measured
 */

/** @param {Measured} measured @returns {boolean} */
export const holds = ({ value, bound, direction }) =>
	Number.isFinite(value) && (direction === 'at least' ? value >= bound : value <= bound);

/** @param {number} value @returns {string} three digits that count, thousands grouped */
export const shown = (value) =>
	Math.abs(value) >= 100
		? Math.round(value).toLocaleString('en-US')
		: Number(value.toPrecision(3)).toString();

/** @param {number} value @param {string} unit */
const withUnit = (value, unit) => `${shown(value)}${unit && ` ${unit}`}`;

const HEAD = ['Figure', 'Measured', 'Bound', 'Holds'];

/**
 * The figures as a Markdown table, aligned so that it reads in a terminal too.
 * @param {Measured[]} figures
 */
export function tableOf(figures) {
	const rows = figures.map((figure) => [
		figure.name,
		withUnit(figure.value, figure.unit),
		`${figure.direction} ${withUnit(figure.bound, figure.unit)}`,
		holds(figure) ? 'yes' : '**no**'
	]);
	const widths = HEAD.map((title, column) =>
		Math.max(title.length, ...rows.map((row) => row[column]?.length ?? 0))
	);
	const line = (/** @type {string[]} */ cells) =>
		`| ${cells.map((cell, column) => cell.padEnd(widths[column] ?? 0)).join(' | ')} |`;
	const rule = line(widths.map((width) => '-'.repeat(width)));
	return [line(HEAD), rule, ...rows.map(line)].join('\n');
}

const BEGIN = '<!-- bench:begin -->';
const END = '<!-- bench:end -->';

/**
 * A text with the table between its two marks.
 * @param {string} text @param {string} table
 * @throws {Error} the marks are not there
 */
export function withTable(text, table) {
	const [from, to] = [text.indexOf(BEGIN), text.indexOf(END)];
	if (from < 0 || to < from) throw new Error(`The README has no ${BEGIN} and ${END}.`);
	return `${text.slice(0, from + BEGIN.length)}\n\n${table}\n\n${text.slice(to)}`;
}
