import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { compile } from '../index';
import { buildContent } from '../../../../tests/fixtures/builders';
import {
	fieldOf,
	readingOf,
	stampOf,
	TALLY_TABLES as tables
} from '../../../../tests/fixtures/tally';
import type { ReadingField, TallyLine, TallyStamp } from '../../types';
import { statementsOf, tallyStamps } from './index';

const engine = (code: string, row: string, parts: Partial<ReadingField> = {}) =>
	fieldOf('engine', code, { rows: [row], ...parts });
const unit = (code: string, parts: Partial<ReadingField> = {}) =>
	fieldOf('unit_code', code, { rows: [`gm.unit_code.${code.toLowerCase()}.1`], ...parts });
const unlisted = { rows: [], outcome: 'not_listed', meaning: null, values: {} } as const;

const serial = (field: ReadingField) => stampOf('serial', [field]);
const pad = (...fields: ReadingField[]) => stampOf('engine', fields);
const only = (stamps: readonly TallyStamp[], attribute: TallyLine['attribute']) => {
	const lines = tallyStamps(tables, stamps).filter((line) => line.attribute === attribute);
	expect(lines).toHaveLength(1);
	return lines[0] as TallyLine;
};

const V = () => serial(engine('V', 'gm.engine.v.1'));

describe('two statements of an engine', () => {
	it('tally where both name one', () => {
		const line = only([V(), pad(unit('CX1'))], 'engine');
		expect(line).toMatchObject({
			result: 'tallies',
			reason: 'The two name the same engine.',
			ground: 'Rests on one firm row and one fair row.',
			weight: 'middling',
			rows: ['gm.engine.v.1', 'gm.unit_code.cx1.1']
		});
		expect(line.left).toMatchObject({ stamp: 0, code: 'V', meanings: ['350 V8'] });
		expect(line.right).toMatchObject({ stamp: 1, code: 'CX1' });
	});

	it('do not tally where firm and fair rows name two, and a near code that would agree is offered', () => {
		expect(only([V(), pad(unit('CX3'))], 'engine')).toMatchObject({
			result: 'does_not_tally',
			reason:
				'The two name different engines. U as engine would agree: look again at character 1. CX1 as unit code would agree: look again at character 3.'
		});
	});

	it('offer look-alikes first, and of a code of one character those alone', () => {
		const stamps = [serial(engine('U', 'gm.engine.u.1')), pad(unit('CX1'))];
		const { reason } = only(stamps, 'engine');
		expect(reason).toContain('V as engine would agree: look again at character 1.');
		expect(reason).toContain('CXI as unit code would agree: look again at character 3.');
		expect(reason).not.toContain('CX3');
	});

	it('cannot be told where a row rests on memory', () => {
		const line = only([V(), pad(unit('QQ'))], 'engine');
		expect(line).toMatchObject({
			result: 'cannot_be_told',
			ground: expect.stringContaining('thin')
		});
		expect(line.reason).toContain('seem to name different engines');
	});

	it('is held against a code of its own, whatever the number says that the stamp repeats', () => {
		const repeated = engine('V', 'gm.engine.v.1', { derived_from: ['partial_serial'] });
		const lines = (own: string) =>
			tallyStamps(tables, [V(), pad(unit(own), repeated)])
				.filter(({ attribute }) => attribute === 'engine')
				.map(({ result, right }) => [result, right?.code]);
		expect(lines('CX3')).toEqual([
			['does_not_tally', 'CX3'],
			['tallies', 'V']
		]);
		expect(lines('CX1')).toEqual([['tallies', 'CX1']]);
	});

	it('on two stamps that both repeat the number stand in one line for each result, in either order', () => {
		const repeated = (code: string) =>
			engine(code, `gm.engine.${code.toLowerCase()}.1`, { derived_from: ['partial_serial'] });
		const stamps = [pad(unit('CX1'), repeated('V')), pad(unit('CX3'), repeated('V'))];
		const lines = (list: readonly TallyStamp[]) =>
			tallyStamps(tables, list)
				.filter(({ attribute }) => attribute === 'engine')
				.map(({ result, left, right }) => [result, ...[left.code, right?.code].sort()]);
		expect(lines(stamps)).toEqual([
			['does_not_tally', 'CX1', 'CX3'],
			['tallies', 'CX1', 'V']
		]);
		expect(lines([...stamps].reverse())).toEqual(lines(stamps));
	});

	it('cannot be told where we have no row, and a near code is offered', () => {
		const line = only([V(), pad(fieldOf('unit_code', 'CX7', unlisted))], 'engine');
		expect(line).toMatchObject({ result: 'cannot_be_told' });
		expect(line.reason).toBe(
			'We have no row for CX7 as unit code. That says nothing against the car. CX1 as unit code would agree: look again at character 3.'
		);
	});

	it.each([
		['contested', 'Sources differ on X as unit code.'],
		['not_used', 'X as unit code was not used, by a source that lists all. Read it again first.'],
		['illegible', 'The unit code is not wholly read. The missing character would settle it.']
	] as const)('cannot be told where it is %s', (outcome, reason) => {
		const alternatives =
			outcome === 'contested'
				? [{ meaning: '400 V8', values: {}, strength: 'firm' as const, rows: [], sources: [] }]
				: [];
		const field = fieldOf('unit_code', 'X', { ...unlisted, outcome, alternatives });
		expect(only([V(), pad(field)], 'engine')).toMatchObject({ result: 'cannot_be_told', reason });
	});

	it('cannot be told while one could be several, even if all agree', () => {
		const possible = [
			{ meaning: '350 V8, four-barrel', values: { displacement_cuin: 350 } },
			{ meaning: 'Another 350 V8', values: { displacement_cuin: 350 } }
		];
		const field = fieldOf('unit_code', 'CX1', { possible, rows: ['gm.unit_code.cx1.1'] });
		expect(only([V(), pad(field)], 'engine')).toMatchObject({
			result: 'cannot_be_told',
			reason: 'The unit code could still be one of several. Division, line or year would settle it.'
		});
	});

	it('cannot be told where they tell different things', () => {
		const field = fieldOf('unit_code', 'CX1', {
			values: { horsepower_gross: 300 },
			meaning: '300 hp',
			rows: ['gm.unit_code.cx1.1']
		});
		expect(only([V(), pad(field)], 'engine').reason).toContain('cannot be held against each other');
	});

	it('may differ in a size that a row lets stand beside the other, and name that row', () => {
		const stamps = [serial(engine('S', 'gm.engine.s.1')), pad(unit('ZZ'))];
		expect(only(stamps, 'engine')).toMatchObject({
			result: 'tallies',
			rows: ['gm.constraint.x.1', 'gm.engine.s.1', 'gm.unit_code.zz.1']
		});
	});

	it('are held against a block’s casting number, not against a head’s', () => {
		const casting = (part: string) =>
			stampOf('casting', [
				fieldOf('casting_number', '3970010', {
					values: { part, displacement_cuin: 400 },
					meaning: '400',
					rows: ['gm.unit_code.cx3.1']
				})
			]);
		expect(only([V(), casting('block')], 'engine').result).toBe('does_not_tally');
		expect(only([V(), casting('head')], 'engine').result).toBe('not_looked_at');
	});
});

