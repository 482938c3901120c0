import { describe, expect, it } from 'vitest';
import { INVENTED } from '../../../../tests/fixtures/invented';
import { compile } from '../../decoder';
import { UnknownSourceError } from './errors';
import { sourcesList, sourceWithRows } from './sources';

const tables = compile(INVENTED);

describe('the sources of an edition', () => {
	it('stand by title with the number of rows that cite them', () => {
		const list = sourcesList(tables);
		expect(list.map(({ title }) => title)).toEqual(
			list.map(({ title }) => title).toSorted((a, b) => a.localeCompare(b, 'en'))
		);
		expect(list.find(({ key }) => key === 'web-copy')?.cited_by).toBe(1);
	});

	it('show the rows that cite one, with what is taken from it, and its copies', () => {
		const { source, rows, repeated_by } = sourceWithRows(tables, 'web-one');
		expect(source.cited_by).toBe(3);
		expect(rows.map(({ row }) => row.row_key)).toEqual([
			'gm.body_style.45.1',
			'gm.body_style.69.1',
			'gm.sequence.x.2'
		]);
		expect(rows[0]?.citations).toMatchObject([{ source: 'web-one', locator: 'p. 12' }]);
		expect(repeated_by.map(({ key }) => key)).toEqual(['web-copy']);
		expect(() => sourceWithRows(tables, 'no-such-work')).toThrow(UnknownSourceError);
	});
});
