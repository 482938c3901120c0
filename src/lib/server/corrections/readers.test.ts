import { describe, expect, it } from 'vitest';
import {
	buildCitation,
	buildContent,
	buildRow,
	buildSource
} from '../../../../tests/fixtures/builders';
import { compile } from '../../decoder';
import type { CorrectionPart, ReferenceRow } from '../../types';
import type { ReadingEffect } from './effect';
import { readersFor, READINGS_FOR_TWO, reasonsForTwo, type ForReaders } from './readers';

const row = buildRow('gm', 'engine', 'A', 'Six');
const rival = buildRow('gm', 'engine', 'A', 'Eight', { n: 2 });
const tablesOf = (...rows: ReferenceRow[]) =>
	compile(
		buildContent({
			rows,
			citations: rows.map(({ row_key }) => buildCitation(row_key, 'book')),
			sources: [buildSource('book')]
		})
	);
const change: CorrectionPart = { kind: 'change_row', row, citations: [], evidence: [] };
const effect = (parts: Partial<ReadingEffect> = {}): ReadingEffect => ({
	id: '1',
	owner: 'somebody',
	text: 'A',
	division: null,
	model_year: null,
	assembly_plant: null,
	fields: [],
	flips: [],
	...parts
});
const changing = (...changed: ReadingEffect[]) => ({ changed, same: 0 });
const plain: ForReaders = {
	author: 'ann',
	parts: [change],
	sheet: changing(effect(), effect({ owner: null })),
	before: tablesOf(row),
	after: tablesOf(row)
};

describe('readers', () => {
	it('are one in plain cases, up to the bound', () => {
		const most = Array.from({ length: READINGS_FOR_TWO }, () => effect());
		for (const one of [plain, { ...plain, sheet: changing(...most) }]) {
			expect(reasonsForTwo(one)).toEqual([]);
			expect(readersFor(one)).toBe(1);
		}
	});

	it.each<[string, Partial<ForReaders>]>([
		['flips', { sheet: changing(effect({ flips: ['Engine'] })) }],
		['many', { sheet: changing(...Array.from({ length: READINGS_FOR_TWO + 1 }, () => effect())) }],
		['retires', { parts: [change, { kind: 'retire_row', row_key: rival.row_key, evidence: [] }] }],
		['contested', { before: tablesOf(row, rival) }],
		['contested', { after: tablesOf(row, rival) }],
		['own_car', { sheet: changing(effect({ owner: 'ann' })) }]
	])('are two where it %s', (reason, parts) => {
		expect(reasonsForTwo({ ...plain, ...parts })).toEqual([reason]);
		expect(readersFor({ ...plain, ...parts })).toBe(2);
	});
});
