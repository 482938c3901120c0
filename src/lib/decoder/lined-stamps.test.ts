import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import {
	buildCitation,
	buildClaim,
	buildContent,
	buildRow,
	buildSource
} from '../../../tests/fixtures/builders';
import type { Problem, ReadContext, Reading, ReadingField, ReadResult } from '../types';
import {
	compile,
	examineText,
	hasLines,
	linesOf,
	read,
	readStamps,
	type LinedLayout,
	type ReadRequest
} from '.';
import {
	gmTag,
	chryslerTag,
	pad,
	casting,
	twoLinePad,
	shortPad
} from '../../../tests/fixtures/lined';

const firm = [
	'gm.paint.52.1',
	'gm.paint.50.1',
	'gm.unit_code.cc.1',
	'gm.paint.54.1',
	'gm.paint.54.2'
];
const tables = compile(
	buildContent({
		rows: [
			buildRow('gm', 'division', '1', 'Chevrolet', { values: { division: 'Chevrolet' } }),
			buildRow('gm', 'division', '2', 'Pontiac', { values: { division: 'Pontiac' } }),
			buildRow('gm', 'series', '24', 'Curlew', {
				division: ['Chevrolet'],
				values: { line: 'Curlew', series: 'Curlew' }
			}),
			buildRow('gm', 'series', '37', 'Heron', { division: ['Pontiac'], values: { line: 'Heron' } }),
			buildRow('gm', 'style_number', '12437', 'Curlew hardtop', {
				values: { division: 'Chevrolet', line: 'Curlew', doors: 2 }
			}),
			buildRow('gm', 'style_number', '237/39', 'Heron sedan', {
				division: ['Pontiac'],
				values: { line: 'Heron' }
			}),
			buildRow('gm', 'plant_abbreviation', 'NOR', 'Norwood', {
				values: { plant_code: 'N', plant_city: 'Norwood' }
			}),
			buildRow('gm', 'plant_abbreviation', 'LOS', 'Los Angeles', { values: {} }),
			buildRow('gm', 'assembly_plant', 'N', 'Norwood', { values: { plant_city: 'Norwood' } }),
			buildRow('gm', 'trim', '711', 'Black', {}),
			buildRow('gm', 'trim', '713', 'Ivory', { division: ['Pontiac'] }),
			buildRow('gm', 'assembly_plant', 'L', 'Van Nuys', { division: ['Chevrolet'] }),
			buildRow('gm', 'assembly_plant', 'L', 'Elsewhere', { n: 2, division: ['Pontiac'] }),
			buildRow('gm', 'assembly_plant', 'P', 'Pontiac plant', { division: ['Pontiac'] }),
			buildRow('gm', 'assembly_plant', 'P', 'Here', { n: 2, division: ['Chevrolet'] }),
			buildRow('gm', 'assembly_plant', 'P', 'There', { n: 3, division: ['Chevrolet'] }),
			buildRow('gm', 'trim', '712', 'Blue', { division: ['Chevrolet'] }),
			buildRow('gm', 'trim', '712', 'Green', { n: 2, division: ['Pontiac'] }),
			buildRow('gm', 'paint', '52', 'Red', { years: [1969, 1969], note: 'Early cars.' }),
			buildRow('gm', 'paint', '50', 'White', {}),
			buildRow('gm', 'paint', '54', 'Gold', {}),
			buildRow('gm', 'paint', '54', 'Sand', { n: 2 }),
			buildRow('gm', 'option', 'A/5', 'Heater', {}),
			buildRow('gm', 'unit_code', 'CC', '300 V8', {
				division: ['Chevrolet'],
				years: [1969, 1970],
				values: { displacement_cuin: 300 }
			}),
			buildRow('gm', 'unit_code', 'CD', '301 V8', { division: ['Chevrolet'], years: [1965, 1966] }),
			buildRow('gm', 'unit_code', 'CD', '302 V8', {
				n: 2,
				division: ['Pontiac'],
				years: [1965, 1966]
			}),
			buildRow('gm', 'unit_code', 'CE', '303 V8', { division: ['Chevrolet'], years: [1969, 1969] }),
			buildRow('gm', 'unit_code', 'CE', '304 V8', {
				n: 2,
				division: ['Chevrolet'],
				years: [1969, 1969]
			}),
			buildRow('gm', 'casting_number', '3970010', 'Block', {
				division: ['Chevrolet'],
				years: [1969, 1979],
				values: { part: 'block' }
			}),
			...['A', 'B', 'C', 'D', 'E', 'F'].map((body, n) =>
				buildRow('gm', 'casting_number', '3970020', 'Block', {
					n: n + 1,
					plant: [body],
					values: { part: 'block' }
				})
			),
			buildRow('gm', 'casting_number', '3970030', 'Head of no years', {}),
			buildRow('other', 'glass', 'X', 'Shared glass', {}),
			...Array.from({ length: 45 }, (_, n) =>
				buildRow(
					'gm',
					'paint',
					`Z${'ABCDEFGHIJKLMNOPQRSTUVWXYZ0123456789'.charAt(n % 36)}`,
					`Paint ${n}`,
					{ n: n + 1 }
				)
			)
		],
		citations: firm.map((key) => buildCitation(key, 'manual')),
		sources: [buildSource('manual', { kind: 'factory_paper' })],
		claims: [
			buildClaim('gm.trim.all', 'gm', 'trim', 'manual', { years_from: 1969, years_to: 1969 })
		]
	})
);
const LINED: readonly LinedLayout[] = [gmTag, chryslerTag, pad, casting, twoLinePad, shortPad];
const ask = (text: string, request: Partial<ReadRequest> = {}): ReadResult =>
	read(tables, { text, kind: 'body_tag', lined: LINED, ...request });
