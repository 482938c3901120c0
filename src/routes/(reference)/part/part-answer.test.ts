import { describe, expect, it } from 'vitest';
import { readContent } from '../../../../scripts/data/read';
import { compile, read } from '$lib/decoder';
import type { AnsweredReading, ReadContext, StampKind } from '$lib/types';
import { partText } from '$lib/text/en/part';
import { allowed, spansOf, whatOf, whenOf } from './part-answer';

const tables = compile(readContent('data'));
const rowOf = (key: string) => tables.rows.get(key);
const readings = (text: string, kind: StampKind, context: ReadContext = {}) =>
	read(tables, { text, kind, context }).readings as unknown as AnsweredReading[];

describe('what a number is', () => {
	it('stands once, with the years and lines of its row', () => {
		const what = whatOf([...readings('3789935', 'casting'), ...readings('3789935', 'code')], rowOf);
		expect(what.flatMap(({ facts }) => facts.map(({ meaning }) => meaning))).toEqual([
			'283 V8 block'
		]);
		expect(what[0]?.facts[0]).toMatchObject({ fits: 'Chevrolet, 1960–64', mark: 'thin' });
	});

	it('is told part by part where a number has parts', () => {
		const [first] = whatOf(readings('C8AX-6015-A', 'casting'), rowOf);
		expect(first?.facts.map(({ cells }) => cells.join(''))).toEqual(['AX', '6015']);
	});

	it('is nothing where no row is', () => {
		expect(whatOf(readings('9999999', 'casting'), rowOf)).toEqual([]);
	});
});

describe('when it was made', () => {
	const rows = tables.rows.get('gm.casting_number.3789935.1');
	const spans = spansOf(rows ? [rows] : []);

	it('is every decade while nothing settles it', () => {
		const [first] = whenOf(readings('K122', 'date'), []);
		expect(first?.days.length).toBeGreaterThan(1);
		expect(first?.days.map((day) => day.allowed)).not.toContain(false);
		expect(first?.settled).toBe(partText.when.open);
	});

	it('is one of them where the years of the number leave one', () => {
		const gm = whenOf(readings('K122', 'date'), spans).find(({ key }) => key === 'gm-casting');
		expect(gm?.days.filter((day) => day.allowed).map(({ words }) => words)).toEqual([
			'12 November 1962'
		]);
		expect(gm?.settled).toContain('12 November 1962');
	});

	it('is said to lie outside where no day is left', () => {
		const gm = whenOf(readings('K127', 'date'), spans).find(({ key }) => key === 'gm-casting');
		expect(gm?.settled).toBe(partText.when.none);
	});

	// Common practice, no source: a block is cast before the cars of its model year are built.
	it.each([
		['1959-11-01', true],
		['1958-12-31', false],
		['1964-12-31', true],
		['1965-01-01', false]
	])('%s for a part of 1960 to 1964: %s', (day, fits) => expect(allowed(day, spans)).toBe(fits));

	it('is open where the number has no years', () => expect(allowed('1962-01-01', [])).toBeNull());
});
