import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import {
	buildCitation,
	buildClaim,
	buildRow,
	buildSource
} from '../../../../tests/fixtures/builders';
import { strengthOf } from '../../decoder/engine/strength';
import type { Claim, CorrectionPart, ReferenceRow, Source } from '../../types';
import type { Entries, RowEntry } from '../reference';
import { apply } from './apply';
import { mergeRows, undoOf } from './merge';

const a = buildRow('gm', 'engine', 'A', 'Six', { values: { cylinders: 6 } });
const b = buildRow('gm', 'engine', 'B', 'Eight', { values: { cylinders: 8 } });
const on = (row: ReferenceRow, ...sources: string[]): RowEntry => ({
	row,
	citations: sources.map((source) => buildCitation(row.row_key, source))
});
const evidence: CorrectionPart['evidence'] = [];
const claim = buildClaim('gm.engine', 'gm', 'engine', 'book');
const entries = (rows: RowEntry[], sources: Source[], claims: Claim[] = []): Entries => ({
	rows: new Map(rows.map((entry) => [entry.row.row_key, entry])),
	sources: new Map(sources.map((source) => [source.key, source])),
	claims: new Map(claims.map((one) => [one.claim_key, one]))
});
const today = entries(
	[on(a, 'book'), on(b, 'book', 'paper')],
	[
		buildSource('book'),
		buildSource('paper', { kind: 'factory_paper' }),
		buildSource('memory', { kind: 'memory' })
	],
	[claim]
);
const change = (entry: RowEntry): CorrectionPart => ({ kind: 'change_row', ...entry, evidence });
const add = (entry: RowEntry): CorrectionPart => ({ kind: 'add_row', ...entry, evidence });
const c = buildRow('gm', 'engine', 'C', 'Big eight');
const faultsOf = (...parts: CorrectionPart[]) =>
	apply(today, parts).faults.map(({ part, code }) => `${part} ${code}`);

describe('parts made on the tables', () => {
	it('add, change and retire in one, and leave what they were given as it was', () => {
		const copy = structuredClone(today);
		const six = on({ ...a, meaning: 'Straight six' }, 'new');
		const {
			faults,
			changes,
			entries: after
		} = apply(today, [
			change(six),
			{ kind: 'retire_row', row_key: b.row_key, evidence },
			add(on(c, 'new')),
			{ kind: 'add_source', source: buildSource('new'), evidence },
			{ kind: 'retire_claim', claim_key: claim.claim_key, evidence }
		]);
		expect(faults).toEqual([]);
		expect(changes).toEqual({
			rows: { put: [six, on(c, 'new')], retire: [b.row_key] },
			sources: { put: [buildSource('new')], retire: [] },
			claims: { put: [], retire: [claim.claim_key] }
		});
		expect([...after.rows.keys()]).toEqual([a.row_key, c.row_key]);
		expect(today).toEqual(copy);
	});

	it('take a source away with its citations and claims, and the row drops', () => {
		const { changes, entries: after } = apply(today, [
			{ kind: 'withdraw_source', key: 'book', evidence }
		]);
		expect(changes.rows.put).toEqual([on(a), on(b, 'paper')]);
		expect(changes.sources.retire).toEqual(['book']);
		expect(changes.claims.retire).toEqual([claim.claim_key]);
		const strength = ({ rows, sources }: Entries) =>
			strengthOf(rows.get(a.row_key)?.citations ?? [], sources).strength;
		expect([strength(today), strength(after)]).toEqual(['fair', 'not_rated']);
	});

	it('may swap what two rows say', () => {
		const swapped = [
			change(on({ ...a, ...sayingOf(b) }, 'book')),
			change(on({ ...b, ...sayingOf(a) }, 'book'))
		];
		expect(faultsOf(...swapped)).toEqual([]);
	});

	const sayingOf = ({ code, meaning, values }: ReferenceRow) => ({ code, meaning, values });
	const source = (kind: 'add_source' | 'correct_source', parts: Source): CorrectionPart => ({
		kind,
		source: parts,
		evidence
	});
	const claims = (kind: 'add_claim' | 'change_claim', parts: Claim): CorrectionPart => ({
		kind,
		claim: parts,
		evidence
	});
	const repeat = (key: string, repeats: string | null): CorrectionPart => ({
		kind: 'repeat_source',
		key,
		repeats,
		evidence
	});
	it.each<[string, CorrectionPart[]]>([
		['0 same_as_today', [change(on(a, 'book'))]],
		['0 same_as_today', [add(on(a, 'book'))]],
		['0 same_as_today', [repeat('book', null)]],
		['0 same_as_today', [claims('change_claim', claim)]],
		['0 already_there', [add(on({ ...a, meaning: 'Seven' }, 'book'))]],
		['0 already_there', [source('add_source', buildSource('book', { year: 1990 }))]],
		['0 said_elsewhere', [add(on({ ...a, row_key: 'gm.engine.a.2', note: 'Again' }, 'paper'))]],
		['0 not_there', [change(on(c, 'book'))]],
		['0 not_there', [{ kind: 'retire_row', row_key: c.row_key, evidence }]],
		['0 not_there', [{ kind: 'withdraw_source', key: 'new', evidence }]],
		['0 not_there', [{ kind: 'retire_claim', claim_key: 'none', evidence }]],
		['0 not_there', [repeat('new', 'book')]],
		['0 other_table', [change(on({ ...a, table: 'paint' }, 'book'))]],
		[
			'1 twice',
			[
				change(on({ ...a, meaning: 'X' }, 'book')),
				{ kind: 'retire_row', row_key: a.row_key, evidence }
			]
		],
		['0 unknown_source', [add(on(c, 'new'))]],
		['0 unknown_source', [add(on(c, 'book')), { kind: 'withdraw_source', key: 'book', evidence }]],
		['0 unknown_source', [repeat('book', 'new')]],
		['0 unknown_source', [claims('add_claim', { ...claim, claim_key: 'x', source: 'new' })]],
		['0 repeats_itself', [repeat('book', 'book')]],
		[
			'1 still_repeated',
			[repeat('paper', 'memory'), { kind: 'withdraw_source', key: 'memory', evidence }]
		],
		['0 claim_from_memory', [claims('add_claim', { ...claim, claim_key: 'x', source: 'memory' })]]
	])('are refused: %s', (fault, parts) => {
		expect(faultsOf(...parts)).toContain(fault);
	});

	it('tell of a chain of copies that bites its tail at each of its parts', () => {
		expect(faultsOf(repeat('book', 'paper'), repeat('paper', 'book'))).toEqual([
			'0 repeats_itself',
			'1 repeats_itself'
		]);
	});
});