const first = (result: ReadResult): Reading => result.readings[0] as Reading;
const fieldOf = (result: ReadResult, name: string, nth = 0): ReadingField =>
	first(result).fields.filter((own) => own.name === name)[nth] as ReadingField;
const codes = ({ problems }: ReadResult): string[] => problems.map(({ code }) => code);
const problem = (result: ReadResult, code: string): Problem =>
	result.problems.find((own) => own.code === code) as Problem;

const TAG = 'ST 69 12437 NOR 245876 BDY / TR 711 52 PNT / 01C';
const car: ReadContext = { serial: '124379N512345' };

describe('lines of a stamp', () => {
	it('fall apart at line breaks and slashes between spaces, blank ones dropped', () => {
		const { lines, normalised } = linesOf('st69-12437\r\n\n  /  tr.711 / [38]5?');
		expect(normalised).toBe('ST69 12437 / TR 711 / [38]5?');
		expect(lines.map(({ number }) => number)).toEqual([1, 2, 3]);
		expect(lines[2]?.places).toEqual([
			[23, 26],
			[27, 27],
			[28, 28]
		]);
		expect(hasLines('A / B')).toBe(true);
		expect(hasLines('A/B')).toBe(false);
		expect(linesOf('  ', true).lines).toEqual([]);
	});

	it('are not divided within a sign, however long it is in bytes', () => {
		expect(linesOf('\u{2C00}\u{20000}\u01F1 1').normalised).toBe('??DZ 1');
	});

	it('are the same when they are split again, whatever was typed', () => {
		fc.assert(
			fc.property(fc.string({ unit: 'binary', maxLength: 80 }), (text) => {
				const { normalised } = linesOf(text);
				expect(linesOf(normalised).normalised).toBe(normalised);
			}),
			{ numRuns: 3_000 }
		);
	});
});

