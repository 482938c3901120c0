import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import {
	buildCitation,
	buildClaim,
	buildContent,
	buildRow,
	buildSource
} from '../../../../tests/fixtures/builders';
import { INVENTED } from '../../../../tests/fixtures/invented';
import type { SourceKind } from '../../types';
import { canonicalJson, compareRows, overlaps, sameContent, saysTheSame } from './compare';
import { compile, compileInSteps } from './compile';
import { claimFor, lookUp, lookUpByScope } from './look-up';
import { rowsInYear, tableId, type CompiledTable } from './table-set';

const tables = compile(INVENTED);
const table = (name: Parameters<typeof tableId>[1]): CompiledTable =>
	tables.tables.get(tableId('gm', name)) as CompiledTable;

describe('compiling', () => {
	it('rates rows and carries their sources', () => {
		expect(tables.rows.get('gm.engine.t.1')).toMatchObject({
			strength: 'firm',
			sources: [{ key: 'works-manual', kind: 'factory_paper', locator: 'p. 12' }]
		});
		expect(tables.rows.get('gm.engine.x.1')?.strength).toBe('thin');
		expect(tables.rows.get('gm.engine.z.1')?.strength).toBe('not_rated');
	});

	it('marks two cited rows of one code and scope that differ', () => {
		expect(tables.rows.get('gm.engine.w.1')).toMatchObject({
			strength: 'contested',
			contested_by: ['gm.engine.w.2']
		});
	});

	it('leaves a citation of an unknown source out of the sources shown', () => {
		const own = compile(
			buildContent({
				rows: [buildRow('gm', 'engine', 'Q', 'Some engine')],
				citations: [buildCitation('gm.engine.q.1', 'nowhere')]
			})
		);
		expect(own.rows.get('gm.engine.q.1')?.sources).toEqual([]);
	});

	it('shares tables that did not change with the edition before', () => {
		const rows = INVENTED.rows.map((row) =>
			row.row_key === 'gm.engine.t.1' ? { ...row, meaning: 'Changed' } : row
		);
		const next = compile({ ...INVENTED, rows }, tables);
		expect(next.tables.get('gm/body_style')).toBe(tables.tables.get('gm/body_style'));
		expect(next.tables.get('gm/engine')).not.toBe(tables.tables.get('gm/engine'));
		expect(next.rows.get('gm.engine.t.1')?.meaning).toBe('Changed');
		expect(next.rows.size).toBe(tables.rows.size);
	});

	it('notices a changed source behind an unchanged row', () => {
		const sources = INVENTED.sources.map((source) =>
			source.key === 'works-manual' ? { ...source, kind: 'web_page' as const } : source
		);
		const next = compile({ ...INVENTED, sources }, tables);
		expect(next.rows.get('gm.engine.t.1')?.strength).toBe('thin');
	});

	it('notices a changed work behind a copy of it, and copies that copy each other', () => {
		const rows = [buildRow('gm', 'engine', 'Q', 'One'), buildRow('gm', 'roof', 'Q', 'Two')];
		const works = (kind: SourceKind) => [
			buildSource('work', { kind }),
			buildSource('copy', { kind: 'web_page', repeats: 'work' }),
			buildSource('a', { repeats: 'b' }),
			buildSource('b', { repeats: 'a' })
		];
		const content = (kind: SourceKind) =>
			buildContent({
				rows,
				citations: [buildCitation('gm.engine.q.1', 'copy'), buildCitation('gm.roof.q.1', 'a')],
				sources: works(kind)
			});
		const before = compile(content('web_page'));
		const after = compile(content('factory_paper'), before);
		expect(after.rows.get('gm.engine.q.1')?.strength).toBe('firm');
		expect(after.tables.get('gm/roof')).toBe(before.tables.get('gm/roof'));
	});

	it('compiles a table anew when a row, a citation or a claim was added', () => {
		const row = buildRow('gm', 'engine', 'Q', 'New');
		const more = [
			{ rows: [...INVENTED.rows, row] },
			{ citations: [...INVENTED.citations, buildCitation('gm.engine.t.1', 'web-one')] },
			{ claims: [...INVENTED.claims, buildClaim('gm.engine.all', 'gm', 'engine', 'marsh-book')] }
		];
		for (const parts of more) {
			const next = compile({ ...INVENTED, ...parts }, tables);
			expect(next.tables.get('gm/engine')).not.toBe(tables.tables.get('gm/engine'));
			expect(next.tables.get('gm/line')).toBe(tables.tables.get('gm/line'));
		}
	});

	it('pauses often while it compiles a large table', () => {
		const rows = Array.from({ length: 1000 }, (_, n) =>
			buildRow('gm', 'engine', String(n), `Engine ${n}`)
		);
		let pauses = 0;
		const steps = compileInSteps(buildContent({ rows }));
		while (steps.next().done !== true) pauses += 1;
		expect(pauses).toBeGreaterThan(12);
	});
});

