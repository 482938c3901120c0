import { coverageText as text } from '../text/en/coverage';
// By the file, not by the index: the index brings zod to the browser.
import { MAKER_NAMES, type Maker } from '../types/makers';

/** What the tables have for one make and year; see `reference.coverage`. */
interface CountedYear {
	readonly year: number;
	readonly rows: number;
	readonly supported: number;
}
export interface CountedDivision {
	readonly maker: Maker;
	readonly division: string;
	readonly years: readonly CountedYear[];
}
/** The make and year that a page shows. */
export interface ChosenCell {
	readonly division?: string;
	readonly year?: number;
}

export interface CoverageCellView {
	readonly year: number;
	readonly rows: number;
	/** Percent of the rows that are firm or fair. */
	readonly share: number;
	/** No cars of this make were built for the year. */
	readonly blank: boolean;
	readonly address: string;
	readonly title: string;
	readonly chosen: boolean;
}
export interface CoverageStripView {
	readonly division: string;
	readonly address: string;
	readonly cells: readonly CoverageCellView[];
}
/** Makes of one corporation stand together. */
export interface CoverageGroupView {
	readonly maker: Maker;
	readonly name: string;
	readonly strips: readonly CoverageStripView[];
}

/** The model years that the drawing shows. */
export const COVERAGE_YEARS: readonly number[] = Array.from({ length: 21 }, (_, n) => 1960 + n);

/** Below this a share rests on too little to be drawn as one. */
export const FEW_ROWS = 10;

/** Years within the drawing for which a make built no cars. */
const NO_CARS: Readonly<Record<string, readonly [from: number, to: number]>> = {
	// Gone after 1975, a name of Chrysler's until 1981 (memory).
	Imperial: [1976, 1980]
};

/** Address of the tables of a make, or of a make and year. */
export function coverageAddress(division: string, year?: number): string {
	const parameters = new URLSearchParams({ division });
	if (year !== undefined) parameters.set('year', String(year));
	return `/tables?${parameters}#find`;
}

function cellView(
	division: string,
	year: number,
	counted: CountedYear | undefined,
	chosen: boolean
): CoverageCellView {
	const rows = counted?.rows ?? 0;
	const share = counted && rows > 0 ? Math.round((100 * counted.supported) / rows) : 0;
	const [from, to] = NO_CARS[division] ?? [0, 0];
	return {
		year,
		rows,
		share,
		blank: rows === 0 && from <= year && year <= to,
		address: coverageAddress(division, year),
		title: text.cellTitle(division, year, rows, share),
		chosen
	};
}

/** Makes with rows in the years of the drawing, and those years alone: what a page needs to draw it. */
export const drawnCoverage = (divisions: readonly CountedDivision[]): CountedDivision[] =>
	divisions
		.map(({ maker, division, years }) => ({
			maker,
			division,
			years: years.filter(({ year }) => COVERAGE_YEARS.includes(year))
		}))
		.filter(({ years }) => years.length > 0);

/**
 * Coverage as it is drawn, makes of one corporation together.
 * @param drawn from `drawnCoverage`
 */
export function coverageGroups(
	drawn: readonly CountedDivision[],
	chosen: ChosenCell = {}
): CoverageGroupView[] {
	const strip = ({ division, years }: CountedDivision): CoverageStripView => ({
		division,
		address: coverageAddress(division),
		cells: COVERAGE_YEARS.map((year) =>
			cellView(
				division,
				year,
				years.find((cell) => cell.year === year),
				division === chosen.division && year === chosen.year
			)
		)
	});
	return [...new Set(drawn.map(({ maker }) => maker))].map((maker) => ({
		maker,
		name: MAKER_NAMES[maker],
		strips: drawn.filter((one) => one.maker === maker).map(strip)
	}));
}
