import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import {
	buildContent,
	buildCitation,
	buildRow,
	buildSource
} from '../../../../tests/fixtures/builders';
import { INVENTED } from '../../../../tests/fixtures/invented';
import { readContent } from '../../../../scripts/data/read';
import {
	CONTRADICTIONS,
	contradictionSchema,
	MAKERS,
	TABLE_NAMES,
	type EditionContent,
	type ReferenceRow
} from '../../types';
import { compile } from '../index';
import { digestOf } from './digest';
import { contradictionsAfter, contradictionsOf } from './index';

const book = buildSource('marsh-book');
const other = buildSource('heron-register');

/** Rows that each rest on the first of the works; the second only where `twice` says so. */
function content(rows: readonly ReferenceRow[], parts: Partial<EditionContent> = {}) {
	return buildContent({
		rows: [...rows],
		citations: rows.map(({ row_key }) => buildCitation(row_key, book.key)),
		sources: [book],
		...parts
	});
}
const hits = (rows: readonly ReferenceRow[], parts: Partial<EditionContent> = {}) =>
	contradictionsOf(compile(content(rows, parts))).map(({ check, rows: keys }) => [check, ...keys]);

const heron = (years: readonly [number, number]) =>
	buildRow('gm', 'line', 'H', 'Heron', { values: { line: 'Heron' }, years });

describe('one code, two meanings', () => {
	it('by cited rows of one scope is asked about once', () => {
		const rows = [
			buildRow('gm', 'paint', 'W', 'Marsh Green', { years: [1966, 1967] }),
			buildRow('gm', 'paint', 'W', 'Reed Green', { years: [1967, 1968], n: 2 })
		];
		expect(hits(rows)).toEqual([['two_meanings', 'gm.paint.w.1', 'gm.paint.w.2']]);
		expect(hits([rows[0] as ReferenceRow])).toEqual([]);
	});
});

describe('scopes that cross', () => {
	const byLine = buildRow('gm', 'engine', 'V', '350 V8', { line: ['Heron'], years: [1966, 1968] });
	const byPlant = buildRow('gm', 'engine', 'V', '400 V8', {
		plant: ['B'],
		years: [1967, 1969],
		n: 2
	});
	const lines = [heron([1965, 1970])];

	it('are asked about where neither is the exception', () => {
		expect(hits([byLine, byPlant, ...lines])).toEqual([
			['crossing_scopes', 'gm.engine.v.1', 'gm.engine.v.2']
		]);
	});

	it.each([
		['years do not meet', { ...byPlant, years_from: 1971, years_to: 1972 }],
		['one says the same', { ...byPlant, meaning: '350 V8' }],
		['one is narrower', { ...byPlant, division: ['Marsh'] }],
		['they share no line', { ...byPlant, line: ['Curlew'], plant: [] }],
		['both name the same columns', { ...byPlant, plant: [], line: ['Heron'] }]
	])('are not, where %s', (_, row) => {
		expect(hits([byLine, row, ...lines]).map(([check]) => check)).not.toContain('crossing_scopes');
	});

	it('are not asked about in tables of knowledge', () => {
		const notes = [
			buildRow('gm', 'note', '', 'One', { line: ['Heron'] }),
			buildRow('gm', 'note', '', 'Another', { plant: ['B'], n: 2 })
		];
		expect(hits([...notes, ...lines])).toEqual([]);
	});
});

describe('a gap', () => {
	const before = buildRow('gm', 'paint', 'C', 'Cream', { years: [1964, 1965] });
	const after = buildRow('gm', 'paint', 'C', 'Cream', { years: [1968, 1969], n: 2 });

	it('between two rows of one meaning is asked about', () => {
		expect(hits([before, after])).toEqual([['gap', 'gm.paint.c.1', 'gm.paint.c.2']]);
	});

	it.each([
		[
			'another meaning fills it',
			[buildRow('gm', 'paint', 'C', 'Coral', { years: [1966, 1966], n: 3 })]
		],
		[
			'it is longer than a code is likely to rest',
			[{ ...after, years_from: 1970, years_to: 1971 }]
		],
		['there is none', [{ ...after, years_from: 1966, years_to: 1966 }]],
		['the rows name no years', [{ ...after, years_from: null, years_to: null }]]
	])('is not, where %s', (_, rows) => {
		const all = rows[0]?.row_key === after.row_key ? [before, ...rows] : [before, after, ...rows];
		expect(hits(all).map(([check]) => check)).not.toContain('gap');
	});

	it('is looked for in the order of the years, whatever the order of the rows', () => {
		const same = { ...after, row_key: 'gm.paint.c.3', years_to: 1970 };
		expect(hits([same, after, before]).filter(([check]) => check === 'gap')).toEqual([
			['gap', 'gm.paint.c.1', 'gm.paint.c.2']
		]);
	});
});