describe('comparing rows', () => {
	const row = buildRow('gm', 'engine', 'T', 'One');
	it('orders by code, years, division, line and key', () => {
		fc.assert(
			fc.property(fc.shuffledSubarray([...table('engine').rows]), (shuffled) => {
				const sorted = [...shuffled].sort(compareRows);
				expect(sorted).toEqual(table('engine').rows.filter((own) => shuffled.includes(own)));
			})
		);
	});

	it('compares facts whatever the order of their keys', () => {
		const one = { meaning: 'A', values: { a: 1, b: [{ d: 1, c: 2 }] } };
		expect(saysTheSame(one, { meaning: 'A', values: { b: [{ c: 2, d: 1 }], a: 1 } })).toBe(true);
		expect(saysTheSame(one, { meaning: 'A', values: { a: 2 } })).toBe(false);
		expect(saysTheSame(one, { ...one, meaning: 'B' })).toBe(false);
	});

	it('writes one text for one content', () => {
		expect(canonicalJson({ b: [{ d: null, c: 2 }], a: 1 })).toBe('{"a":1,"b":[{"c":2,"d":null}]}');
	});

	it('tells lists from objects and values from nothing', () => {
		expect(sameContent([1], [1])).toBe(true);
		expect(sameContent([1], [1, 2])).toBe(false);
		expect(sameContent([1], { 0: 1 })).toBe(false);
		expect(sameContent(null, {})).toBe(false);
		expect(sameContent({}, null)).toBe(false);
		expect(sameContent({}, 'a')).toBe(false);
		expect(sameContent(1, {})).toBe(false);
	});

	it('lets rows meet in years and in each scope column', () => {
		const early = buildRow('gm', 'engine', 'T', 'One', { years: [1965, 1966] });
		const late = buildRow('gm', 'engine', 'T', 'Two', { years: [1967, 1968] });
		const heron = buildRow('gm', 'engine', 'T', 'Two', { line: ['Heron'] });
		expect(overlaps(row, early)).toBe(true);
		expect(overlaps(early, late)).toBe(false);
		expect(overlaps(late, early)).toBe(false);
		expect(overlaps(row, heron)).toBe(false);
		expect(overlaps(heron, { ...heron, line: ['Dunlin'] })).toBe(false);
		expect(overlaps(heron, { ...heron, line: ['Dunlin', 'Heron'] })).toBe(true);
	});
});

