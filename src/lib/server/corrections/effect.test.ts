import { describe, expect, it } from 'vitest';
import { buildCitation, buildClaim, buildRow } from '../../../../tests/fixtures/builders';
import { readContent } from '../../../../scripts/data/read';
import { compile, read, type TableSet } from '../../decoder';
import type { EditionContent, ReferenceRow } from '../../types';
import { effectOf, shownTo, type SavedForEffect } from './effect';

const content = readContent('data');
const before = compile(content);
const PLYMOUTH = 'RM23N0Gxxxxxx';

/** A reading as it is saved: with the look-ups that it made. */
function saved(id: string, text: string, owner: string | null, tables = before): SavedForEffect {
	const { readings } = read(tables, { text, kind: 'serial', lookups: true });
	const lookups = readings.flatMap(({ fields }) => fields.flatMap((field) => field.lookups ?? []));
	return { id, owner, kind: 'serial', text, context: {}, uses: lookups };
}
const edition = (change: (rows: readonly ReferenceRow[]) => ReferenceRow[]): TableSet => {
	const rows = change(content.rows);
	const added = rows.filter(({ row_key }) => !before.rows.has(row_key));
	const left = new Set(rows.map(({ row_key }) => row_key));
	const next: EditionContent = {
		...content,
		rows,
		citations: [
			...content.citations.filter(({ row_key }) => left.has(row_key)),
			...added.map(({ row_key }) => buildCitation(row_key, 'memory'))
		]
	};
	return compile(next);
};
const fieldOf = (text: string, name: string) =>
	read(before, { text, kind: 'serial' }).readings[0]?.fields.find((field) => field.name === name);
const engineKey = fieldOf(PLYMOUTH, 'engine')?.rows[0] ?? '';

const mine = saved('1', PLYMOUTH, 'ann');
const other = saved('2', PLYMOUTH, 'bob');
const elsewhere = saved('3', '124379N504xxx', 'bob');

describe('the effect of a change', () => {
	it('on what rests on the row that changes is each field, old and new', () => {
		const after = edition((rows) =>
			rows.map((row) =>
				row.row_key === engineKey ? { ...row, meaning: '383 V8, put right' } : row
			)
		);
		const sheet = effectOf(before, after, [elsewhere, other, mine]);
		expect(sheet.changed.map(({ id }) => id)).toEqual(['1', '2']);
		expect(sheet.changed[0]?.fields).toEqual([
			{
				label: 'Engine',
				code: 'N',
				old: expect.objectContaining({
					outcome: 'found',
					meaning: before.rows.get(engineKey)?.meaning
				}),
				now: expect.objectContaining({ outcome: 'found', meaning: '383 V8, put right' })
			}
		]);
	});

	it('on what looked for a code in vain is what an added row answers', () => {
		const text = 'RM23O0Gxxxxxx';
		expect(fieldOf(text, 'engine')?.outcome).toBe('not_listed');
		const miss = saved('4', text, 'ann');
		const row = buildRow('chrysler', 'engine', 'O', 'An engine not known before', {
			division: ['Plymouth'],
			years: [1970, 1970],
			n: 99
		});
		const { changed } = effectOf(
			before,
			edition((rows) => [...rows, row]),
			[miss, elsewhere]
		);
		expect(changed.map(({ id }) => id)).toEqual(['4']);
		expect(changed[0]?.fields.map(({ old, now }) => [old?.outcome, now?.outcome])).toEqual([
			['not_listed', 'found']
		]);
	});

	it('on what looked for a code in vain is what a claim answers, too', () => {
		const miss = saved('4', 'RM23O0Gxxxxxx', 'ann');
		const claim = buildClaim('chrysler.engine.test', 'chrysler', 'engine', 'memory');
		const after = compile({ ...content, claims: [...content.claims, claim] });
		for (const [from, to, outcomes] of [
			[before, after, ['not_listed', 'not_used']],
			[after, before, ['not_used', 'not_listed']]
		] as const) {
			const { changed } = effectOf(from, to, [miss, mine]);
			expect(changed.map(({ id }) => id)).toEqual(['4']);
			expect(changed[0]?.fields.map(({ old, now }) => [old?.outcome, now?.outcome])).toEqual([
				outcomes
			]);
		}
	});

	it('of a row that is retired is a field that is not listed', () => {
		const after = edition((rows) => rows.filter(({ row_key }) => row_key !== engineKey));
		const { changed } = effectOf(before, after, [mine]);
		expect(changed[0]?.fields[0]?.now?.outcome).not.toBe(changed[0]?.fields[0]?.old?.outcome);
	});

	it('is nothing where a reading looks at a row and says the same', () => {
		const after = edition((rows) =>
			rows.map((row) => (row.row_key === engineKey ? { ...row, note: 'A note.' } : row))
		);
		const sheet = effectOf(before, after, [mine, elsewhere]);
		expect(sheet).toEqual({ changed: [], same: 1 });
		expect(effectOf(before, before, [mine])).toEqual({ changed: [], same: 0 });
	});

	it('that flips a tally stands first', () => {
		const after = edition((rows) =>
			rows.map((row) => (row.row_key === engineKey ? { ...row, meaning: 'Another' } : row))
		);
		const flips = ({ id }: SavedForEffect) =>
			id === '2' ? ['Engine: tallies, then does not'] : [];
		const { changed } = effectOf(before, after, [mine, other], flips);
		expect(changed.map(({ id, flips: own }) => [id, own.length])).toEqual([
			['2', 1],
			['1', 0]
		]);
	});

	it('hides what is somebody else’s from contributor and moderator alike', () => {
		const after = edition((rows) => rows.filter(({ row_key }) => row_key !== engineKey));
		const sheet = effectOf(before, after, [mine, other, saved('5', PLYMOUTH, null)]);
		const shown = shownTo(sheet, 'ann');
		expect(shown.map(({ own }) => own?.text)).toEqual([PLYMOUTH, undefined, undefined]);
		expect(shown.map(({ fields }) => fields)).toEqual(
			sheet.changed.map((one) => one.fields.length)
		);
		expect(shown.map(({ division, model_year }) => [division, model_year])).toEqual(
			shown.map(() => ['Plymouth', 1970])
		);
		for (const hidden of ['bob', 'RM23', '383'])
			expect(JSON.stringify(shown.slice(1))).not.toContain(hidden);
		expect(shownTo(sheet, null).map(({ own }) => own)).toEqual([null, null, null]);
	});
});