describe('the car’s own number', () => {
	const number = (code: string) => stampOf('serial', [fieldOf('sequence_number', code)]);
	const partial = (code: string) => stampOf('engine', [fieldOf('partial_serial', code)]);

	it('tallies with its last characters on the pad, without a row', () => {
		expect(only([number('512345'), partial('19N512345')], 'sequence_number')).toMatchObject({
			result: 'tallies',
			reason: 'Both carry 512345.',
			weight: 'heavy',
			ground: 'Rests on the characters themselves; no row is needed.',
			rows: []
		});
	});

	it('does not tally with another, and a look-alike is pointed out', () => {
		expect(only([number('512345'), partial('19N512845')], 'sequence_number')).toMatchObject({
			result: 'does_not_tally',
			reason: 'The two name different sequence numbers.'
		});
		expect(only([number('512345'), partial('19N5I2345')], 'sequence_number').reason).toContain(
			'look again at character 2'
		);
	});

	it('says what a doubtful character would have to be', () => {
		expect(only([number('512345'), partial('19N5[17]2345')], 'sequence_number')).toMatchObject({
			result: 'cannot_be_told',
			reason: 'Read as 1 or 7. As 1 it is the same car; as 7 it is another.'
		});
	});

	it('cannot be told while it is unread or too short', () => {
		const unread = only([number('512345'), partial('19N51?34?')], 'sequence_number');
		expect(unread.reason).toBe('A character that decides is unread.');
		const short = only(
			[number('512345'), stampOf('engine', [fieldOf('sequence_number', '45')])],
			'sequence_number'
		);
		expect(short.reason).toBe('One is too short to be held against the other.');
		expect(
			tallyStamps(tables, [number('512345'), partial('45')]).map(({ result }) => result)
		).toEqual(['not_looked_at']);
	});

	it('is not taken from a partial serial that is read field by field', () => {
		const both = stampOf('engine', [
			fieldOf('partial_serial', '19N999999'),
			fieldOf('sequence_number', '512345')
		]);
		expect(only([number('512345'), both], 'sequence_number').result).toBe('tallies');
	});
});

