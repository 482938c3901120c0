/** What the page of paint codes shows for an address. */
import { readyOptions } from '$lib/components/form/ready-options';
import { compareRows, type CompiledRow, type TableSet } from '$lib/decoder';
import { rowAddress, sourceAddress } from '$lib/format/addresses';
import { chipTones } from '$lib/format/paint-chip';
import { scopeWords } from '$lib/format/scope';
import { swatchOf } from '$lib/format/values';
import { yearSpan } from '$lib/format/years';
import { current, searchRows, tableOf } from '$lib/server/reference';
import { paintText as text } from '$lib/text/en/paint';
import { DIVISIONS, MAKER_NAMES, MAKERS, type Maker } from '$lib/types';
import { readFilters } from '../tables/filters';

export interface PaintYear {
	readonly year: number;
	readonly codes: number;
	readonly address: string;
}
/** A make with the model years for which it has paint codes. */
export interface PaintMake {
	readonly division: string;
	readonly years: readonly PaintYear[];
}

const addressOf = (division: string, year: number): string =>
	`/paint?division=${encodeURIComponent(division)}&year=${year}`;

const holdsFor = (division: string) => (row: CompiledRow) =>
	row.division.length === 0 || row.division.includes(division);

function yearsOf(rows: readonly CompiledRow[], division: string): PaintYear[] {
	const codes = new Map<number, Set<string>>();
	for (const row of rows.filter(holdsFor(division)))
		if (row.years_from !== null && row.years_to !== null)
			for (let year = row.years_from; year <= row.years_to; year += 1)
				codes.set(year, (codes.get(year) ?? new Set()).add(row.code));
	return [...codes]
		.sort(([a], [b]) => a - b)
		.map(([year, own]) => ({ year, codes: own.size, address: addressOf(division, year) }));
}

/** One entry for each year from the first of all to the last; those without codes have 0. */
function spread(own: readonly PaintYear[], all: readonly number[]): PaintYear[] {
	const [first = 0] = all;
	const length = (all.at(-1) ?? first - 1) - first + 1;
	return Array.from({ length }, (_, offset) => {
		const year = first + offset;
		return own.find((one) => one.year === year) ?? { year, codes: 0, address: '' };
	});
}

/** An edition's makes are found once; the page is asked for more often than editions are made. */
const known = new WeakMap<TableSet, readonly PaintMake[]>();

function makesOf(tables: TableSet): readonly PaintMake[] {
	const found = known.get(tables);
	if (found) return found;
	const makes = MAKERS.flatMap((maker: Maker) => {
		const rows = tableOf(tables, maker, 'paint')?.rows ?? [];
		return DIVISIONS[maker].map((division) => ({ division, years: yearsOf(rows, division) }));
	}).filter(({ years }) => years.length > 0);
	known.set(tables, makes);
	return makes;
}

/** The works that rows rest on, in the order of the rows, each once. */
function sourcesOf(rows: readonly CompiledRow[]) {
	const titles = new Map(
		rows.flatMap(({ sources }) => sources.map(({ key, title }) => [key, title]))
	);
	return [...titles].map(([key, title], index) => ({
		key,
		title,
		number: index + 1,
		address: sourceAddress(key)
	}));
}

/** Where a row holds, when that is less than the make. */
const narrowed = (row: CompiledRow): string =>
	row.line.length + row.body.length + row.plant.length + row.market.length === 0
		? ''
		: scopeWords({ ...row, division: [row.division[0] ?? MAKER_NAMES[row.maker]] })
				.split('; ')
				.slice(1)
				.join('; ');

/** In the order in which the keys first come. */
function grouped(
	rows: readonly CompiledRow[],
	keyOf: (row: CompiledRow) => string
): Map<string, CompiledRow[]> {
	const groups = new Map<string, CompiledRow[]>();
	for (const row of rows) {
		const own = groups.get(keyOf(row));
		if (own === undefined) groups.set(keyOf(row), [row]);
		else own.push(row);
	}
	return groups;
}

/** Rows in the order of the codes, and under each code by name: one chip for each name that a code had. */
function chipsOf(rows: readonly CompiledRow[], sources: ReturnType<typeof sourcesOf>) {
	const byCode = grouped(rows, ({ code }) => code);
	return [...byCode].map(([code, own]) => ({
		code,
		names: [...grouped(own, ({ meaning }) => meaning)].map(([name, named]) => {
			const measured = named.map(({ values }) => swatchOf(values)).find((hex) => hex !== null);
			return {
				name,
				tones: measured === undefined ? chipTones(name) : [measured],
				rows: named.map((row) => ({
					key: row.row_key,
					scope: narrowed(row),
					years: yearSpan(row.years_from, row.years_to),
					strength: row.strength,
					sources: sources.filter(({ key }) => row.sources.some((cited) => cited.key === key)),
					address: rowAddress(row.row_key)
				}))
			};
		})
	}));
}

export type CodeChips = ReturnType<typeof chipsOf>[number];

/** The page: the form, and either the chips of a make and year or the years that have some. */
export function paintPage(parameters: URLSearchParams) {
	const { asked, filters, faults } = readFilters(parameters);
	const { tables, head } = current();
	const makes = makesOf(tables);
	const make = makes.find(({ division }) => division === filters.division);
	const years = [...new Set(makes.flatMap(({ years }) => years.map(({ year }) => year)))].sort();
	const { year } = filters;
	const divisionChoices = [
		{ value: '', label: text.choose },
		...makes.map(({ division }) => ({ value: division, label: division }))
	];
	const isListed = asked.division === '' || make !== undefined;
	const rows =
		make === undefined || year === undefined
			? []
			: [
					...searchRows(tables, '', {
						table: 'paint',
						...(filters.maker && { maker: filters.maker }),
						division: make.division,
						year
					}).items
				].sort(compareRows);
	const sources = sourcesOf(rows);
	return {
		edition: head.number,
		form: {
			asked: { division: make?.division ?? '', year: year === undefined ? '' : String(year) },
			divisions: readyOptions(divisionChoices)(make?.division ?? ''),
			years: readyOptions([
				{ value: '', label: text.anyYear },
				...years.map((one) => ({ value: String(one), label: String(one) }))
			])(year === undefined ? '' : String(year)),
			faults:
				isListed || faults.some(({ field }) => field === 'division')
					? faults
					: [...faults, { field: 'division' as const, message: text.noMake(asked.division) }]
		},
		shown:
			make === undefined || year === undefined
				? null
				: {
						heading: text.heading(make.division, year),
						nothing: text.nothing(make.division, year),
						chips: chipsOf(rows, sources),
						sources,
						table: `/tables?table=paint&division=${encodeURIComponent(make.division)}&year=${year}#find`
					},
		makes: (make === undefined ? makes : [make]).map((one) => ({
			...one,
			years:
				make === undefined && year !== undefined
					? one.years.filter((own) => own.year === year)
					: spread(one.years, years)
		}))
	};
}
