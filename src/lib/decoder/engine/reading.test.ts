import { describe, expect, it } from 'vitest';
import { buildCitation, buildContent, buildRow } from '../../../../tests/fixtures/builders';
import { INVENTED } from '../../../../tests/fixtures/invented';
import { INVENTED_LAYOUTS } from '../../../../tests/fixtures/invented-layout';
import type { EditionContent, ReadContext, Reading, ReadingField } from '../../types';
import { read, type ReadRequest } from '../read';
import { compile } from './compile';

const tables = compile(INVENTED);
const ask = (text: string, context: ReadContext = {}, more: Partial<ReadRequest> = {}) =>
	read(tables, { text, kind: 'serial', context, layouts: INVENTED_LAYOUTS, ...more });
const first = (text: string, context: ReadContext = {}): Reading =>
	ask(text, context).readings[0] as Reading;
const inYear = (text: string, year: number): Reading =>
	ask(text).readings.find((own) => own.model_year === year) as Reading;
const field = (reading: Reading, name: string): ReadingField =>
	reading.fields.find((own) => own.name === name) as ReadingField;
const withRows = (parts: Partial<EditionContent>) =>
	compile({
		rows: [...INVENTED.rows, ...(parts.rows ?? [])],
		citations: [...INVENTED.citations, ...(parts.citations ?? [])],
		sources: INVENTED.sources,
		claims: INVENTED.claims
	});

describe('a whole serial', () => {
	const reading = first('2H37T6P100');

	it('reads each field under the scope that the others give', () => {
		expect(reading).toMatchObject({
			layout: 'gm-invented-9',
			maker: 'gm',
			division: 'Pontiac',
			model_year: 1966,
			state: 'complete',
			rank: 1
		});
		expect(field(reading, 'line')).toMatchObject({ outcome: 'found', meaning: 'Heron' });
		expect(field(reading, 'engine').values).toMatchObject({ displacement_cuin: 300 });
		expect(field(reading, 'assembly_plant')).toMatchObject({ from: 7, to: 7, code: 'P' });
	});

	it('covers every character with exactly one primary field', () => {
		const places = reading.fields
			.filter((own) => own.derived_from === undefined)
			.flatMap((own) => Array.from({ length: own.to - own.from + 1 }, (_, n) => own.from + n));
		expect(places).toEqual([1, 2, 3, 4, 5, 6, 7, 8, 9, 10]);
	});

	it('puts derived fields after their last parent and names the parents', () => {
		const cylinders = field(reading, 'cylinder_group');
		expect(cylinders).toMatchObject({
			meaning: 'Eight cylinders',
			values: { cylinders: 8 },
			derived_from: ['engine'],
			from: 5,
			to: 5
		});
		const names = reading.fields.map((own) => own.name);
		expect(names.indexOf('series')).toBe(names.indexOf('body_style') + 1);
		expect(field(reading, 'series')).toMatchObject({ outcome: 'not_listed', code: 'H37' });
	});

	it('says where a sequence number stands in its run', () => {
		expect(field(reading, 'sequence_number').detail).toContain('number 1 of the run');
		expect(field(inYear('2H37T6P099', 1966), 'sequence_number').detail).toContain(
			'Below the first'
		);
		expect(field(inYear('2H37T6P900', 1966), 'sequence_number').detail).toContain('Above the last');
		expect(field(first('2H37T7P600'), 'sequence_number').detail).toContain('number 101');
		expect(field(first('2H37T5P600'), 'sequence_number').detail).toContain('not told');
	});

	it('ranks a number outside the run on record behind one that is not', () => {
		const { readings } = ask('2H37T6P900');
		expect(readings.map((own) => own.model_year)).toEqual([1976, 1966]);
		expect(readings[1]?.why).toContain('outside the run');
	});

	it('reports the questions that it put when asked to', () => {
		const own = ask('2H37T6B100', {}, { lookups: true }).readings[0] as Reading;
		expect(field(own, 'engine').lookups).toEqual([
			{ table: 'engine', code: 'T', row_key: 'gm.engine.t.1' }
		]);
		expect(field(own, 'sequence_number').lookups).toEqual([
			{ table: 'sequence', code: '', row_key: null }
		]);
		expect(field(first('2H37T6P100'), 'engine').lookups).toBeUndefined();
	});
});

