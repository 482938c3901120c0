import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import {
	buildCitation,
	buildContent,
	buildRow,
	buildSource
} from '../../../tests/fixtures/builders';
import { INVENTED } from '../../../tests/fixtures/invented';
import type { ReadContext, ReadResult } from '../types';
import { candidatesOf, compile, LAYOUTS, normalise, read } from '.';
import { textOf } from './engine/characters';

const paint = (n: number, meaning: string, parts: Parameters<typeof buildRow>[4]) =>
	buildRow('gm', 'paint', 'EE', meaning, { n, ...parts });
const tables = compile(
	buildContent({
		rows: [
			paint(1, 'Blue', { division: ['Pontiac'], years: [1966, 1966] }),
			paint(2, 'Turquoise', { division: ['Pontiac'], years: [1967, 1967] }),
			paint(3, 'Deepwater Blue', { division: ['Chevrolet'], years: [1967, 1967] }),
			buildRow('gm', 'trim', 'EE', 'Black vinyl'),
			buildRow('ford', 'axle', 'EE', 'Ratio', { plant: ['F'], division: ['Mercury'] }),
			buildRow('gm', 'roof', 'QQ', 'White', { years: [1966, 1966] }),
			buildRow('gm', 'roof', 'QQ', 'Black', { n: 2, years: [1966, 1966] }),
			buildRow('gm', 'option', 'Z28', 'A package'),
			buildRow('gm', 'option', 'Z11', 'Another'),
			...Array.from({ length: 5 }, (_, n) =>
				buildRow('amc', 'paint', 'P1', `Paint ${n}`, { n: n + 1, years: [1970 + n, 1970 + n] })
			),
			buildRow('gm', 'engine', 'RM23', 'Never struck so')
		],
		citations: ['gm.roof.qq.1', 'gm.roof.qq.2'].map((key) => buildCitation(key, 'a-book')),
		sources: [buildSource('a-book')]
	})
);
const code = (text: string, context: ReadContext = {}): ReadResult =>
	read(tables, { text, kind: 'code', context });

describe('a bare code', () => {
	it('gives one reading a table where it stands', () => {
		const { readings } = code('ee');
		expect(readings.map((own) => [own.layout_title, own.maker, own.division])).toEqual([
			['Paint', 'gm', null],
			['Trim', 'gm', null],
			['Axles', 'ford', 'Mercury']
		]);
	});

	it('says what it depends on while the year is open, and lists where each meaning holds', () => {
		const own = code('EE').readings[0]?.fields[0];
		expect(own).toMatchObject({ outcome: 'found', meaning: 'Depends on division, line and year' });
		expect(own?.possible.map((one) => one.scope)).toContain('Chevrolet, 1967');
		const years = code('P1').readings[0]?.fields[0];
		expect(years?.possible).toHaveLength(5);
	});

	it('is narrowed by division, year, plant, field and maker', () => {
		const context = { division: 'Pontiac', year: 1967 };
		expect(code('EE', context).readings[0]?.fields[0]?.meaning).toBe('Turquoise');
		expect(code('EE', { maker: 'ford' }).readings).toHaveLength(1);
		expect(code('EE', { field: 'trim' }).readings).toHaveLength(1);
		expect(code('EE', { maker: 'ford', plant: 'f' }).readings[0]?.fields[0]?.meaning).toBe('Ratio');
		expect(code('EE', { maker: 'ford', plant: 'z' }).readings).toEqual([]);
	});

	it('shows sources that differ, and lists what a marked code could be', () => {
		expect(code('QQ').readings[0]?.fields[0]?.outcome).toBe('contested');
		expect(code('QQ', { year: 1966 }).readings[0]?.fields[0]?.outcome).toBe('contested');
		const marked = code('Z??').readings[0]?.fields[0];
		expect(marked).toMatchObject({ outcome: 'illegible' });
		expect(marked?.possible.map((one) => one.code)).toEqual(['Z11', 'Z28']);
	});

	it('says so when it stands nowhere', () => {
		expect(code('QZ').problems).toMatchObject([{ code: 'not_in_tables' }]);
	});

	it('reports its look-ups when asked to', () => {
		const { readings } = read(tables, {
			text: 'EE',
			kind: 'code',
			lookups: true,
			context: { field: 'trim' }
		});
		expect(readings[0]?.fields[0]?.lookups).toEqual([
			{ table: 'trim', code: 'EE', row_key: 'gm.trim.ee.1' }
		]);
	});
});