const rowPart = fc
	.record({
		row: fc.constantFrom(a, b, c),
		meaning: fc.constantFrom('One', 'Two'),
		division: fc.constantFrom<string[]>([], ['pontiac']),
		cylinders: fc.constantFrom(6, 8),
		source: fc.constantFrom('book', 'paper'),
		make: fc.constantFrom(add, change)
	})
	.map(({ row, meaning, division, cylinders, source, make }) =>
		make(on({ ...row, meaning, division, values: { cylinders } }, source))
	);
const endPart = fc.constantFrom<CorrectionPart>(
	...[a, b, c].map(({ row_key }) => ({ kind: 'retire_row' as const, row_key, evidence })),
	{ kind: 'withdraw_source', key: 'book', evidence },
	{ kind: 'withdraw_source', key: 'paper', evidence },
	{ kind: 'retire_claim', claim_key: claim.claim_key, evidence }
);
const part = fc.oneof(rowPart, endPart);
const parts = fc.array(part, { maxLength: 4 });
const made = (before: Entries, list: CorrectionPart[]): Entries => {
	const { faults, entries: after } = apply(before, list);
	return faults.length === 0 ? after : before;
};

describe('undo', () => {
	it('restores value, sources and scope together, whatever was made', () => {
		fc.assert(
			fc.property(parts, (list) => {
				const after = made(today, list);
				const undo = undoOf(today, after, after);
				expect(undo.entries).toEqual(today);
				expect(undo.kept).toEqual([]);
			})
		);
	});

	it('keeps later work of other entries, and never leaves a source that is cited and not there', () => {
		fc.assert(
			fc.property(parts, parts, (list, later) => {
				const after = made(today, list);
				const now = made(after, later);
				const { entries: back } = undoOf(today, after, now);
				for (const [key, entry] of now.rows)
					if (today.rows.get(key) === after.rows.get(key)) expect(back.rows.get(key)).toBe(entry);
				for (const { source } of back.claims.values()) expect(back.sources.has(source)).toBe(true);
				for (const { citations } of back.rows.values())
					for (const { source } of citations) expect(back.sources.has(source)).toBe(true);
			})
		);
	});

	it('keeps a later word in another cell, and tells of one in the same', () => {
		const after = made(today, [
			change(on({ ...a, meaning: 'Wrong', division: ['pontiac'] }, 'paper'))
		]);
		const later = on({ ...a, meaning: 'Later', division: ['pontiac'], note: 'Seen' }, 'paper');
		const undo = undoOf(today, after, made(after, [change(later)]));
		expect(undo.entries.rows.get(a.row_key)).toEqual(
			on({ ...a, meaning: 'Later', note: 'Seen' }, 'book')
		);
		expect(undo.kept).toEqual([
			{
				entry: `row ${a.row_key}`,
				clashes: [{ cell: 'meaning', base: 'Wrong', mine: 'Six', theirs: 'Later' }]
			}
		]);
	});

	it('tells of what was retired or cited since', () => {
		const withNew = made(today, [
			{ kind: 'add_source', source: buildSource('new'), evidence },
			change(on({ ...a, meaning: 'X' }, 'book'))
		]);
		const now = made(withNew, [
			{ kind: 'retire_row', row_key: a.row_key, evidence },
			add(on(c, 'new'))
		]);
		const undo = undoOf(today, withNew, now);
		expect(undo.changes.rows.put).toEqual([]);
		expect(undo.entries.sources.has('new')).toBe(true);
		expect(undo.kept.map(({ entry }) => entry)).toEqual([`row ${a.row_key}`, 'source new']);
	});
});

describe('what an undo puts back', () => {
	it('does not rest on a source that was withdrawn since', () => {
		const after = made(today, [
			{ kind: 'retire_row', row_key: a.row_key, evidence },
			{ kind: 'retire_claim', claim_key: claim.claim_key, evidence }
		]);
		const now = made(after, [{ kind: 'withdraw_source', key: 'book', evidence }]);
		const { entries: back, kept } = undoOf(today, after, now);
		expect(back.rows.get(a.row_key)).toEqual(on(a));
		expect(back.claims.size).toBe(0);
		expect(kept.map(({ entry }) => entry)).toEqual([
			`row ${a.row_key}`,
			`claim ${claim.claim_key}`
		]);
	});
});

describe('three versions of a row', () => {
	it('give each cell to the side that changed it', () => {
		const mine = on({ ...a, values: { cylinders: 6, doors: 2 } }, 'book', 'paper');
		const theirs = on({ ...a, meaning: 'Straight six', values: {} }, 'memory');
		const { entry, clashes } = mergeRows(on(a, 'book'), mine, theirs);
		expect(clashes).toEqual([]);
		expect(entry).toEqual(
			on({ ...a, meaning: 'Straight six', values: { doors: 2 } }, 'memory', 'paper')
		);
	});
});