describe('looking up', () => {
	it('misses codes, tables and years without rows', () => {
		expect(lookUp(undefined, 'T', { year: 1966 }).kind).toBe('missing');
		expect(lookUp(table('engine'), '9', { year: 1966 }).kind).toBe('missing');
		expect(lookUp(table('assembly_plant'), 'B', { year: 1980 }).kind).toBe('missing');
		expect(lookUpByScope(undefined, { year: 1966, plant: 'P' }).kind).toBe('missing');
	});

	it('asks all years when the year is open', () => {
		const entry = table('assembly_plant').byCode.get('B');
		expect(rowsInYear(entry as NonNullable<typeof entry>, null)).toHaveLength(2);
	});

	const only = (...rows: ReturnType<typeof buildRow>[]) =>
		compile(buildContent({ rows })).tables.get(tableId('gm', rows[0]?.table ?? 'engine'));

	it('prefers the narrower row, and the cited one among equals', () => {
		const rows = [
			buildRow('gm', 'engine', 'T', 'For all'),
			buildRow('gm', 'engine', 'T', 'For Herons', { n: 2, line: ['Heron'] })
		];
		expect(lookUp(only(...rows), 'T', { year: 1966, line: ['Heron'] })).toMatchObject({
			kind: 'found',
			rows: [{ meaning: 'For Herons' }]
		});
		const cited = compile({
			...buildContent({
				rows: [buildRow('gm', 'engine', 'T', 'One'), buildRow('gm', 'engine', 'T', 'Two', { n: 2 })]
			}),
			sources: INVENTED.sources,
			citations: [
				buildCitation('gm.engine.t.1', 'memory'),
				buildCitation('gm.engine.t.2', 'marsh-book')
			]
		}).tables.get('gm/engine');
		expect(lookUp(cited, 'T', { year: 1966 })).toMatchObject({ rows: [{ meaning: 'Two' }] });
	});

	it('shows rows without citations that differ as contested', () => {
		const rows = [
			buildRow('gm', 'engine', 'T', 'One'),
			buildRow('gm', 'engine', 'T', 'Two', { n: 2 })
		];
		expect(lookUp(only(...rows), 'T', { year: 1966 })).toMatchObject({ kind: 'contested' });
	});

	it('uses a row for one market only where none holds for all', () => {
		const exported = buildRow('gm', 'engine', 'T', 'Export', { n: 2, market: ['export'] });
		expect(
			lookUp(only(buildRow('gm', 'engine', 'T', 'All'), exported), 'T', { year: 1966 })
		).toMatchObject({ rows: [{ meaning: 'All' }] });
		expect(lookUp(only(exported), 'T', { year: 1966 })).toMatchObject({
			rows: [{ meaning: 'Export' }]
		});
	});

	it('spells out a range in the order of ISO 3780', () => {
		const ranges = only(
			buildRow('gm', 'country', 'AA-AH', 'South Africa'),
			buildRow('gm', 'country', 'SN-ST', 'Germany', { n: 2 }),
			buildRow('gm', 'country', 'VX-V2', 'Over the letters', { n: 3 }),
			buildRow('gm', 'country', 'VA', 'One pair', { n: 4 })
		);
		const ask = (code: string) => {
			const answer = lookUp(ranges, code, { year: null });
			return answer.kind === 'found' ? answer.rows[0]?.meaning : answer.kind;
		};
		expect(['AA', 'AH', 'AJ', 'SP', 'S1', 'VA', 'VB', 'VZ', 'V1', 'V3'].map(ask)).toEqual([
			'South Africa',
			'South Africa',
			'missing',
			'Germany',
			'missing',
			'One pair',
			'missing',
			'Over the letters',
			'Over the letters',
			'missing'
		]);
	});

	it('prefers sequence rows of the plant’s own code', () => {
		const runs = only(
			buildRow('gm', 'sequence', '', 'All plants', { values: { first_sequence: 1 } }),
			buildRow('gm', 'sequence', 'P', 'Plant P', { n: 2, values: { first_sequence: 5 } })
		);
		expect(lookUpByScope(runs, { year: 1966, plant: 'P' })).toMatchObject({
			rows: [{ meaning: 'Plant P' }]
		});
		expect(lookUpByScope(runs, { year: 1966 })).toMatchObject({
			rows: [{ meaning: 'All plants' }]
		});
		const narrow = only(buildRow('gm', 'sequence', 'P', 'Plant P', { line: ['Heron'] }));
		expect(lookUpByScope(narrow, { year: 1966, plant: 'P', line: ['Dunlin'] }).kind).toBe(
			'missing'
		);
	});

	it('finds the claim that covers the scope whole, and no other', () => {
		const body = table('body_style');
		expect(claimFor(body, { year: 1966, division: 'Pontiac', line: ['Heron'] })).toBeDefined();
		expect(claimFor(body, { year: 1970, division: 'Pontiac', line: ['Heron'] })).toBeUndefined();
		expect(claimFor(body, { year: 1966, division: 'Chevrolet', line: ['Heron'] })).toBeUndefined();
		expect(claimFor(body, { year: 1966, division: 'Pontiac', line: ['Dunlin'] })).toBeUndefined();
		expect(claimFor(body, { year: 1966, line: ['Heron'] })).toBeUndefined();
		expect(claimFor(body, { year: 1966, division: 'Pontiac' })).toBeUndefined();
		expect(claimFor(table('division'), { year: null })).toBeUndefined();
		expect(claimFor(table('division'), { year: 1966 })).toBeDefined();
	});
});