describe('one figure for two years', () => {
	it('gives both, and ranks the one whose rows fit first', () => {
		const { readings } = ask('2H37T6P100');
		expect(readings.map((own) => own.model_year)).toEqual([1966, 1976]);
		expect(readings[1]?.why).toContain('Fewer of its fields');
	});

	it('puts the year that was given first, and removes nothing', () => {
		const { readings } = ask('2H37T6P100', { year: 1976 });
		expect(readings.map((own) => [own.model_year, own.rank])).toEqual([
			[1976, 1],
			[1966, 2]
		]);
		expect(readings[1]?.why).toContain('what you gave');
	});

	it('takes maker, division and plant as hints as well', () => {
		expect(ask('2H37T6P100', { maker: 'gm', plant: 'P' }).readings[0]?.rank).toBe(1);
		expect(ask('2H37T6P100', { maker: 'ford', plant: 'b' }).readings).toHaveLength(2);
		expect(ask('2H37T6P100', { division: 'Chevrolet' }).readings[0]?.division).toBe('Pontiac');
	});

	it('shows equal readings as equal', () => {
		const bare = compile(buildContent());
		const result = read(bare, { text: '2H37T6P100', layouts: INVENTED_LAYOUTS });
		expect(result.readings.map((own) => own.rank)).toEqual([1, 1]);
		expect(result.readings[0]?.why).toContain('as likely');
		expect(field(result.readings[0] as Reading, 'model_year').strength).toBe('not_rated');
	});

	it('ranks thin rows behind better ones', () => {
		const extra = withRows({
			rows: [
				buildRow('gm', 'line', 'T', 'Teal', { years: [1966, 1966], values: { line: 'Teal' } }),
				buildRow('gm', 'line', 'T', 'Tern', { n: 2, years: [1976, 1976], values: { line: 'Tern' } })
			],
			citations: [
				buildCitation('gm.line.t.1', 'memory'),
				buildCitation('gm.line.t.2', 'works-manual')
			]
		});
		const { readings } = read(extra, { text: '2T37Q6Q1?0', layouts: INVENTED_LAYOUTS });
		expect(readings.map((own) => own.model_year)).toEqual([1976, 1966]);
		expect(readings[1]?.why).toContain('thin');
	});
});

