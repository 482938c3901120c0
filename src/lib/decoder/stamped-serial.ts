/** The car's own number, or a part of it, as it stands on another stamp. */
import type { ReadContext, Reading, ReadingField } from '../types';
import { stampsText as text } from '../text/en/stamps';
import type { Cell } from './engine/characters';
import type { TableSet } from './engine/table-set';
import { PREPARED } from './layouts';
import { readSerial } from './serial-reading';

/** A serial of which only some places are known. */
function withPlaces(cells: readonly Cell[], places: readonly number[], length: number): Cell[] {
	const whole = new Array<Cell>(length).fill('?');
	for (const [index, place] of places.entries()) whole[place - 1] = cells[index] as Cell;
	return whole;
}

/** The car's number, or a part of it, as it stands on another stamp; of the years of that stamp where it can be. */
export function readStampedSerial(
	cells: readonly Cell[],
	{ layouts, places }: { readonly layouts: readonly string[]; readonly places?: readonly number[] },
	tables: TableSet,
	context: ReadContext,
	years: readonly [from: number, to: number]
): readonly Reading[] {
	const own = PREPARED.filter(({ layout }) => layouts.includes(layout.id));
	const readings = own.flatMap((prepared) => {
		const whole = places === undefined ? cells : withPlaces(cells, places, prepared.layout.length);
		if (whole.length !== prepared.layout.length) return [];
		const text = { cells: whole, normalised: '', origins: [] };
		return readSerial(text, tables, context, false, [prepared]).readings;
	});
	const narrowed = [
		(reading: Reading) => reading.rank === 1,
		({ model_year: year }: Reading) => year !== null && years[0] <= year && year <= years[1],
		({ model_year: year }: Reading) => year === context.year
	].reduce((left, test) => {
		const kept = left.filter(test);
		return kept.length > 0 ? kept : left;
	}, readings);
	return narrowed.map((reading) => ({ ...reading, rank: 1 }));
}

/**
 * The fields of a serial that stand whole in the places given, as equally likely readings have them; where those
 * differ, all that they say is listed.
 */
export function agreedFields(
	readings: readonly Reading[],
	places: readonly number[] | undefined
): ReadingField[] {
	const [first] = readings;
	const here = (first?.fields ?? []).filter(
		({ from, to, outcome }) =>
			outcome !== 'illegible' &&
			(places === undefined ||
				Array.from({ length: to - from + 1 }, (_, n) => from + n).every((at) =>
					places.includes(at)
				))
	);
	return here.map((field): ReadingField => {
		const same = readings.flatMap(({ fields }) =>
			fields.filter(({ name, from }) => name === field.name && from === field.from)
		);
		if (same.every(({ meaning }) => meaning === field.meaning)) return field;
		const possible = same.flatMap(({ meaning, values }) =>
			meaning === null ? [] : [{ meaning, values }]
		);
		const rows = [...new Set(same.flatMap((own) => own.rows))];
		return {
			...field,
			outcome: 'found',
			meaning: text.differs,
			detail: '',
			values: {},
			strength: null,
			strength_why: '',
			rows,
			sources: [],
			alternatives: [],
			possible
		};
	});
}