describe('a text without a kind', () => {
	it('is a code when short, a serial when longer, and both where both fit', () => {
		expect(read(tables, { text: 'EE' }).input.kind).toBe('code');
		expect(read(tables, { text: 'RM23' }).input.kind).toBe('serial');
		const { readings } = read(tables, { text: 'RM23' });
		expect(readings[readings.length - 1]?.layout_title).toBe('Engine codes');
		expect(read(tables, { text: '12' }).input.kind).toBe('serial');
		expect(read(tables, { text: 'RM23N0G100123' }).input.kind).toBe('serial');
	});

	it('gives at most twenty-four readings and counts the rest', () => {
		const result = read(tables, { text: '?' + '?'.repeat(15) + '1' });
		expect(result.readings).toHaveLength(24);
		expect(result.more).toBe(98);
	});

	it('gives nothing for a text without characters', () => {
		expect(read(tables, { text: '***' })).toEqual({
			input: { kind: null, text: '***', normalised: '' },
			readings: [],
			more: 0,
			problems: []
		});
		expect(read(tables, { text: '--', kind: 'serial' }).input.kind).toBe('serial');
	});

	it('names the nearest layout when none fits', () => {
		expect(read(tables, { text: 'RM23N0G10012' }).problems[0]).toMatchObject({ code: 'too_short' });
	});
});

describe('candidates', () => {
	const character = fc.constantFrom(...'ABCDEFGHIJKLMNOPQRSTUVWXYZ0123456789');
	const good = fc.constantFrom(...LAYOUTS.map((layout) => layout.examples.good));
	const sample = fc
		.tuple(good, fc.array(fc.tuple(fc.nat(16), character), { maxLength: 3 }), fc.nat(17))
		.map(([text, changes, cut]) => {
			const cells = [...text.replaceAll('x', '1')];
			for (const [index, other] of changes) if (index < cells.length) cells[index] = other;
			return cut > 12 ? cells.slice(0, cut - 12) : cells;
		});
	const names = (cells: readonly string[]): string[] =>
		candidatesOf(cells).flatMap(({ prepared, years }) =>
			years.map((year) => `${prepared.layout.id} ${year}`)
		);

	it('of a marked text contain those of every text it stands for', () => {
		const mark = fc.tuple(fc.nat(16), fc.option(fc.tuple(character, character)));
		fc.assert(
			fc.property(sample, fc.array(mark, { maxLength: 5 }), (cells, marks) => {
				const marked = [...cells];
				for (const [index, pair] of marks) {
					if (index >= cells.length) continue;
					const own = cells[index] as string;
					marked[index] = pair === null ? '?' : [...new Set([own, ...pair])].sort().join('');
				}
				const wide = new Set(names(normalise(textOf(marked)).cells));
				return names(cells).every((name) => wide.has(name));
			}),
			{ numRuns: 2000 }
		);
	});
});

describe('any text at all', () => {
	const invented = compile(INVENTED);
	it('is read without an error; primary fields never overlap, and those of a serial leave nothing out', () => {
		const serials = LAYOUTS.map(({ id }) => id);
		fc.assert(
			fc.property(
				fc.oneof(
					fc.string({ unit: 'binary', maxLength: 64 }),
					fc.string({ unit: fc.constantFrom(...'ABR2379?[]x*_#0 '), minLength: 9, maxLength: 20 })
				),
				(text) => {
					const result = read(invented, { text });
					for (const reading of result.readings) {
						const places = reading.fields
							.filter((own) => own.derived_from === undefined)
							.flatMap((own) =>
								Array.from({ length: own.to - own.from + 1 }, (_, n) => own.from + n)
							);
						const own = serials.includes(reading.layout ?? '')
							? (place: number, index: number) => place === index + 1
							: (place: number, index: number) =>
									index === 0 || place > (places[index - 1] as number);
						if (!places.every(own)) return false;
					}
					return result.readings.length <= 24;
				}
			),
			{ numRuns: 300 }
		);
	});
});