describe('outcomes', () => {
	it('contested: shows both values and takes no side', () => {
		const own = field(first('2H37W7P600'), 'engine');
		expect(own).toMatchObject({ outcome: 'contested', meaning: null, strength: 'contested' });
		expect(own.alternatives.map((one) => one.values.displacement_cuin)).toEqual([340, 342]);
		expect(own.alternatives.map((one) => one.sources[0]?.key)).toEqual([
			'marsh-book',
			'wader-club'
		]);
		const cylinders = field(first('2H37W7P600'), 'cylinder_group');
		expect(cylinders.meaning).toBe('Eight cylinders');
	});

	it('contested in a fact: the derived field shows both', () => {
		const extra = withRows({
			rows: [
				buildRow('gm', 'engine', 'W', '200 six', {
					n: 3,
					division: ['Pontiac'],
					years: [1967, 1967],
					values: { cylinders: 6 }
				})
			],
			citations: [buildCitation('gm.engine.w.3', 'web-one')]
		});
		const own = read(extra, { text: '2H37W7P600', layouts: INVENTED_LAYOUTS }).readings[0];
		const cylinders = field(own as Reading, 'cylinder_group');
		expect(cylinders.outcome).toBe('contested');
		expect(cylinders.alternatives.map((one) => one.meaning)).toEqual([
			'Eight cylinders',
			'Six cylinders'
		]);
	});

	it('not listed: says what we lack and what is known nearby', () => {
		const own = field(first('2H37W6P100'), 'engine');
		expect(own.outcome).toBe('not_listed');
		expect(own.detail).toContain('nothing against the car');
		expect(own.possible[0]).toMatchObject({ code: 'W', scope: 'Pontiac, 1967' });
	});

	it('not used: only under a claim, whose source it names', () => {
		const own = field(first('2H99T7P100'), 'body_style');
		expect(own).toMatchObject({ outcome: 'not_used' });
		expect(own.sources[0]?.key).toBe('works-manual');
		expect(field(first('2K99T7P100'), 'body_style').outcome).toBe('not_listed');
		expect(field(first('2H99T0P100'), 'body_style').outcome).toBe('not_listed');
		expect(ask('2H99T6P100').readings.map((one) => one.model_year)).toEqual([1976, 1966]);
		expect(ask('2H99T6P100').readings[1]?.why).toContain('not used');
	});

	it('says what a code meant wherever rows hold for all years', () => {
		const extra = withRows({
			rows: [
				buildRow('gm', 'engine', 'S', 'Always so', { division: ['Pontiac'], line: ['Dunlin'] })
			]
		});
		const own = read(extra, { text: '2H37S7P600', layouts: INVENTED_LAYOUTS }).readings[0];
		expect(field(own as Reading, 'engine')).toMatchObject({
			outcome: 'not_listed',
			possible: [{ code: 'S', meaning: 'Always so', scope: 'Pontiac, Dunlin' }]
		});
	});

	it('lists a meaning once, whatever the number of rows that say so', () => {
		const extra = withRows({
			rows: [
				buildRow('gm', 'engine', 'S', 'The same', { years: [1967, 1967], line: ['Heron'] }),
				buildRow('gm', 'engine', 'S', 'The same', { n: 2, years: [1967, 1968], line: ['Heron'] })
			]
		});
		const own = read(extra, { text: '2H37[RS]7P600', layouts: INVENTED_LAYOUTS }).readings[0];
		expect(field(own as Reading, 'engine').possible.map((one) => one.code)).toEqual(['S', 'R']);
	});

	it('takes the line from rows that agree on it', () => {
		const extra = withRows({
			rows: [
				buildRow('gm', 'line', 'G', 'Heron, early', {
					division: ['Pontiac'],
					values: { line: 'Heron', series: 'A' }
				}),
				buildRow('gm', 'line', 'G', 'Heron, late', {
					n: 2,
					division: ['Pontiac'],
					values: { line: 'Heron', series: 'B' }
				})
			]
		});
		const own = read(extra, { text: '2G69T7P600', layouts: INVENTED_LAYOUTS }).readings[0];
		expect(field(own as Reading, 'body_style').meaning).toBe('4-door sedan');
	});

	it('illegible: lists what it could be under the rest', () => {
		const own = field(first('2H37?7P600'), 'engine');
		expect(own.outcome).toBe('illegible');
		expect(own.possible.map((one) => one.code)).toEqual(['T', 'W', 'W', 'X']);
		expect(own.detail).toBe('Unread.');
		const either = field(first('2H37[TQ]7P600'), 'engine');
		expect(either.detail).toBe('Could be Q or T.');
		expect(either.possible.map((one) => [one.code, one.meaning])).toEqual([
			['T', '300-cubic-inch V8, two-barrel carburetor'],
			['Q', 'Not in the tables']
		]);
	});

	it('depends on a field that is unread, or that has no row', () => {
		expect(field(first('2?69T6P100'), 'body_style')).toMatchObject({ outcome: 'illegible' });
		const extra = withRows({
			rows: [
				buildRow('gm', 'assembly_plant', 'S', 'Smew Falls', { line: ['Heron'] }),
				buildRow('gm', 'assembly_plant', 'S', 'Scoter Point', { n: 2, line: ['Dunlin'] })
			]
		});
		const own = read(extra, { text: '2Z37T6S100', layouts: INVENTED_LAYOUTS }).readings[0];
		const plant = field(own as Reading, 'assembly_plant');
		expect(plant.outcome).toBe('not_listed');
		expect(plant.detail).toContain('depends on the line');
		expect(plant.possible).toHaveLength(2);
		const unread = read(extra, { text: '2?37T6S100', layouts: INVENTED_LAYOUTS }).readings[0];
		expect(field(unread as Reading, 'assembly_plant').outcome).toBe('illegible');
	});

	it('needs no line where the row for all lines says the same', () => {
		const extra = withRows({
			rows: [
				buildRow('gm', 'assembly_plant', 'S', 'Smew Falls'),
				buildRow('gm', 'assembly_plant', 'S', 'Smew Falls', { n: 2, line: ['Dunlin'] })
			]
		});
		const own = read(extra, { text: '2Z37T6S100', layouts: INVENTED_LAYOUTS }).readings[0];
		expect(field(own as Reading, 'assembly_plant')).toMatchObject({
			outcome: 'found',
			rows: ['gm.assembly_plant.s.1', 'gm.assembly_plant.s.2']
		});
	});

	it('an unread year is taken as each year in turn', () => {
		const { readings } = ask('2H37T?P100');
		expect(readings.map((own) => own.model_year).sort()).toEqual([1965, 1966, 1967, 1970, 1976]);
		expect(field(readings[0] as Reading, 'model_year')).toMatchObject({ outcome: 'illegible' });
		expect(ask('2H37T[57]P100').readings.map((own) => own.model_year)).toEqual([1965, 1967]);
	});

	it('an unread division is each division that has a row', () => {
		const { readings } = ask('?H37T7P600');
		expect(readings.map((own) => own.division)).toEqual(['Pontiac', 'Chevrolet']);
		const extra = withRows({
			rows: [buildRow('gm', 'division', '3', 'Pontiac abroad', { values: { division: 'Pontiac' } })]
		});
		const twice = read(extra, { text: '?H37T7P600', layouts: INVENTED_LAYOUTS }).readings;
		expect(twice.map((own) => own.division)).toEqual(['Pontiac', 'Chevrolet']);
	});
});