describe('a plant outside its years', () => {
	const plant = buildRow('gm', 'assembly_plant', 'B', 'Bittern', { years: [1964, 1966] });
	const row = (years?: readonly [number, number]) =>
		buildRow('gm', 'paint', 'D', 'Drake', { plant: ['B'], ...(years && { years }) });

	it('is asked about, with the row of the plant', () => {
		expect(hits([plant, row([1968, 1969])])).toEqual([
			['plant_outside_its_years', 'gm.assembly_plant.b.1', 'gm.paint.d.1']
		]);
	});

	it.each([
		['in its years', row([1966, 1967])],
		['of a row without years', row()],
		['that no table has', { ...row([1968, 1969]), plant: ['Z'] }],
		[
			'of another maker',
			{ ...row([1968, 1969]), maker: 'ford' as const, row_key: 'ford.paint.d.1' }
		]
	])('is not, %s', (_, one) => expect(hits([plant, one])).toEqual([]));
});

describe('a paint outside the years of its line', () => {
	const paint = (line: string, years?: readonly [number, number]) =>
		buildRow('gm', 'paint', 'D', 'Drake', { line: [line], ...(years && { years }) });

	it('is asked about', () => {
		expect(hits([heron([1965, 1967]), paint('Heron', [1970, 1971])])).toEqual([
			['paint_outside_its_years', 'gm.paint.d.1']
		]);
	});

	it.each([
		['in its years', paint('Heron', [1967, 1968])],
		['without years', paint('Heron')],
		['of a line that no table has', paint('Curlew', [1970, 1971])]
	])('is not, %s', (_, one) => expect(hits([heron([1965, 1967]), one])).toEqual([]));

	it('is asked about once, with all the lines', () => {
		const tern = buildRow('gm', 'line', 'T', 'Tern', {
			values: { line: 'Tern' },
			years: [1965, 1966]
		});
		const both = { ...paint('Tern', [1970, 1971]), line: ['Tern', 'Heron'] };
		const found = contradictionsOf(compile(content([heron([1965, 1967]), tern, both])));
		expect(found.map(({ message }) => message)).toEqual([
			'A paint is listed for Heron and Tern of 1970–1971, and no table has such a line in any of these years.'
		]);
	});
});

describe('an engine', () => {
	it('of a line that no table sets is asked about', () => {
		const engine = (line: string[]) => buildRow('gm', 'engine', 'V', '350 V8', { line });
		expect(hits([heron([1965, 1967]), engine(['Heron', 'Curlew'])])).toEqual([
			['engine_in_no_line', 'gm.engine.v.1']
		]);
		expect(hits([heron([1965, 1967]), engine(['Heron'])])).toEqual([]);
	});
});

describe('a run of numbers', () => {
	const run = (first_sequence?: number, last_sequence?: number) =>
		buildRow('gm', 'sequence', '', 'A run', {
			line: ['Heron'],
			years: [1966, 1966],
			values: { first_sequence, last_sequence }
		});
	const built = (units_built?: number, year = 1966) =>
		buildRow('gm', 'production', '', 'Built', {
			line: ['Heron'],
			years: [year, year],
			values: { units_built }
		});

	it('that is longer than what was built is asked about', () => {
		expect(hits([run(100001, 100500), built(499)])).toEqual([
			['sequence_beyond_production', 'gm.production.x.1', 'gm.sequence.x.1']
		]);
	});

	it.each([
		['as long as what was built', [run(100001, 100500), built(500)]],
		['of another year', [run(100001, 100500), built(10, 1967)]],
		['without an end', [run(100001), built(10)]],
		['without a count beside it', [run(100001, 100500), built()]],
		['of another line', [run(100001, 100500), { ...built(10), line: ['Curlew'] }]],
		['of all lines', [run(100001, 100500), { ...built(10), line: [] }]]
	])('is not, %s', (_, rows) => expect(hits(rows)).toEqual([]));
});