describe('codes that stand on two plates', () => {
	const paint = (kind: 'body_tag' | 'code', code: string) =>
		stampOf(kind, [fieldOf('paint', code, unlisted)]);

	it('tally where they are the same', () => {
		expect(only([paint('body_tag', '51'), paint('code', '51')], 'paint').result).toBe('tallies');
	});

	it('do not tally on two tags, and cannot be told elsewhere', () => {
		expect(only([paint('body_tag', '51'), paint('body_tag', '72')], 'paint')).toMatchObject({
			result: 'does_not_tally',
			reason: 'The two name different paint codes.'
		});
		expect(only([paint('body_tag', '51'), paint('code', '72')], 'paint')).toMatchObject({
			result: 'cannot_be_told',
			reason: 'They read 51 and 72. The two places need not carry the same code.'
		});
	});
});

describe('a tag beside the serial of another maker', () => {
	it('does not tally where the forms rest on firm rows', () => {
		const stamps: TallyStamp[] = [
			{ kind: 'serial', readings: [readingOf([fieldOf('line', 'H')], { layout: 'heron-serial' })] },
			{
				kind: 'body_tag',
				readings: [readingOf([fieldOf('paint', '5')], { layout: 'plover-tag', maker: 'ford' })]
			}
		];
		expect(only(stamps, 'maker')).toMatchObject({
			result: 'does_not_tally',
			reason: 'The two name different makers.',
			rows: ['ford.layout.plover-tag.1', 'gm.layout.heron-serial.1']
		});
	});

	it('says nothing of a form that reads no field, and of one without a row only that it cannot be told', () => {
		const blank = readingOf([], { layout: 'heron-serial' });
		const unknown = readingOf([fieldOf('paint', '5')], { layout: 'no-row', maker: 'ford' });
		const known = readingOf([fieldOf('line', 'H')], { layout: 'heron-serial' });
		expect(
			statementsOf(tables, [{ kind: 'serial', readings: [blank] }]).map((one) => one.attribute)
		).toEqual([]);
		const stamps: TallyStamp[] = [
			{ kind: 'serial', readings: [known] },
			{ kind: 'body_tag', readings: [unknown] }
		];
		expect(only(stamps, 'maker').result).toBe('cannot_be_told');
	});
});

describe('plants', () => {
	it('are compared by the serial’s letter where a tag’s row names it', () => {
		const tag = fieldOf('assembly_plant', 'NOR', {
			values: { plant_code: 'N', plant_city: 'Norwood' },
			meaning: 'Norwood',
			rows: ['gm.engine.v.1']
		});
		const plate = fieldOf('assembly_plant', 'N', { meaning: 'Norwood', rows: ['gm.engine.v.1'] });
		const line = only([stampOf('serial', [plate]), stampOf('body_tag', [tag])], 'assembly_plant');
		expect(line.result).toBe('tallies');
	});
});

describe('what a part says of itself', () => {
	const year = (value: number, parts: Partial<ReadingField> = {}) =>
		fieldOf('model_year', 'F', {
			values: { model_year: value },
			meaning: String(value),
			rows: ['gm.engine.v.1'],
			...parts
		});
	const car = stampOf('serial', [year(1969)]);

	it('is its own year: a later one does not tally, an earlier one cannot be told', () => {
		expect(only([car, pad(year(1970))], 'model_year').result).toBe('does_not_tally');
		expect(only([car, pad(year(1968))], 'model_year').result).toBe('cannot_be_told');
		const derived = year(1968, { derived_from: ['partial_serial'] });
		expect(only([car, pad(derived)], 'model_year').result).toBe('does_not_tally');
	});

	it('is its own plant, which is not the car’s, unless a partial serial names that', () => {
		const plant = (parts: Partial<ReadingField> = {}) =>
			fieldOf('assembly_plant', 'T', { meaning: 'A plant', rows: ['gm.engine.v.1'], ...parts });
		const plate = stampOf('serial', [plant()]);
		expect(only([plate, pad(plant())], 'assembly_plant').result).toBe('not_looked_at');
		const derived = plant({ derived_from: ['partial_serial'] });
		expect(only([plate, pad(derived)], 'assembly_plant').result).toBe('tallies');
	});

	it('is the ratio of its first gear, which is no axle’s', () => {
		const gearbox = fieldOf('transmission', 'M20', {
			values: { ratio: 2.56, speeds: 4 },
			meaning: 'Four-speed',
			rows: ['gm.engine.v.1']
		});
		const lines = tallyStamps(tables, [car, pad(gearbox)]);
		expect(lines.map(({ attribute }) => attribute)).not.toContain('axle');
	});
});

