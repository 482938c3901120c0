import { describe, expect, it } from 'vitest';
import { buildCitation, buildContent, buildRow, buildSource } from '../../tests/fixtures/builders';
import { compile } from '../../src/lib/decoder';
import { contradictionsOf } from '../../src/lib/decoder/contradictions';
import type { ReferenceRow } from '../../src/lib/types';
import { openQuestions } from './exceptions';

const book = buildSource('marsh-book');
const green = buildRow('gm', 'paint', 'W', 'Marsh Green');
const reed = buildRow('gm', 'paint', 'W', 'Reed Green', { n: 2 });
const asked = (rows: ReferenceRow[], sources = [book]) =>
	contradictionsOf(
		compile(
			buildContent({
				rows,
				sources,
				citations: rows.map(({ row_key }) => buildCitation(row_key, book.key))
			})
		)
	);
const hits = asked([green, reed]);
const closed = hits.map(({ check, rows, digest }) => ({
	...{ check, rows, digest },
	source: book.key,
	reason: 'Two printings.'
}));

describe('a closed question', () => {
	it('is asked no more', () => {
		expect(hits).toHaveLength(1);
		expect(openQuestions(hits, [])).toEqual({ open: hits, lapsed: [] });
		expect(openQuestions(hits, closed)).toEqual({ open: [], lapsed: [] });
	});

	it.each([
		['a row changes', asked([{ ...green, note: 'Seen on a car.' }, reed])],
		['a source changes', asked([green, reed], [{ ...book, year: 1971 }])],
		['one of its rows goes', asked([green])]
	])('lapses when %s', (_, now) => {
		expect(openQuestions(now, closed)).toEqual({ open: now, lapsed: closed });
	});
});