describe('a body tag', () => {
	it('is read field by field, with lines and places in the text', () => {
		const result = ask(TAG, { context: car });
		expect(result.problems).toEqual([]);
		expect(result.input.normalised).toBe(TAG);
		expect(first(result)).toMatchObject({
			layout: gmTag.id,
			division: 'Chevrolet',
			model_year: 1969,
			state: 'complete'
		});
		expect(fieldOf(result, 'model_year')).toMatchObject({
			line: 1,
			from: 4,
			to: 5,
			outcome: 'found',
			values: { model_year: 1969 }
		});
		expect(fieldOf(result, 'line')).toMatchObject({
			meaning: 'Curlew',
			derived_from: ['body_style']
		});
		expect(fieldOf(result, 'assembly_plant')).toMatchObject({ values: { plant_code: 'N' } });
		expect(fieldOf(result, 'body_number')).toMatchObject({
			outcome: 'found',
			strength: 'not_rated'
		});
		expect(fieldOf(result, 'paint')).toMatchObject({
			line: 2,
			meaning: 'Red',
			detail: 'Early cars.'
		});
		expect(fieldOf(result, 'build_date')).toMatchObject({ line: 3, outcome: 'found' });
	});

	it('without its division and year says on what a code depends, and lists it', () => {
		const result = ask('ST 88 99999 LOS 1234 / TR 712 54 / 01C A5 B77');
		expect(first(result)).toMatchObject({ model_year: null, division: null });
		expect(fieldOf(result, 'model_year')).toMatchObject({ outcome: 'not_listed' });
		expect(fieldOf(result, 'trim')).toMatchObject({
			outcome: 'found',
			meaning: 'Depends on the division'
		});
		expect(fieldOf(result, 'trim').possible.length).toBe(2);
		expect(fieldOf(result, 'paint')).toMatchObject({ outcome: 'contested' });
		expect(fieldOf(result, 'option')).toMatchObject({ meaning: 'Heater' });
		expect(fieldOf(result, 'option', 1)).toMatchObject({ outcome: 'not_listed' });
	});

	it('finds a style under another split, and its division by the row', () => {
		const result = ask('ST 70 23739 NOR 245876 / TR 712 50 / 01C');
		expect(first(result)).toMatchObject({ division: 'Pontiac', model_year: 1970 });
		expect(fieldOf(result, 'trim')).toMatchObject({ meaning: 'Green' });
	});

	it('keeps unread characters and what they could be', () => {
		const result = ask('ST 69 12437 NOR 2458?6 / TR 71? 5[02] / ?1C', {
			context: car,
			lookups: true
		});
		expect(fieldOf(result, 'body_number')).toMatchObject({ outcome: 'illegible' });
		expect(fieldOf(result, 'trim').possible.map(({ meaning }) => meaning)).toEqual([
			'Black',
			'Blue'
		]);
		expect(fieldOf(result, 'paint').possible.length).toBe(2);
		const many = ask('ST ?? 12437 NOR 245876 / TR 711 Z? / 01C');
		expect(fieldOf(many, 'paint')).toMatchObject({ outcome: 'illegible', possible: [] });
		expect(
			fieldOf(ask('ST 69 12437 NOR 1234 / TR 711 5? / 01C', { context: { year: 1970 } }), 'paint')
				.possible.length
		).toBe(4);
	});

	it('says that a code was not used only under a claim', () => {
		const result = ask('ST 69 12437 NOR 245876 / TR 799 51 / 01C', { lookups: true });
		expect(fieldOf(result, 'trim')).toMatchObject({
			outcome: 'not_used',
			sources: [{ key: 'manual' }]
		});
		expect(fieldOf(result, 'paint')).toMatchObject({
			outcome: 'not_listed',
			lookups: [{ code: '51', row_key: null }]
		});
		expect(
			fieldOf(ask('ST 69 12437 NOR 245876 / TR 711 50 / 01C B77', { lookups: true }), 'option')
				.lookups
		).toEqual([{ table: 'option', code: 'B/77', row_key: null }]);
	});

	it('keeps what no field takes', () => {
		const result = ask('ST 69 12437 NOR 245876 BDY GARBAGE1 / TR 711 52 WRONG?7 / 01C');
		expect(fieldOf(result, 'unknown')).toMatchObject({
			code: 'GARBAGE1',
			outcome: 'not_listed',
			label: 'Not placed'
		});
		expect(fieldOf(result, 'unknown', 1)).toMatchObject({ code: 'WRONG?7', outcome: 'illegible' });
	});

	it('of another maker than the serial is read, and said to be', () => {
		const result = ask('B7 TX9 00 / E86 D32', { context: car });
		expect(first(result)).toMatchObject({
			layout: chryslerTag.id,
			maker: 'chrysler',
			model_year: 1970
		});
		expect(codes(result)).toContain('serial_of_other_maker');
		const given = ask('B7 TX9 00 / E86 D32', { context: { maker: 'gm' } });
		expect(codes(given)).toContain('other_maker_given');
		expect(codes(given)).not.toContain('serial_of_other_maker');
	});

	it('can be given by named fields', () => {
		const result = ask('', {
			kind: undefined as never,
			fields: { paint: '52', trim: '711', engine: 'L', roof: ' ' },
			context: { maker: 'gm', division: 'Chevrolet', year: 1969, plant: 'n' }
		});
		expect(result.input).toMatchObject({ kind: 'body_tag', text: '52 / 711 / L' });
		expect(fieldOf(result, 'paint')).toMatchObject({ meaning: 'Red' });
		expect(fieldOf(result, 'unknown')).toMatchObject({ code: 'L' });
		expect(ask('', { fields: {} }).readings).toEqual([]);
	});
});

