/** Makes the readings of a stamp under one lined layout: one for each year and division that it may be of. */
import { DIVISIONS, makerOf, type ReadContext, type Reading, type ReadingField } from '../../types';
import { stampsText as text } from '../../text/en/stamps';
import { decoderText } from '../../text/en/decoder';
import { carOf, type KnownCar } from '../known-car';
import { agreedFields, readStampedSerial } from '../stamped-serial';
import { isRead, textOf } from './characters';
import { fieldOf, type FieldResult } from './field';
import { cellsOfPlaced, linedField, serialFields, type LinedReader } from './lined-field';
import { partsOf } from './lined-lookup';
import type { LinedMatch } from './lined-match';
import type { Placed } from './line-match';
import type { Line } from './lines';
import { entriesMatching, type Scope } from './look-up';
import type { Draft } from './reading';
import { rowsInYear, tableId, type CompiledRow, type TableSet } from './table-set';

export interface LinedStamp {
	readonly match: LinedMatch;
	readonly tables: TableSet;
	readonly context: ReadContext;
	readonly car: KnownCar;
}

const placedIn = ({ lines }: LinedMatch): Placed[] => lines.flatMap(({ placed }) => placed);

interface Serial {
	readonly readings: readonly Reading[];
	/** The fields that stand here. */
	readonly fields: readonly ReadingField[];
}
type Serials = ReadonlyMap<Placed, Serial>;
/** A part of the car's number, and its places there; the whole number without. */
interface Part {
	readonly placed: Placed;
	readonly places: readonly number[] | undefined;
}

/**
 * The car's own number where the stamp carries it: whole, or in parts, of which those of one form are read together.
 */
function serialsOn({ match, tables, context }: LinedStamp): Serials {
	const numbers = new Map<string, { layouts: readonly string[]; parts: Part[] }>();
	for (const placed of placedIn(match)) {
		const { reads } = placed.field;
		if (reads.by !== 'serial') continue;
		const { layouts, places } = reads;
		const key = `${layouts.join()} ${places === undefined}`;
		const parts = [...(numbers.get(key)?.parts ?? []), { placed, places }];
		numbers.set(key, { layouts, parts });
	}
	const serials = new Map<Placed, Serial>();
	for (const { layouts, parts } of numbers.values()) {
		const cells = parts.flatMap(({ placed }) => cellsOfPlaced(placed));
		const places = parts.flatMap((part) => part.places ?? []);
		const reads = { layouts, ...(places.length > 0 ? { places } : {}) };
		const readings = readStampedSerial(cells, reads, tables, context, match.layout.years);
		for (const part of parts)
			serials.set(part.placed, { readings, fields: agreedFields(readings, part.places) });
	}
	return serials;
}

/** Model years that the stamp itself names, else the one that is known of the car, else an open one. */
function yearsOf({ match, car }: LinedStamp): readonly (number | null)[] {
	const [from, to] = match.layout.years;
	for (const placed of placedIn(match)) {
		const { reads } = placed.field;
		if (reads.by !== 'year') continue;
		const cells = cellsOfPlaced(placed);
		const named = cells.every(isRead) ? (reads.years[cells.join('')] ?? []) : [];
		if (named.length > 0) return named;
	}
	if (from === to) return [from];
	const { year } = car;
	return [year !== undefined && from <= year && year <= to ? year : null];
}

/** Divisions that the rows of the naming field are of. */
function divisionsOf(stamp: LinedStamp, year: number | null): readonly string[] {
	const { layout } = stamp.match;
	const allowed: readonly string[] = layout.divisions ?? DIVISIONS[layout.maker];
	const [only] = allowed;
	if (only !== undefined && allowed.length === 1) return allowed;
	const { division } = stamp.car;
	const known = division !== undefined && allowed.includes(division) ? [division] : [];
	const naming = placedIn(stamp.match).find(({ field }) => field.name === layout.divisionFrom);
	if (naming?.field.reads.by !== 'table') return known;
	const { table, parts, otherwise = [] } = naming.field.reads;
	const compiled = stamp.tables.tables.get(tableId(layout.maker, table));
	const named = [parts, ...otherwise]
		.flatMap((split) => entriesMatching(compiled, partsOf(cellsOfPlaced(naming), split)))
		.flatMap((entry) => rowsInYear(entry, year))
		.flatMap(({ values, division: own }) =>
			typeof values.division === 'string' ? [values.division] : own
		);
	const all = [...new Set([...known, ...named])].filter((own) => allowed.includes(own));
	return all.sort();
}

/** What scopes the other fields comes first: what the layout names, then numbers, then dates. */
function orderOf(placed: readonly Placed[], first: readonly string[]): Placed[] {
	const rank = ({ field }: Placed): number => {
		const at = first.indexOf(field.name);
		if (at >= 0) return at;
		return field.reads.by === 'date' ? first.length + 1 : first.length;
	};
	return [...placed].sort((a, b) => rank(a) - rank(b));
}

