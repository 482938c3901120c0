import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import {
	buildCitation,
	buildContent,
	buildRow,
	buildSource
} from '../../../../tests/fixtures/builders';
import { INVENTED } from '../../../../tests/fixtures/invented';
import type { EditionContent } from '../../types';
import { digestOf } from './digest';
import { entriesOf } from './entries';

const digest = (content: EditionContent) => digestOf(entriesOf(content));
const shuffled = <T>(items: readonly T[]) =>
	fc.shuffledSubarray([...items], { minLength: items.length, maxLength: items.length });

describe('the digest of an edition', () => {
	it('is 64 hexadecimal figures that stand in reports: the same for ever for the same content', () => {
		const row = buildRow('gm', 'engine', 'T', 'V8', { years: [1966, 1967] });
		const content = buildContent({
			rows: [row],
			citations: [buildCitation(row.row_key, 'book')],
			sources: [buildSource('book')]
		});
		expect(digest(content)).toBe(
			'dac920131adb76f2c1d8e2bbd6b869df1e889fa6ec0aed787bd6a417e182aa91'
		);
	});

	it('does not heed the order of rows, citations, sources and claims', () => {
		const anyOrder = fc.record({
			rows: shuffled(INVENTED.rows),
			citations: shuffled(INVENTED.citations),
			sources: shuffled(INVENTED.sources),
			claims: shuffled(INVENTED.claims)
		});
		fc.assert(
			fc.property(anyOrder, (content) => digest(content) === digest(INVENTED)),
			{ numRuns: 25 }
		);
	});

	it('does not heed the order within a scope or of values', () => {
		const row = buildRow('gm', 'engine', 'T', 'V8', {
			division: ['Buick', 'Pontiac'],
			values: { cylinders: 8, doors: 2 }
		});
		const turned = { ...row, division: ['Pontiac', 'Buick'], values: { doors: 2, cylinders: 8 } };
		expect(digest(buildContent({ rows: [turned] }))).toBe(digest(buildContent({ rows: [row] })));
	});

	it.each([
		['a row’s meaning', (c: EditionContent) => ({ ...c.rows[0], meaning: 'Other' }), 'rows'],
		['a row’s values', (c: EditionContent) => ({ ...c.rows[0], values: { doors: 3 } }), 'rows'],
		['a row’s scope', (c: EditionContent) => ({ ...c.rows[0], plant: ['Z'] }), 'rows'],
		['a row’s note', (c: EditionContent) => ({ ...c.rows[0], note: 'But.' }), 'rows'],
		['a citation', (c: EditionContent) => ({ ...c.citations[0], locator: 'p. 13' }), 'citations'],
		['a source', (c: EditionContent) => ({ ...c.sources[0], licence: 'free' }), 'sources'],
		['a claim', (c: EditionContent) => ({ ...c.claims[0], years_to: 1970 }), 'claims']
	] as const)('changes with %s', (_, change, list) => {
		const changed = { ...INVENTED, [list]: [change(INVENTED), ...INVENTED[list].slice(1)] };
		expect(digest(changed as EditionContent)).not.toBe(digest(INVENTED));
	});
});

describe('a release', () => {
	const row = buildRow('gm', 'engine', 'T', 'V8');
	it.each([
		[
			'two rows of one key',
			buildContent({ rows: [row, row] }),
			'Two rows have the key gm.engine.t.1'
		],
		[
			'a citation of no row',
			buildContent({
				citations: [buildCitation('gm.engine.t.1', 'work')],
				sources: [buildSource('work')]
			}),
			'A citation is of the row gm.engine.t.1, which is not there'
		],
		[
			'a source that is not there',
			buildContent({ rows: [row], citations: [buildCitation(row.row_key, 'work')] }),
			'The source work is cited and is not there'
		],
		[
			'a copy of a source that is not there',
			buildContent({ sources: [buildSource('copy', { repeats: 'work' })] }),
			'The source work is cited and is not there'
		]
	])('with %s is refused', (_, content, message) => {
		expect(() => entriesOf(content)).toThrow(message);
	});
});
