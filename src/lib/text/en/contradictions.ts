/** Questions that a look over the tables asks. None of them says that a row is wrong. */
import type { ContradictionName, Weight } from '../../types';
import { decoderText } from './decoder';

const { listed } = decoderText;
const years = (from: number, to: number): string => (from === to ? String(from) : `${from}–${to}`);

export const contradictionText = {
	names: {
		two_meanings: 'One code, two meanings',
		crossing_scopes: 'Scopes that cross',
		gap: 'Years between that nobody lists',
		plant_outside_its_years: 'Plant outside its years',
		paint_outside_its_years: 'Paint outside its line’s years',
		engine_in_no_line: 'Engine of a line that no table has',
		sequence_beyond_production: 'Numbers beyond what was built',
		rule_without_rows: 'Rule that no row can meet',
		source_without_rows: 'Source that nothing cites'
	} satisfies Record<ContradictionName, string>,
	weights: {
		heavy: 'a code may be read wrongly',
		middling: 'a row may say too much',
		light: 'something may be lacking'
	} satisfies Record<Weight, string>,
	two_meanings: (code: string, one: string, other: string): string =>
		`${code} is “${one}” by one source and “${other}” by another, for the same cars.`,
	crossing_scopes: (code: string, one: string, other: string): string =>
		`${code} is “${one}” and “${other}”, and some cars are in the scope of both: neither is the exception.`,
	gap: (code: string, meaning: string, from: number, to: number): string =>
		`${code}, “${meaning}”, is listed before and after ${years(from, to)}, and not in between.`,
	plant_outside_its_years: (plant: string, from: number, to: number): string =>
		`Plant ${plant} is named for ${years(from, to)}, and the table of plants does not list it in any of these years.`,
	paint_outside_its_years: (lines: readonly string[], from: number, to: number): string =>
		`A paint is listed for ${listed(lines)} of ${years(from, to)}, and no table has such a line in any of these years.`,
	engine_in_no_line: (names: readonly string[]): string =>
		`An engine is listed for ${listed(names)}, and no table of lines or series has that name.`,
	sequence_beyond_production: (room: number, built: number): string =>
		`The numbers leave room for ${room} cars, and ${built} were built.`,
	rule_without_rows: (values: readonly string[]): string =>
		`No row has ${listed(values)}, so the rule can never be met.`,
	source_without_rows: (title: string): string => `Nothing cites “${title}”.`
} as const;
