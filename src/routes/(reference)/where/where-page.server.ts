/** What the page of places shows for an address. */
import type { CompiledRow } from '$lib/decoder';
import { rowAddress, sourceAddress, whereAddress } from '$lib/format/addresses';
import { citedAt } from '$lib/format/row-lines';
import { scopeWords } from '$lib/format/scope';
import { yearSpan } from '$lib/format/years';
import { MAKER_LIST, readContext } from '$lib/server/readings';
import { current, searchRows } from '$lib/server/reference';
import { VIEW_ZONES, VIEWS, whereText as text, type Zone } from '$lib/text/en/where';
import { MAKER_NAMES, type FieldError, type Maker, type ReadContext } from '$lib/types';
import { corporationOf, makerChoice, makerOptions, yearOptions } from '../reading/choices';
import { eraOf } from './drawings';
import { zoneOf, ZONES } from './zones';

const capital = (words: string): string => `${words.charAt(0).toUpperCase()}${words.slice(1)}`;

function placeView(row: CompiledRow) {
	const [source] = row.sources;
	return {
		key: row.row_key,
		part: capital(String(row.values['part'])),
		where: row.meaning,
		note: row.note,
		scope: scopeWords(row),
		years: yearSpan(row.years_from, row.years_to),
		strength: row.strength,
		source: source && { title: citedAt(source), address: sourceAddress(source.key) },
		more: text.sources(Math.max(0, row.sources.length - 1)),
		address: rowAddress(row.row_key)
	};
}
export type PlaceView = ReturnType<typeof placeView>;

/** Rows by place, numbered from 1 in the order of the drawings. */
function groupsOf(rows: readonly CompiledRow[], zones: readonly (Zone | null)[]) {
	return ZONES.filter((zone) => zones.includes(zone)).map((zone, index) => ({
		zone,
		number: index + 1,
		name: text.zones[zone],
		places: rows.filter((_, at) => zones[at] === zone).map(placeView)
	}));
}
export type PlaceGroup = ReturnType<typeof groupsOf>[number];
/** Drawings with something to mark, each with its places; the car comes first and points to the others. */
const viewsOf = (groups: readonly PlaceGroup[]) =>
	VIEWS.map((view) => {
		const shown: readonly Zone[] = VIEW_ZONES[view];
		return { view, groups: groups.filter(({ zone }) => shown.includes(zone)) };
	}).filter(({ view, groups }) => view === 'car' || groups.length > 0);
export type PlaceViewGroup = ReturnType<typeof viewsOf>[number];

const rowsOf = (maker: Maker, { division, year }: ReadContext): readonly CompiledRow[] =>
	searchRows(current().tables, '', {
		table: 'stamp_place',
		maker,
		...(division !== undefined && { division }),
		...(year !== undefined && { year })
	}).items;

/** Makers, and divisions with rows of their own, each with how many places its page shows. */
const makersShown = () =>
	MAKER_LIST.filter(({ key }) => key !== 'other').flatMap(({ key, name, divisions }) => {
		const rows = rowsOf(key, {});
		const own = divisions.filter((division) =>
			rows.some((row) => row.division.includes(division.name))
		);
		return [
			{ name, count: text.count(rows.length), address: whereAddress(key, null) },
			...own.map((division) => ({
				name: division.name,
				count: text.count(rowsOf(key, { division: division.name }).length),
				address: whereAddress(division.name, null)
			}))
		];
	});

/** The page: the form, and the places of a maker and model year by where they stand in the drawing. */
export function wherePage(parameters: URLSearchParams, now: Date) {
	const asked = {
		maker: parameters.get('maker')?.trim() ?? '',
		year: parameters.get('year')?.trim() ?? ''
	};
	const faults: FieldError[] = [];
	const context = readContext(
		{ maker: asked.maker || undefined, year: asked.year || undefined },
		faults
	);
	const { maker } = context;
	const rows = maker === undefined ? [] : rowsOf(maker, context);
	const name = context.division ?? (maker === undefined ? '' : MAKER_NAMES[maker]);
	const year = context.year === undefined ? '' : String(context.year);
	const zones = rows.map((row) => zoneOf(String(row.values['part']), row.meaning));
	return {
		edition: current().head.number,
		form: {
			asked: { maker: makerChoice(asked.maker), year },
			makers: makerOptions(makerChoice(asked.maker)),
			years: yearOptions(now)(asked.year),
			faults
		},
		plan: { corporation: corporationOf(asked.maker), year },
		shown:
			maker === undefined
				? null
				: {
						heading: text.heading(name, year),
						count: rows.length,
						nothing: text.nothing(name, year),
						allYears: year === '' ? null : `/where?maker=${encodeURIComponent(asked.maker)}`,
						era: eraOf(context.year),
						views: zones.some(Boolean) ? viewsOf(groupsOf(rows, zones)) : [],
						unplaced: rows.filter((_, index) => zones[index] === null).map(placeView)
					},
		makers: rows.length > 0 ? [] : makersShown(),
		law: rowsOf('other', {}).map(placeView)
	};
}