describe('facts of a row', () => {
	it('become fields of their own, and leave no field where the row has none', () => {
		const lines = first('2H37T6P100').fields.filter((own) => own.name === 'line');
		expect(lines.map((own) => own.meaning)).toEqual(['Heron', 'Heron']);
		const extra = withRows({
			rows: [
				buildRow('gm', 'engine', 'Y', 'One', { years: [1967, 1967] }),
				buildRow('gm', 'engine', 'Y', 'Two', { n: 2, years: [1967, 1967] }),
				buildRow('gm', 'engine', 'V', 'Alone', { years: [1967, 1967] })
			]
		});
		for (const text of ['2H37Y7P600', '2H37V7P600']) {
			const own = read(extra, { text, layouts: INVENTED_LAYOUTS }).readings[0] as Reading;
			expect(field(own, 'cylinder_group')).toBeUndefined();
		}
	});

	it('tell the same again when the same row is read again', () => {
		expect(first('2H37T6P100')).toEqual(first('2H37T6P100'));
	});
});

describe('what is kept of beginnings', () => {
	it('changes nothing, however many there are', () => {
		const before = ask('2H37T7P600');
		const letters = 'ABCDEFGHIJKLMNOPQRSTUVWXYZ';
		for (let n = 0; n < 5000; n += 1) {
			const body = String(n % 100).padStart(2, '0');
			const line = letters.charAt(Math.floor(n / 100) % 26);
			ask(`2${line}${body}${letters.charAt(Math.floor(n / 2600))}7P600`);
		}
		expect(ask('2H37T7P600')).toEqual(before);
		expect(ask('2H37T7P601')).not.toEqual(before);
	});
});

describe('a division given beside a text', () => {
	it('stands in where no row names one', () => {
		expect(first('9H37T7P600', { division: 'Pontiac' }).division).toBe('Pontiac');
		expect(first('9H37T7P600', { division: 'Mercury' }).division).toBeNull();
	});
});

describe('many characters that could be either', () => {
	it('count what is possible where a list would be too long', () => {
		const rows = Array.from({ length: 50 }, (_, n) =>
			buildRow('gm', 'body_style', String(n + 10), `Body ${n}`, { n: 50 + n })
		);
		const own = read(withRows({ rows }), { text: '2H??T7P600', layouts: INVENTED_LAYOUTS });
		const body = field(own.readings[0] as Reading, 'body_style');
		expect(body.possible).toEqual([]);
		expect(body.detail).toMatch(/^Two of two unread. 5\d meanings are possible/);
	});

	it('spell no list that nobody would read', () => {
		const own = field(first('2H[0123456789][0123456789]T7P600'), 'body_style');
		expect(own.possible.map((one) => one.code)).toEqual(['37', '45', '67', '69']);
	});
});

describe('a beginning', () => {
	it('is read as far as it goes', () => {
		const own = first('2H3');
		expect(own.state).toBe('partial');
		expect(field(own, 'engine')).toMatchObject({ outcome: 'illegible', detail: 'Not typed yet.' });
		expect(field(own, 'sequence_number').detail).toBe('Not typed yet.');
		expect(field(own, 'model_year').detail).toBe('Not typed yet.');
	});
});

describe('the order of rows', () => {
	it('changes no reading', () => {
		const turned = compile({
			rows: [...INVENTED.rows].reverse(),
			citations: [...INVENTED.citations].reverse(),
			sources: [...INVENTED.sources].reverse(),
			claims: [...INVENTED.claims].reverse()
		});
		for (const text of ['2H37T6P100', '2H37W7P600', '?H37?6P1?0', '2H99T6B100'])
			expect(read(turned, { text, layouts: INVENTED_LAYOUTS })).toEqual(
				read(tables, { text, layouts: INVENTED_LAYOUTS })
			);
	});
});