/** The body's own code scopes other fields even before, and without, a row for it. */
function bodyOn(placed: readonly Placed[]): { readonly body?: string } {
	const body = placed.find(({ field }) => field.name === 'body_style');
	const cells = body === undefined ? [] : cellsOfPlaced(body);
	return cells.length > 0 && cells.every(isRead) ? { body: textOf(cells) } : {};
}

/** What a field's rows tell of the car that others are scoped by. */
function learn(scope: Scope, results: readonly FieldResult[]): void {
	for (const { field } of results) {
		if (field.outcome !== 'found' || field.possible.length > 0) continue;
		const { line, plant_code } = field.values;
		if (typeof line === 'string') scope.line ??= [line];
		if (field.name === 'assembly_plant') scope.plant ??= String(plant_code ?? field.code);
	}
}

/** Calendar years before and in which a part with these rows was made. */
function yearsOfParts(results: readonly FieldResult[], layout: readonly [number, number]) {
	const rows = results
		.filter(({ field }) => field.name === 'casting_number')
		.flatMap((result) => result.rows);
	const from = rows.map((row) => row.years_from ?? layout[0]);
	const to = rows.map((row) => row.years_to ?? layout[1]);
	const span = rows.length === 0 ? layout : ([Math.min(...from), Math.max(...to)] as const);
	return [span[0] - 1, span[1]] as const;
}

function unplacedField(line: Line, from: number, to: number, why: string): FieldResult {
	const cells = line.cells.slice(from, to);
	const read = cells.every(isRead);
	const head = {
		name: 'unknown' as const,
		label: text.unplaced,
		from: (line.places[from] as readonly [number, number])[0],
		to: (line.places[to - 1] as readonly [number, number])[1]
	};
	const field = fieldOf(head, {
		code: textOf(cells),
		outcome: read ? 'not_listed' : 'illegible',
		detail: read ? why : decoderText.fields.unread(cells)
	});
	return { field, rows: [], counts: false, table: null };
}

const onLine = ({ number }: Line, several: boolean, result: FieldResult): FieldResult =>
	several ? { ...result, field: { ...result.field, line: number } } : result;

/** Everything that the stamp says under one year and division, in the order in which it is typed. */
function resultsOf(stamp: LinedStamp, scope: Scope, serials: Serials): FieldResult[] {
	const { layout, lines } = stamp.match;
	const { tables } = stamp;
	const several = lines.length > 1 || layout.lines.length > 1;
	const told: FieldResult[] = [];
	for (const placed of orderOf(placedIn(stamp.match), layout.lookFirst ?? [])) {
		const reader: LinedReader = {
			tables,
			maker: layout.maker,
			scope,
			loose: layout.kind !== 'body_tag',
			years: yearsOfParts(told, layout.years)
		};
		const serial = serials.get(placed);
		const own =
			serial === undefined
				? linedField(placed, reader)
				: serialFields(placed, serial.fields, (key) => tables.rows.get(key) as CompiledRow);
		learn(scope, own);
		told.push(...own.map((result) => onLine(placed.line, several, result)));
	}
	for (const { line, unplaced } of lines)
		for (const [from, to] of unplaced)
			told.push(onLine(line, several, unplacedField(line, from, to, text.noField)));
	return told
		.map((result, index) => ({ result, index }))
		.sort((a, b) => a.result.field.from - b.result.field.from || a.index - b.index)
		.map(({ result }) => result);
}

/** What is known of the car, as far as it may be a car of this maker; the number on the stamp itself goes first. */
function carFor(stamp: LinedStamp, serials: Serials): KnownCar {
	const { maker } = stamp.match.layout;
	const own = [...serials.values()].find(({ readings }) => readings.length > 0);
	const beside = (stamp.car.maker ?? maker) === maker ? stamp.car : {};
	return { ...beside, ...(own === undefined ? {} : carOf(own.readings)) };
}

/** What speaks against a layout of other years than the car's own: as much as a hint that is missed. */
const OTHER_YEARS = 60;

/** The readings of a stamp under a layout, before they are ranked. */
export function linedDrafts(stamp: LinedStamp): Draft[] {
	const { match } = stamp;
	const serials = serialsOn(stamp);
	const own = { ...stamp, car: carFor(stamp, serials) };
	const [from, to] = match.layout.years;
	const { year: known = from } = own.car;
	const otherYears = known < from || known > to;
	const complete =
		match.missing.length === 0 && match.lines.every(({ missing }) => missing.length === 0);
	return yearsOf(own).flatMap((year) => {
		const divisions = divisionsOf(own, year);
		return (divisions.length === 0 ? [undefined] : divisions).map((division): Draft => {
			const { maker: _maker, year: _year, division: _division, ...others } = own.car;
			const scope: Scope = {
				...bodyOn(placedIn(match)),
				...others,
				year,
				...(division === undefined ? {} : { division })
			};
			return {
				layout: match.layout,
				maker: makerOf(division ?? '') ?? match.layout.maker,
				division: division ?? null,
				year,
				misfit: match.cost + (otherYears ? OTHER_YEARS : 0),
				complete,
				results: resultsOf(own, scope, serials)
			};
		});
	});
}