describe('a rule', () => {
	const constraint = (left: object) =>
		buildRow('gm', 'constraint', '', 'Stands beside', {
			values: { left, right: { attribute: 'engine', any_of: ['V'] } }
		});
	const engine = buildRow('gm', 'engine', 'V', '350 V8', { values: { displacement_cuin: 350 } });
	const asked = (row: ReferenceRow) => hits([engine, row]);

	it('with a value that stands in no row is asked about', () => {
		const row = constraint({ attribute: 'displacement_cuin', any_of: ['999'] });
		expect(asked(row)).toEqual([['rule_without_rows', 'gm.constraint.x.1']]);
	});

	it('whose values stand as a code or among facts is not', () => {
		expect(asked(constraint({ attribute: 'displacement_cuin', any_of: ['999', '350'] }))).toEqual(
			[]
		);
		expect(asked(constraint({ attribute: 'line' }))).toEqual([]);
	});

	it('whose facts are not those of a rule is left to the check of the shapes', () => {
		for (const table of ['rule', 'constraint'] as const)
			expect(asked(buildRow('gm', table, '', 'Says nothing', { values: { when: 1 } }))).toEqual([]);
	});

	it('does not take a list of facts for a value', () => {
		const odd = buildRow('gm', 'engine', 'W', 'Odd', {
			values: { displacement_cuin: { of: 999 } }
		});
		const row = constraint({ attribute: 'displacement_cuin', any_of: ['999'] });
		expect(hits([engine, odd, row])).toEqual([['rule_without_rows', 'gm.constraint.x.1']]);
	});

	it('is looked at on both its sides', () => {
		const rule = (when: object[], then: object[]) =>
			buildRow('gm', 'rule', '', 'When one, then the other', { values: { when, then } });
		const none = { attribute: 'paint', any_of: ['ZZ'] };
		const some = { attribute: 'engine', any_of: ['V'] };
		expect(asked(rule([none], [some]))).toEqual([['rule_without_rows', 'gm.rule.x.1']]);
		expect(asked(rule([some], [none]))).toEqual([['rule_without_rows', 'gm.rule.x.1']]);
		expect(asked(rule([some], [some]))).toEqual([]);
	});
});

describe('a source', () => {
	const row = buildRow('gm', 'paint', 'D', 'Drake');

	it('that nothing cites is asked about', () => {
		const tables = compile(content([row], { sources: [book, other] }));
		expect(contradictionsOf(tables)).toMatchObject([
			{ check: 'source_without_rows', rows: [], sources: [other.key] }
		]);
	});

	it('that another work repeats is not', () => {
		const copy = { ...book, repeats: other.key };
		expect(hits([row], { sources: [copy, other] })).toEqual([]);
	});
});