describe('bad input', () => {
	it('with a line missing is read without it', () => {
		const result = ask('ST 69 12437 NOR 245876 / 01C');
		expect(problem(result, 'missing_line').message).toContain('trim line');
		expect(first(result).state).toBe('partial');
	});

	it('with a field missing names line and field', () => {
		expect(problem(ask('ST 69 12437 NOR / TR 711 52 / 01C'), 'missing_field')).toMatchObject({
			line: 1
		});
	});

	it('with a line doubled reads it once', () => {
		const result = ask('ST 69 12437 NOR 245876 / TR 711 52 / TR 711 52 / 01C');
		expect(problem(result, 'line_doubled')).toMatchObject({ line: 3 });
		expect(codes(result)).toEqual(['line_doubled']);
	});

	it('from the other end or in disorder is read, and offered in order', () => {
		const turned = problem(ask('01C / TR 711 52 / ST 69 12437 NOR 245876'), 'lines_turned');
		expect(turned.offers[0]?.text).toBe('ST 69 12437 NOR 245876 / TR 711 52 / 01C');
		const swapped = problem(ask('TR 711 52 / ST 69 12437 NOR 245876 / 01C'), 'lines_swapped');
		expect(swapped.offers[0]?.text).toBe('ST 69 12437 NOR 245876 / TR 711 52 / 01C');
		expect(
			problem(ask('E86 D32 / B7 TX9 00', { context: { maker: 'chrysler' } }), 'lines_turned')
				.offers[0]?.text
		).toBe('B7 TX9 00 / E86 D32');
	});

	it('of two plates is told apart', () => {
		const two = problem(ask(`${TAG} / ST 69 12437 LOS 111111 / TR 711 50 / 02B`), 'two_plates');
		expect(two).toMatchObject({ line: 4 });
		expect(two.offers.map(({ text }) => text)).toEqual([
			TAG,
			'ST 69 12437 LOS 111111 / TR 711 50 / 02B'
		]);
	});

	it('with a line that fits nothing keeps it', () => {
		expect(problem(ask(`${TAG} / NOTHINGLIKEIT1`), 'unplaced_line')).toMatchObject({ line: 4 });
		expect(codes(ask(`${TAG} / ????????????????????????????`))).toEqual(['unread_line']);
	});

	it('of two plates that several forms take names the nearest', () => {
		const lined = [gmTag, { ...gmTag, id: 'gm-invented-tag-2', title: 'The same again' }];
		const two = ask(`${TAG} / ST 69 12437 LOS 111111 / TR 711 50 / 02B`, { lined });
		expect(problem(two, 'two_plates').offers.length).toBe(2);
	});

	it('of signs alone before a character that stands too far out has nothing to read', () => {
		expect(codes(ask(`${'.'.repeat(600)}A`))).toEqual(['too_long', 'no_form']);
	});

	it('may be as long as its kind allows, or as its lines let expect', () => {
		expect(examineText('A'.repeat(65))).toBe('too_long');
		expect(examineText(`${TAG} / ${'A'.repeat(65)}`)).toBeNull();
		expect(examineText(TAG.padEnd(601, 'A'), 'body_tag')).toBe('too_long');
	});

	it('of fifteen lines or 601 characters is read as far as a stamp goes', () => {
		const many = ask(
			`${TAG}${' / 0'.repeat(1)}${Array.from({ length: 11 }, (_, n) => ` / Q${n}`).join('')}`
		);
		expect(problem(many, 'too_many_lines')).toMatchObject({ line: 15 });
		expect(
			problem(
				ask(`${TAG}${Array.from({ length: 13 }, (_, n) => ` / Q${n}`).join('')}`),
				'too_many_lines'
			).message
		).toContain('2 lines');
		expect(problem(ask(TAG.padEnd(601, 'A')), 'too_long').message).toContain('1 more stands');
		expect(problem(ask(TAG.padEnd(700, 'A')), 'too_long').message).toContain('100 more stand');
	});

	it('of no form says which is nearest, or that there is none', () => {
		expect(problem(ask('XXXXXXXXXXXXXXXXXXXXXXXXX'), 'no_form').message).toContain('Nearest is');
		expect(problem(ask('A', { lined: [] }), 'no_form').message).toContain('no form');
		expect(ask('...').readings).toEqual([]);
	});
});

