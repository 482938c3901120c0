/**
 * Worked examples of body tags, engine stamps, castings and dates as published pages print them, held against the
 * released tables. Each line of `stamps/*.csv` names its source; a known miss says why, and is held to being one.
 */
import { existsSync, readdirSync } from 'node:fs';
import { fileURLToPath } from 'node:url';
import { describe, expect, it } from 'vitest';
import { read } from '../../src/lib/decoder';
import type { Maker, Reading, StampKind } from '../../src/lib/types';
import { released, samples, unmet, type Expectation } from './samples';

type Sample = Record<string, string>;

const tables = released();
const folder = fileURLToPath(new URL('stamps', import.meta.url));
const files = existsSync(folder) ? readdirSync(folder).filter((name) => name.endsWith('.csv')) : [];
const all = files.flatMap((file) => samples(`stamps/${file}`));
const kept = all.filter(({ known_miss }) => known_miss === '');
const misses = all.filter(({ known_miss }) => known_miss !== '');

/** The first reading of a sample, with the hints that stand beside it. */
function firstOf({ text = '', kind, maker, division, year, serial }: Sample): Reading | undefined {
	return read(tables, {
		text,
		kind: kind as StampKind,
		context: {
			...(maker ? { maker: maker as Maker } : {}),
			...(division ? { division } : {}),
			...(year ? { year: Number(year) } : {}),
			...(serial ? { serial } : {})
		}
	}).readings[0];
}

/** What a page says beside meanings and facts: the days of a date. */
const expectationOf = ({ expect: expected }: Sample): Expectation =>
	JSON.parse(expected ?? '{}') as Expectation;
const named = (list: readonly Sample[]) =>
	list.map((sample) => [sample.kind, sample.text, sample.source, sample] as const);

describe('published stamps', () => {
	it.each(named(kept))('%s %s reads as %s says', (_, __, ___, sample) => {
		const expectation = expectationOf(sample);
		expect(Object.keys(expectation).length).toBeGreaterThan(0);
		expect(unmet(firstOf(sample), expectation)).toEqual([]);
	});

	it.each(named(misses))('%s %s is still missed', (_, __, ___, sample) => {
		expect(unmet(firstOf(sample), expectationOf(sample))).not.toEqual([]);
	});

	it('name their source each', () => {
		expect(all.filter(({ source }) => source === '')).toEqual([]);
	});
});
