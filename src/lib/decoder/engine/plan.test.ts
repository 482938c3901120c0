import { describe, expect, it } from 'vitest';
import { buildContent, buildRow } from '../../../../tests/fixtures/builders';
import { inventedLayout } from '../../../../tests/fixtures/invented-layout';
import { read } from '../read';
import { compile } from './compile';
import { lookupsOf, type FieldResult } from './field';
import { exchanged } from './look-alikes';
import { prepare } from './plan';

describe('preparing a layout', () => {
	it('refuses one whose naming field is not there', () => {
		expect(() => prepare({ ...inventedLayout, divisionFrom: 'wmi' })).toThrow(
			'gm-invented-9 has no field wmi'
		);
	});

	it('asks what others depend on first', () => {
		const { order } = prepare({ ...inventedLayout, lookFirst: ['line', 'engine'] });
		expect(order).toEqual([1, 3, 0, 2, 4, 5, 6]);
	});
});

describe('a division that the body names', () => {
	const row = (n: number, division: string, first: number) =>
		buildRow('ford', 'sequence', '', `From ${first}`, {
			n,
			division: [division],
			values: { first_sequence: first }
		});
	const tables = compile(
		buildContent({
			rows: [
				buildRow('ford', 'body_serial', '91', 'A body', {
					division: ['Mercury'],
					values: { line: 'Cougar', body_style: 'Two-door hardtop' }
				}),
				row(1, 'Mercury', 500001),
				row(2, 'Ford', 100001)
			]
		})
	);
	const divisions = (text: string) =>
		read(tables, { text, kind: 'serial', context: { year: 1967 } })
			.readings.filter((reading) => reading.model_year === 1967)
			.map((reading) => reading.division);

	it('is taken as it stands while the running number fits it', () => {
		expect(divisions('7F91S500001')).toEqual(['Mercury']);
	});

	it('is joined, and outranked, by the division whose run holds the number', () => {
		expect(divisions('7F91S100001')).toEqual(['Ford', 'Mercury']);
		const ford = read(tables, { text: '7F91S100001', kind: 'serial', context: { year: 1967 } })
			.readings[0];
		expect(ford?.fields.find((field) => field.name === 'series')?.detail).toContain(
			'One Ford line of April 1964 is not curated.'
		);
	});
});

describe('look-ups and look-alikes', () => {
	const result = (table: FieldResult['table'], code: string): FieldResult => ({
		field: { code } as FieldResult['field'],
		rows: [],
		counts: false,
		table
	});
	it('report a miss by the code that was asked for', () => {
		expect(lookupsOf(result('engine', 'T'))).toEqual([
			{ table: 'engine', code: 'T', row_key: null }
		]);
		expect(lookupsOf(result('country', '1A'))).toEqual([
			{ table: 'country', code: '1A', row_key: null }
		]);
		expect(lookupsOf(result(null, 'T'))).toEqual([]);
	});

	it('exchange one place, then two, and leave unread places alone', () => {
		expect([...exchanged(['S', '?', 'B'], 1, 3)].map((cells) => cells.join(''))).toEqual([
			'5?B',
			'S?8',
			'5?8'
		]);
		expect([...exchanged(['I'], 1, 1)].map((cells) => cells.join(''))).toEqual(['1', 'L']);
	});
});