describe('an engine stamp', () => {
	const engine = (text: string, request: Partial<ReadRequest> = {}) =>
		ask(text, { kind: 'engine', ...request });

	it('is one line, and its part of a serial tells plant and year', () => {
		const result = engine('V0412CC\n19N512345');
		expect(result.input.normalised).toBe('V0412CC 19N512345');
		expect(first(result)).toMatchObject({ model_year: 1969, division: 'Chevrolet' });
		expect(fieldOf(result, 'unit_code')).toMatchObject({
			meaning: '300 V8',
			detail: 'On record for Chevrolet, 1969–70.'
		});
		expect(fieldOf(result, 'assembly_plant')).toMatchObject({
			meaning: 'Norwood',
			derived_from: ['partial_serial']
		});
		expect(fieldOf(result, 'line')).toBeUndefined();
	});

	it('tells what a code means elsewhere when it means nothing here', () => {
		expect(fieldOf(engine('V0412CD 19N512345'), 'unit_code')).toMatchObject({
			meaning: 'Depends on the division'
		});
		expect(fieldOf(engine('V0412CE 19N512345'), 'unit_code')).toMatchObject({
			outcome: 'contested'
		});
		expect(fieldOf(engine('V0412CX'), 'unit_code')).toMatchObject({ outcome: 'not_listed' });
		expect(fieldOf(engine('V0412C?'), 'unit_code').possible.length).toBe(4);
	});

	it('worn down to its code is read as that', () => {
		const result = engine('CC');
		expect(result.input.kind).toBe('engine');
		expect(fieldOf(result, 'unit_code')).toMatchObject({ meaning: '300 V8' });
	});

	it('whose part of a serial lacks the division says what depends on it', () => {
		const other = engine('K9L512345');
		expect(fieldOf(other, 'assembly_plant')).toMatchObject({
			meaning: 'Depends on the rest of the serial'
		});
		expect(fieldOf(other, 'assembly_plant').possible.map(({ meaning }) => meaning)).toEqual([
			'Van Nuys',
			'Elsewhere'
		]);
		expect(fieldOf(engine('K9P512345'), 'assembly_plant').possible.length).toBe(1);
	});

	it('with a whole serial, or one that fits none, says what it can', () => {
		const whole = engine('W 124379N512345');
		expect(fieldOf(whole, 'series')).toMatchObject({
			derived_from: ['partial_serial'],
			meaning: 'Curlew'
		});
		expect(fieldOf(engine('W 999999999999A'), 'partial_serial')).toMatchObject({
			outcome: 'not_listed'
		});
		expect(fieldOf(engine('V0412CC ?9N512345'), 'partial_serial')).toMatchObject({
			outcome: 'illegible'
		});
		const open = engine('V0412CC 1?N512345', { context: { year: 1966 } });
		expect(fieldOf(open, 'partial_serial')).toMatchObject({ outcome: 'illegible' });
	});
});

