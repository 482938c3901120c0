import { describe, expect, it } from 'vitest';
import { buildCitation, buildClaim, buildRow } from '../../../../tests/fixtures/builders';
import { correctionsText } from '../../text/en/corrections';
import { correctionPartSchema, PART_KINDS, type CorrectionPart, type Evidence } from '../../types';
import { areCited, isCited, joined, pointsLeft, pointsOf } from './parts';

const cited: Evidence = {
	kind: 'book',
	locator: 'p. 12',
	address: '',
	quotation: 'Code A, 6 cylinders',
	photograph: null
};
const row = buildRow('gm', 'engine', 'A', 'Six cylinders', { years: [1969, 1970] });
const add: CorrectionPart = {
	kind: 'add_row',
	row,
	citations: [buildCitation(row.row_key, 'book-a')],
	evidence: [cited]
};
const codesOf = (part: unknown): string[] =>
	correctionPartSchema.safeParse(part).error?.issues.map(({ message }) => message) ?? [];

describe('what a part rests on', () => {
	it.each([
		['a place in it and a quotation', {}, true],
		[
			'an address and a photograph',
			{ locator: '', address: 'https://example.org/p', quotation: '', photograph: 'file' },
			true
		],
		['no place', { locator: '' }, false],
		['nothing to be seen of it', { quotation: '' }, false],
		['memory alone', { kind: 'memory', locator: '', quotation: '' }, true]
	] as const)('is %s', (_, parts, answer) => {
		expect(isCited({ ...cited, ...parts })).toBe(answer);
	});

	it('is asked of each part', () => {
		expect(areCited([add])).toBe(true);
		expect(areCited([add, { ...add, evidence: [] }])).toBe(false);
	});
});

describe('what a part says', () => {
	it('passes where it is sound', () => {
		expect(codesOf(add)).toEqual([]);
	});
	it.each([
		['years_order', { ...add, row: { ...row, years_from: 1971 } }],
		['values', { ...add, row: { ...row, values: { cylinders: 'six' } } }],
		['citation_elsewhere', { ...add, citations: [buildCitation('gm.engine.b.1', 'book-a')] }],
		['address', { ...add, evidence: [{ ...cited, address: 'javascript:alert(1)' }] }],
		['quotation_long', { ...add, evidence: [{ ...cited, quotation: 'x'.repeat(401) }] }],
		[
			'years_order',
			{
				kind: 'add_claim',
				claim: buildClaim('c', 'gm', 'engine', 'book-a', { years_from: 1970, years_to: 1969 }),
				evidence: [cited]
			}
		]
	] as const)('is refused with %s, which has a sentence', (code, part) => {
		expect(codesOf(part)).toEqual([code]);
		expect(correctionsText.faults[code]).toMatch(/\.$/);
	});
});

describe('points', () => {
	it('weigh by how much a part asks of a reader', () => {
		expect(PART_KINDS.map((kind) => pointsOf([{ kind }]))).toEqual([1, 3, 5, 1, 3, 3, 5, 1, 3, 5]);
	});
	it('are more for those of whom ten corrections were accepted', () => {
		const open = [add, { kind: 'retire_row' as const }];
		expect([0, 9, 10].map((accepted) => pointsLeft(open, accepted))).toEqual([24, 24, 114]);
		expect(
			pointsLeft(
				Array.from({ length: 31 }, () => add),
				0
			)
		).toBe(-1);
	});
});

describe('parts that ask for the same', () => {
	it('are one, on the evidence of all, each piece once', () => {
		const memory: Evidence = { ...cited, kind: 'memory', locator: '', quotation: '' };
		const values = { ...add, evidence: [cited, memory] };
		const other = { ...add, row: { ...row, meaning: 'Eight cylinders' } };
		expect(joined([add, other, values])).toEqual([{ ...add, evidence: [cited, memory] }, other]);
	});
});
