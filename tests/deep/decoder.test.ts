import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { readContent } from '../../scripts/data/read';
import { candidatesOf, compile, LAYOUTS, normalise, read } from '../../src/lib/decoder';
import { inventedEdition, inventedSerials } from '../bench/invented-edition';

const content = readContent('data');
const released = compile(content);
const CHARACTERS = 'ABCDEFGHIJKLMNOPQRSTUVWXYZ0123456789';
const character = fc.constantFrom(...CHARACTERS);

/** A text of some layout's shape: each place holds what the layout allows there, now and then something else. */
const shaped = fc.constantFrom(...LAYOUTS).chain((layout) =>
	fc
		.tuple(
			...layout.fields.flatMap(({ from, to, chars }) =>
				Array.from({ length: to - from + 1 }, (_, n) => {
					const allowed = typeof chars === 'string' ? chars : (chars[n] as string);
					return fc.oneof(
						{ weight: 19, arbitrary: fc.constantFrom(...allowed) },
						{ weight: 1, arbitrary: character }
					);
				})
			)
		)
		.map((cells) => cells.join(''))
);
const places = fc.uniqueArray(fc.nat(16), { maxLength: 8 });
const mark = (text: string, at: readonly number[]): string =>
	[...text].map((own, index) => (at.includes(index) ? '?' : own)).join('');

const SERIALS: ReadonlySet<string> = new Set(LAYOUTS.map(({ id }) => id));
const names = (text: string): string[] =>
	candidatesOf(normalise(text).cells).flatMap(({ prepared, years }) =>
		years.map((year) => `${prepared.layout.id} ${year}`)
	);

describe('tens of thousands of texts against the released tables', () => {
	it('are read without an error; primary fields partition the characters of each reading', () => {
		fc.assert(
			fc.property(
				fc.oneof(
					{ weight: 3, arbitrary: fc.tuple(shaped, places).map(([text, at]) => mark(text, at)) },
					{ weight: 1, arbitrary: fc.string({ unit: 'binary', maxLength: 64 }) }
				),
				(text) => {
					const { readings, more } = read(released, { text });
					for (const reading of readings) {
						const own = reading.fields
							.filter((field) => field.derived_from === undefined)
							.flatMap(({ from, to }) => Array.from({ length: to - from + 1 }, (_, n) => from + n));
						// Tags and other stamps hold their dividers too.
						const partition = SERIALS.has(reading.layout ?? '');
						if (partition && own.some((place, index) => place !== index + 1)) return false;
						for (const field of reading.fields)
							if (
								(field.outcome === 'contested') !==
								(field.meaning === null && field.alternatives.length > 0)
							)
								return false;
					}
					return readings.length <= 24 && (more === 0 || readings.length === 24);
				}
			),
			{ numRuns: 30_000 }
		);
	});

	it('when marked, may be all that the text may be', () => {
		fc.assert(
			fc.property(shaped, places, (text, at) => {
				const wide = new Set(names(mark(text, at)));
				return names(text).every((name) => wide.has(name));
			}),
			{ numRuns: 100_000 }
		);
	});
});

describe('the order of rows', () => {
	it('changes no reading of the released tables', () => {
		const samples = fc.sample(shaped, { numRuns: 500, seed: 1971 });
		fc.assert(
			fc.property(
				fc.shuffledSubarray([...content.rows], { minLength: content.rows.length }),
				(rows) => {
					const other = compile({ ...content, rows, citations: [...content.citations].reverse() });
					for (const text of samples)
						expect(read(other, { text })).toEqual(read(released, { text }));
				}
			),
			{ numRuns: 5 }
		);
	});
});

describe('a grown edition', () => {
	it('reads what its base reads, whatever else it holds', () => {
		const small = compile(inventedEdition(2_000));
		const large = compile(inventedEdition(200_000));
		for (const text of inventedSerials(2_000)) {
			const one = read(small, { text, kind: 'serial' });
			expect(read(large, { text, kind: 'serial' })).toEqual(one);
		}
	});
});