describe('several readings of one stamp', () => {
	const year = (value: number, rank: number) =>
		readingOf(
			[
				fieldOf('model_year', '9', {
					values: { model_year: value },
					meaning: String(value),
					rows: ['gm.engine.v.1']
				}),
				fieldOf('sequence_number', '512345')
			],
			{ rank }
		);
	const plate: TallyStamp = { kind: 'body_tag', readings: [year(1969, 1)] };

	it('leave a statement open where they differ, and closed where they say the same', () => {
		const either: TallyStamp = { kind: 'serial', readings: [year(1969, 1), year(1979, 1)] };
		expect(only([either, plate], 'model_year').result).toBe('cannot_be_told');
		expect(only([either, plate], 'sequence_number').result).toBe('tallies');
		const other: TallyStamp = {
			kind: 'body_tag',
			readings: [readingOf([fieldOf('sequence_number', '999999')])]
		};
		expect(only([either, other], 'sequence_number').result).toBe('does_not_tally');
	});

	it('speak only in the first rank', () => {
		const first: TallyStamp = { kind: 'serial', readings: [year(1969, 1), year(1979, 2)] };
		expect(only([first, plate], 'model_year').result).toBe('tallies');
	});

	it('stay open where only one of them says it', () => {
		const half: TallyStamp = {
			kind: 'serial',
			readings: [readingOf([fieldOf('sequence_number', '512346')]), readingOf([])]
		};
		expect(only([half, plate], 'sequence_number').result).toBe('cannot_be_told');
	});

	it('keep the gap that one of them has', () => {
		const field = (parts: Partial<ReadingField>) => readingOf([unit('CX1', parts)]);
		const mixed: TallyStamp = {
			kind: 'engine',
			readings: [field({}), field({ outcome: 'illegible' })]
		};
		expect(only([V(), mixed], 'engine').reason).toContain('not wholly read');
	});
});

describe('a tally', () => {
	it('needs two stamps', () => {
		expect(tallyStamps(tables, [V()])).toEqual([]);
	});

	it('holds nothing against a stamp without a reading', () => {
		const lines = tallyStamps(tables, [V(), { kind: 'engine', readings: [] }]);
		expect(lines.map(({ result, right }) => [result, right])).toEqual([['not_looked_at', null]]);
	});

	it('says what only one place says', () => {
		const stamps = [
			stampOf('engine', [unit('CX1'), engine('V', 'gm.engine.v.1')]),
			stampOf('code', [])
		];
		expect(only(stamps, 'engine')).toMatchObject({
			result: 'not_looked_at',
			reason: 'Only one place that was read says it.'
		});
	});

	it('of an edition without rows tells nothing', () => {
		const bare = compile(buildContent());
		const plate: TallyStamp = {
			kind: 'serial',
			readings: [readingOf([engine('V', 'gm.engine.v.1')], { layout: 'heron-serial' })]
		};
		const lines = tallyStamps(bare, [plate, pad(unit('CX3'))]).filter(
			({ result }) => result !== 'not_looked_at'
		);
		expect(lines.map(({ result, ground }) => [result, ground])).toEqual([
			['cannot_be_told', 'Rests on no row of ours.']
		]);
	});
});

