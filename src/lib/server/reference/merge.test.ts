import { describe, expect, it } from 'vitest';
import {
	buildCitation,
	buildClaim,
	buildContent,
	buildRow,
	buildSource
} from '../../../../tests/fixtures/builders';
import type { EditionContent } from '../../types';
import { digestOf } from './digest';
import { entriesOf, NO_ENTRIES } from './entries';
import { isEmpty, mergeRelease } from './merge';

const row = (meaning: string, code = 'T') => buildRow('gm', 'engine', code, meaning);
const merge = (base: EditionContent, theirs: EditionContent, ours: EditionContent) =>
	mergeRelease(entriesOf(base), entriesOf(theirs), entriesOf(ours));
/** Content that holds one row, or none. */
const only = (meaning: string | null) =>
	buildContent({ rows: meaning === null ? [] : [row(meaning)] });

describe('a row', () => {
	it.each([
		// base, release, here → what stands after, whether written, conflict
		['unchanged on both sides', 'a', 'a', 'a', 'a', false, null],
		['changed by the release alone', 'a', 'b', 'a', 'b', true, null],
		['changed here alone', 'a', 'a', 'b', 'b', false, null],
		['changed alike on both sides', 'a', 'b', 'b', 'b', false, null],
		['changed differently', 'a', 'b', 'c', 'c', false, 'changed_in_both'],
		['added by the release', null, 'a', null, 'a', true, null],
		['added here', null, null, 'a', 'a', false, null],
		['added alike', null, 'a', 'a', 'a', false, null],
		['added differently', null, 'a', 'b', 'b', false, 'added_in_both'],
		['retired by the release', 'a', null, 'a', null, true, null],
		['retired here', 'a', 'a', null, null, false, null],
		['retired on both sides', 'a', null, null, null, false, null],
		['retired by the release, changed here', 'a', null, 'b', 'b', false, 'retired_in_release'],
		['retired here, changed by the release', 'a', 'b', null, null, false, 'retired_here']
	] as const)('%s', (_, base, theirs, ours, after, written, conflict) => {
		const { changes, conflicts, merged } = merge(only(base), only(theirs), only(ours));
		expect([...merged.rows.values()].map((entry) => entry.row.meaning)).toEqual(
			after === null ? [] : [after]
		);
		expect(isEmpty(changes)).toBe(!written);
		expect(conflicts.map(({ reason }) => reason)).toEqual(conflict === null ? [] : [conflict]);
	});

	it('that both sides changed is listed with all three states', () => {
		const [conflict] = merge(only('a'), only('b'), only('c')).conflicts;
		expect(conflict).toMatchObject({
			kind: 'row',
			entry_key: 'gm.engine.t.1',
			base: { row: { meaning: 'a' } },
			theirs: { row: { meaning: 'b' } },
			ours: { row: { meaning: 'c' } }
		});
	});

	it('moves with its citations: a new citation here and a new meaning in the release clash', () => {
		const sources = [buildSource('book'), buildSource('list')];
		const cited = (meaning: string, ...keys: string[]) =>
			buildContent({
				rows: [row(meaning)],
				citations: keys.map((key) => buildCitation('gm.engine.t.1', key)),
				sources
			});
		const clash = merge(cited('a', 'book'), cited('b', 'book'), cited('a', 'book', 'list'));
		expect(clash.conflicts).toHaveLength(1);
		const added = merge(cited('a', 'book'), cited('a', 'list', 'book'), cited('a', 'book'));
		expect(added.conflicts).toEqual([]);
		expect(added.merged.rows.get('gm.engine.t.1')?.citations).toHaveLength(2);
		const turned = merge(cited('a', 'book', 'list'), cited('a', 'list', 'book'), cited('a'));
		expect(turned.conflicts).toEqual([]);
	});
});

describe('sources and claims', () => {
	it('are merged like rows', () => {
		const sources = (title: string) => buildContent({ sources: [buildSource('s', { title })] });
		expect(merge(sources('a'), sources('b'), sources('a')).changes.sources.put).toHaveLength(1);
		expect(merge(sources('a'), sources('b'), sources('c')).conflicts).toMatchObject([
			{ kind: 'source', entry_key: 's', reason: 'changed_in_both' }
		]);
		expect(merge(sources('a'), buildContent(), sources('a')).changes.sources.retire).toEqual(['s']);
		const claims = (note: string) =>
			buildContent({
				sources: [buildSource('s')],
				claims: [buildClaim('c', 'gm', 'engine', 's', { note })]
			});
		expect(merge(claims('a'), claims('b'), claims('a')).changes.claims.put).toHaveLength(1);
		expect(merge(claims('a'), claims('b'), claims('c')).conflicts).toMatchObject([
			{ kind: 'claim', entry_key: 'c', reason: 'changed_in_both' }
		]);
	});

	it('a source that something here still cites stays, with the one that it repeats', () => {
		const sources = [
			buildSource('first'),
			buildSource('copy', { repeats: 'first' }),
			buildSource('unused')
		];
		const base = buildContent({ sources });
		const ours = buildContent({
			sources,
			rows: [row('added here')],
			citations: [buildCitation('gm.engine.t.1', 'copy')]
		});
		const { changes, conflicts, merged } = merge(base, buildContent(), ours);
		expect(changes.sources.retire).toEqual(['unused']);
		expect([...merged.sources.keys()].sort()).toEqual(['copy', 'first']);
		expect(conflicts.map(({ entry_key, reason }) => [entry_key, reason]).sort()).toEqual([
			['copy', 'still_cited'],
			['first', 'still_cited']
		]);
	});
});

describe('a merge', () => {
	it('of the first release takes all of it', () => {
		const release = buildContent({ rows: [row('a'), row('b', 'W')] });
		const { changes, merged } = mergeRelease(NO_ENTRIES, entriesOf(release), NO_ENTRIES);
		expect(changes.rows.put).toHaveLength(2);
		expect(digestOf(merged)).toBe(digestOf(entriesOf(release)));
	});

	it('leaves its sides alone', () => {
		const ours = entriesOf(only('a'));
		mergeRelease(entriesOf(only('a')), entriesOf(only(null)), ours);
		expect(ours.rows.size).toBe(1);
	});
});