describe('a casting', () => {
	const cast = (text: string, request: Partial<ReadRequest> = {}) =>
		ask(text, { kind: 'casting', ...request });

	it('says what it is, for which years, and when it was cast', () => {
		const result = cast('3970010 A 12 9');
		expect(fieldOf(result, 'casting_number')).toMatchObject({
			meaning: 'Block',
			detail: 'On record for Chevrolet, 1969–79.'
		});
		expect(fieldOf(result, 'casting_date').possible.map(({ meaning }) => meaning)).toContain(
			'12 January 1969'
		);
		expect(fieldOf(cast('3970020'), 'casting_number').detail).toContain('; 2 more.');
		expect(fieldOf(cast('3970030 A 12 9'), 'casting_number')).toMatchObject({ detail: '' });
		expect(fieldOf(cast('A 12 9'), 'casting_date').outcome).not.toBe('not_listed');
	});
});

describe('a text of no stated kind', () => {
	const any = (text: string, context: ReadContext = {}) =>
		read(tables, { text, lined: LINED, context });

	it('is what fits best, and everything else that fits after it', () => {
		expect(any(TAG).input.kind).toBe('body_tag');
		expect(any('124379N512345').input.kind).toBe('serial');
		expect(any('V0412CC 19N512345').input.kind).toBe('engine');
		expect(any('3970010').input.kind).toBe('casting');
		expect(any('52').input.kind).toBe('code');
		expect(
			any('A129', { serial: '124379N512345' }).readings.some(
				({ layout }) => layout === 'gm-casting'
			)
		).toBe(true);
		expect(any('ZZZZZZZZZZZZZZZZZZZZZZZZZZZZZZZZ').readings).toEqual([]);
	});

	it('a date alone is a reading for each form', () => {
		expect(ask('A129', { kind: 'date', context: car }).readings[0]?.model_year).toBe(1969);
		expect(ask('52', { kind: 'code', context: { serial: '?' } }).input.kind).toBe('code');
	});
});

describe('several stamps of a car', () => {
	it('are scoped by the serial, wherever it stands, and held against each other', () => {
		const { stamps, lines } = readStamps(tables, {
			lined: LINED,
			stamps: [
				{ kind: 'body_tag', fields: { trim: '712', paint: '52' }, place: 'cowl' },
				{ text: 'V0412CC 19N512345' },
				{ text: '124379N512345' },
				{ kind: 'serial' }
			]
		});
		expect(stamps.map(({ input }) => input.kind)).toEqual([
			'body_tag',
			'engine',
			'serial',
			'serial'
		]);
		expect(stamps[0]?.readings[0]).toMatchObject({ division: 'Chevrolet', model_year: 1969 });
		expect(lines.find(({ attribute }) => attribute === 'sequence_number')).toMatchObject({
			result: 'tallies'
		});
	});

	it('may lack a serial, or any text', () => {
		const { stamps, lines } = readStamps(tables, {
			stamps: [{ kind: 'code', text: '52' }, {}],
			context: { year: 1969 }
		});
		expect(stamps.map(({ readings }) => readings.length)).toEqual([1, 0]);
		expect(lines.every(({ result }) => result === 'not_looked_at')).toBe(true);
	});
});

describe('any text of any kind', () => {
	it('is read without an error, and primary fields never overlap', () => {
		const kinds = fc.constantFrom('body_tag', 'engine', 'casting', 'date', 'code', undefined);
		const unit = fc.constantFrom(...'ABCT0123 ?/[]-*x\n', 'ST ', 'NOR', ' / ', '69', '711');
		fc.assert(
			fc.property(
				fc.oneof(fc.string({ unit: 'binary', maxLength: 60 }), fc.string({ unit, maxLength: 40 })),
				kinds,
				(text, kind) => {
					const { readings } = read(tables, {
						text,
						lined: LINED,
						...(kind === undefined ? {} : { kind })
					});
					for (const { fields } of readings) {
						const own = fields.filter(({ derived_from }) => derived_from === undefined);
						if (own.some(({ from, to }, index) => from > to || from <= (own[index - 1]?.to ?? 0)))
							return false;
					}
					return readings.length <= 24;
				}
			),
			{ numRuns: 1_500 }
		);
	});
});