describe('all of them', () => {
	it('say the same of the same rows in whatever order, and never throw', () => {
		const all = contradictionsOf(compile({ ...INVENTED, rows: [...INVENTED.rows] }));
		fc.assert(
			fc.property(fc.shuffledSubarray([...INVENTED.rows]), (rows) => {
				const keys = new Set(rows.map(({ row_key }) => row_key));
				const citations = INVENTED.citations.filter(({ row_key }) => keys.has(row_key));
				const found = contradictionsOf(compile({ ...INVENTED, rows, citations }));
				if (rows.length === INVENTED.rows.length) expect(found).toEqual(all);
				for (const { rows: named, check, message } of found) {
					expect(CONTRADICTIONS).toContain(check);
					expect(named.filter((key) => !keys.has(key))).toEqual([]);
					expect(message).not.toBe('');
				}
			}),
			{ numRuns: 40 }
		);
	});

	it('tell what a change brings and what it mends', () => {
		const one = buildRow('gm', 'paint', 'W', 'Marsh Green');
		const two = buildRow('gm', 'paint', 'W', 'Reed Green', { n: 2 });
		const three = buildRow('gm', 'engine', 'V', '350 V8', { line: ['Curlew'] });
		const [before, after] = [compile(content([one, two])), compile(content([one, three]))];
		const { brought, mended } = contradictionsAfter(before, after);
		expect(brought.map(({ check }) => check)).toEqual(['engine_in_no_line']);
		expect(mended.map(({ check }) => check)).toEqual(['two_meanings']);
	});

	it('stay the same question while the same rows are asked about', () => {
		const one = buildRow('gm', 'paint', 'W', 'Marsh Green');
		const two = buildRow('gm', 'paint', 'W', 'Reed Green', { n: 2 });
		const [before, after] = [one, { ...one, meaning: 'Moss Green' }].map((row) =>
			compile(content([row, two]))
		) as [ReturnType<typeof compile>, ReturnType<typeof compile>];
		expect(contradictionsAfter(before, after)).toEqual({ brought: [], mended: [] });
		const only = ['gap'] as const;
		const none = compile(content([two]));
		expect(contradictionsAfter(before, none, { only })).toEqual({ brought: [], mended: [] });
		expect(contradictionsAfter(before, none).mended).toHaveLength(1);
	});

	it('can be asked one at a time', () => {
		const tables = compile(INVENTED);
		const each = CONTRADICTIONS.flatMap((name) => contradictionsOf(tables, { only: [name] }));
		expect(each).toEqual(contradictionsOf(tables));
	});

	it('stand whatever the rows say, as long as they compile', () => {
		const some = <T>(...values: T[]) => fc.constantFrom(...values);
		const cell = fc.subarray(['Heron', 'Marsh', 'B', 'V', 'constructor']);
		const year = fc.option(fc.integer({ min: 1955, max: 1985 }), { nil: null });
		const anyRow = fc.record({
			maker: some(...MAKERS),
			table: some(...TABLE_NAMES),
			...{ division: cell, line: cell, body: cell, engine: cell, plant: cell, market: cell },
			...{ years_from: year, years_to: year },
			code: some('', 'B', 'V', 'H'),
			meaning: some('One', 'Another'),
			values: fc.dictionary(
				some(
					'line',
					'left',
					'right',
					'when',
					'then',
					'units_built',
					'first_sequence',
					'last_sequence'
				),
				fc.oneof(
					fc.jsonValue(),
					fc.integer(),
					fc.record({ attribute: some('line', '__proto__', 'engine'), any_of: some(['V'], ['Z']) })
				)
			),
			note: some('', 'A remark')
		});
		fc.assert(
			fc.property(fc.array(anyRow, { maxLength: 30 }), (parts) => {
				const rows = parts.map((row, at) => ({
					...row,
					row_key: `${row.maker}.${row.table}.x.${at}`
				}));
				const found = contradictionsOf(compile(content(rows)));
				for (const hit of found) expect(contradictionSchema.parse(hit)).toEqual(hit);
				const named = found.map(({ check, rows: keys, sources }) =>
					[check, ...keys, ...(keys.length > 0 ? [] : sources)].join(' ')
				);
				expect(new Set(named).size).toBe(named.length);
			}),
			{ numRuns: 200 }
		);
	});

	it('are asked of the released tables, each by rows that are there', () => {
		const tables = compile(readContent('data'));
		const found = contradictionsOf(tables);
		expect(found.flatMap(({ rows }) => rows).filter((key) => !tables.rows.has(key))).toEqual([]);
		expect(found.filter(({ check }) => check === 'engine_in_no_line')).toEqual([]);
	});
});

describe('the digest of a hit', () => {
	const green = buildRow('gm', 'paint', 'W', 'Marsh Green', { line: ['Heron', 'Curlew'] });
	const reed = buildRow('gm', 'paint', 'W', 'Reed Green', { line: ['Heron'], n: 2 });
	const of = (rows: readonly ReferenceRow[], parts: Partial<EditionContent> = {}) =>
		contradictionsOf(compile(content(rows, parts)), { only: ['two_meanings'] })[0]?.digest;
	const asked = of([green, reed]);

	it('names the sources of the rows and how much the question weighs', () => {
		expect(contradictionsOf(compile(content([green, reed])))[0]).toMatchObject({
			weight: 'heavy',
			sources: [book.key],
			digest: asked
		});
	});

	it.each([
		['the order of rows', of([reed, green])],
		['the order within a scope', of([{ ...green, line: ['Curlew', 'Heron'] }, reed])],
		['another row', of([green, reed, heron([1965, 1967])])],
		['another work', of([green, reed], { sources: [book, other] })]
	])('stays through %s', (_, digest) => expect(digest).toBe(asked));

	it.each([
		['a row', of([{ ...green, note: 'Seen on a car.' }, reed])],
		['a work', of([green, reed], { sources: [{ ...book, year: 1971 }] })],
		[
			'a citation',
			of([green, reed], {
				citations: [
					buildCitation(green.row_key, book.key, { locator: 'page 12' }),
					buildCitation(reed.row_key, book.key)
				]
			})
		]
	])('changes with %s', (_, digest) => {
		expect(digest).toMatch(/^[0-9a-f]{16}$/);
		expect(digest).not.toBe(asked);
	});

	it('is that of the published algorithm', () => {
		// Known values of FNV-1a with 64 bits.
		expect(['', 'a', 'foobar'].map(digestOf)).toEqual([
			'cbf29ce484222325',
			'af63dc4c8601ec8c',
			'85944171f73967e8'
		]);
	});
});
