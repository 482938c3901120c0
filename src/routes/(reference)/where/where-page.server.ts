/** What the page of places shows for an address. */
import type { CompiledRow } from '$lib/decoder';
import { rowAddress } from '$lib/format/addresses';
import { scopeWords } from '$lib/format/scope';
import { yearSpan } from '$lib/format/years';
import { readContext } from '$lib/server/readings';
import { current, searchRows } from '$lib/server/reference';
import { whereText as text, type EngineZone } from '$lib/text/en/where';
import { MAKER_NAMES, type FieldError, type Maker, type ReadContext } from '$lib/types';
import { corporationOf, makerChoice, makerOptions, yearOptions } from '../reading/choices';
import { zoneOf, ZONES, type Zone } from './zones';

const placeView = (row: CompiledRow) => ({
	key: row.row_key,
	part: capital(String(row.values['part'])),
	where: row.meaning,
	note: row.note,
	scope: scopeWords(row),
	years: yearSpan(row.years_from, row.years_to),
	strength: row.strength,
	address: rowAddress(row.row_key)
});
export type PlaceView = ReturnType<typeof placeView>;

const capital = (words: string): string => `${words.charAt(0).toUpperCase()}${words.slice(1)}`;

/** "Dash top, at the windshield"; "Engine, front". */
export const zoneName = (zone: Zone): string =>
	zone.startsWith('engine-')
		? text.engineZones[zone.slice('engine-'.length) as EngineZone]
		: text.zones[zone as keyof typeof text.zones];

/** Places in the order of the drawing, numbered from 1; what has no place in it stands last, without a number. */
function groupsOf(rows: readonly CompiledRow[]) {
	const zones = rows.map((row) => zoneOf(String(row.values['part']), row.meaning));
	const of = (zone: Zone | null) => rows.filter((_, index) => zones[index] === zone).map(placeView);
	const placed = ZONES.map((zone) => ({ zone, places: of(zone) })).filter(
		({ places }) => places.length > 0
	);
	return {
		groups: placed.map(({ zone, places }, index) => ({
			zone,
			number: index + 1,
			name: zoneName(zone),
			places
		})),
		unplaced: of(null)
	};
}
export type PlaceGroup = ReturnType<typeof groupsOf>['groups'][number];

const rowsOf = (maker: Maker, { division, year }: ReadContext): readonly CompiledRow[] =>
	searchRows(current().tables, '', {
		table: 'stamp_place',
		maker,
		...(division !== undefined && { division }),
		...(year !== undefined && { year })
	}).items;

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
						...groupsOf(rows)
					},
		law: rowsOf('other', {}).map(placeView)
	};
}
