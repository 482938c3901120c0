import { readFileSync } from 'node:fs';
import { fileURLToPath } from 'node:url';
import { parse } from 'csv-parse/sync';
import { compile, read, type TableSet } from '../../src/lib/decoder';
import type { Maker, Reading } from '../../src/lib/types';
import { readContent } from '../../scripts/data/read';

const here = (path: string): string => fileURLToPath(new URL(path, import.meta.url));

/** The released tables, compiled. */
export const released = (): TableSet => compile(readContent(here('../../data')));

/** Records of a list beside this file; each names the published source that it was read in. */
export const samples = (path: string): Record<string, string>[] =>
	parse(readFileSync(here(path), 'utf8'), { columns: true });

/** What a published page says of a serial: text stands in a meaning, a figure is the year, an object is part of the facts. */
export type Expectation = Readonly<
	Record<string, string | number | Readonly<Record<string, unknown>>>
>;

/** What a reading does not say although the page does; empty when it says all. */
export function unmet(
	reading: Pick<Reading, 'model_year' | 'fields'> | undefined,
	expectation: Expectation
): string[] {
	if (reading === undefined) return ['no reading'];
	return Object.entries(expectation).flatMap(([name, expected]) => {
		if (name === 'model_year')
			return reading.model_year === expected ? [] : [`model_year is ${reading.model_year}`];
		const fields = reading.fields.filter((field) => field.name === name);
		const met = fields.some((field) => {
			const said = [field, ...field.alternatives];
			if (typeof expected === 'object')
				return said.some(({ values }) =>
					Object.entries(expected).every(([key, value]) => values[key] === value)
				);
			const wanted = String(expected).toLowerCase();
			return said.some(({ meaning }) => meaning?.toLowerCase().includes(wanted) === true);
		});
		const told = fields.map(({ outcome, meaning }) => `${outcome} ${meaning}`).join(', ');
		return met ? [] : [`${name} is ${told || 'absent'}, not ${JSON.stringify(expected)}`];
	});
}

/** The first reading of a sample, with the hints that stand beside it. */
export function firstReading(
	tables: TableSet,
	sample: Record<string, string>
): Reading | undefined {
	const { text = '', maker, division, year } = sample;
	return read(tables, {
		text,
		kind: 'serial',
		context: {
			...(maker ? { maker: maker as Maker } : {}),
			...(division ? { division } : {}),
			...(year ? { year: Number(year) } : {})
		}
	}).readings[0];
}