describe('properties of every tally', () => {
	const rowKeys = [...tables.rows.keys()].filter((key) => !/constraint|lead_time/.test(key));
	const found = fc.tuple(
		fc.constantFrom('engine' as const, 'unit_code' as const, 'line' as const, 'option' as const),
		fc.constantFrom(...rowKeys),
		fc.constantFrom(
			'found' as const,
			'contested' as const,
			'illegible' as const,
			'not_listed' as const
		)
	);
	const field = fc.oneof(
		found.map(([name, key, outcome]) => {
			const row = tables.rows.get(key);
			const base = fieldOf(name, row?.code ?? '', { rows: [key], outcome });
			return outcome === 'not_listed' ? { ...base, ...unlisted } : base;
		}),
		fc
			.constantFrom('512345', '512346', '5[12]2345', '51?345')
			.map((code) => fieldOf('sequence_number', code)),
		fc.constantFrom('19N512345', '19N512346').map((code) => fieldOf('partial_serial', code)),
		fc
			.tuple(
				fc.constantFrom(
					['gm-casting', 'cast', 'gm.layout.gm-casting.1'],
					['gm-engine-month-day', 'unit_assembled', 'gm.layout.gm-engine-month-day.1'],
					['delco-year-month-day', 'part_made', 'gm.layout.delco-year-month-day.1'],
					['gm-body-month-week', 'body_finished', 'gm.layout.gm-body-month-week.1'],
					['label-month-year', 'label_month', 'other.layout.label-month-year.1']
				),
				fc.constantFrom('1968-03-01', '1969-01-12', '1969-11-30', '1970-05-05')
			)
			.map(([[format, dates, row], day]) =>
				fieldOf('assembly_date', '0112', {
					meaning: day,
					rows: [row as string],
					values: { format, dates, earliest: day, latest: day }
				})
			)
	);
	const stamp = fc.record({
		kind: fc.constantFrom(
			'serial' as const,
			'body_tag' as const,
			'engine' as const,
			'casting' as const
		),
		place: fc.constantFrom('pad', 'copied paper', 'bolted badge'),
		readings: fc
			.array(fc.array(field, { maxLength: 4 }), { minLength: 1, maxLength: 2 })
			.map((list) => list.map((fields) => readingOf(fields, { layout: 'heron-serial' })))
	});
	const stamps = fc.array(stamp, { minLength: 2, maxLength: 4 });

	it('no thin, unrated or contested row alone ever yields "does not tally"', () => {
		let seen = 0;
		fc.assert(
			fc.property(stamps, (list) => {
				for (const { result, rows, attribute } of tallyStamps(tables, list)) {
					if (result !== 'does_not_tally') continue;
					seen += 1;
					if (attribute === 'sequence_number') expect(rows).toEqual([]);
					else expect(rows.length).toBeGreaterThan(0);
					for (const key of rows)
						expect(['firm', 'fair']).toContain(tables.rows.get(key)?.strength);
				}
			}),
			{ numRuns: 400 }
		);
		expect(seen).toBeGreaterThan(20);
	});

	it('the order of the stamps changes nothing but their number', () => {
		const named = (line: TallyLine, names: readonly number[]) => {
			const sides = [line.left, line.right].map((side) =>
				JSON.stringify(side && { ...side, stamp: names[side.stamp as number] })
			);
			const plain = [line.left, line.right].map((side) => JSON.stringify({ ...side, stamp: 0 }));
			// Sides that are alike in everything may stand either way round.
			if (plain[0] === plain[1]) sides.sort();
			return JSON.stringify([{ ...line, left: 0, right: 0 }, sides]);
		};
		fc.assert(
			fc.property(stamps, fc.nat(), (list, seed) => {
				const turn = seed % list.length;
				const order = list.map((_, index) => (index + turn) % list.length).reverse();
				const plain = tallyStamps(tables, list);
				const turned = tallyStamps(
					tables,
					order.map((index) => list[index] as TallyStamp)
				);
				// Stamps that are alike in everything may change places with each other.
				const blank = (line: TallyLine) =>
					named(
						line,
						list.map(() => 0)
					);
				expect(turned.map(blank).sort()).toEqual(plain.map(blank).sort());
				if (new Set(list.map((one) => JSON.stringify(one))).size < list.length) return;
				const names = list.map((_, index) => index);
				expect(turned.map((line) => named(line, order)).sort()).toEqual(
					plain.map((line) => named(line, names)).sort()
				);
			}),
			{ numRuns: 300 }
		);
	});

	it('no word is a verdict on the car', () => {
		fc.assert(
			fc.property(stamps, (list) => {
				for (const { reason, ground } of tallyStamps(tables, list))
					expect(`${reason} ${ground}`).not.toMatch(/genuine|fake|forg|certif|authentic|fraud/i);
			}),
			{ numRuns: 100 }
		);
	});
});
