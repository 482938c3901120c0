import { describe, expect, it } from 'vitest';
import { fieldOf, readingOf, TALLY_TABLES as tables } from '../../../../tests/fixtures/tally';
import type { StampKind, TallyStamp } from '../../types';
import { dateField } from '../dates/field';
import type { DateFormatId } from '../dates';
import { compile } from '../index';
import { buildCitation, buildContent, buildRow } from '../../../../tests/fixtures/builders';
import { tallyStamps } from './index';

interface Dated {
	readonly kind: StampKind;
	readonly format: DateFormatId;
	readonly text: string;
	readonly year?: number | null;
	readonly part?: string;
	readonly place?: string;
}

function dated({ kind, format, text, year = 1969, part, place }: Dated): TallyStamp {
	const head = { name: 'assembly_date', label: 'Date', from: 1, to: text.length } as const;
	const date = dateField(head, format, text, year === null ? {} : { year }, tables);
	const beside =
		part === undefined ? [] : [fieldOf('casting_number', '3970010', { values: { part } })];
	return {
		kind,
		...(place === undefined ? {} : { place }),
		readings: [readingOf([...beside, date], { model_year: year, division: 'Chevrolet' })]
	};
}

const cast = (text: string, parts: Partial<Dated> = {}) =>
	dated({ kind: 'casting', format: 'gm-casting', text, part: 'block', ...parts });
const engine = (text: string, parts: Partial<Dated> = {}) =>
	dated({ kind: 'engine', format: 'gm-engine-month-day', text, ...parts });
const body = (text: string, parts: Partial<Dated> = {}) =>
	dated({ kind: 'body_tag', format: 'gm-body-month-week', text, ...parts });
const label = (text: string) => dated({ kind: 'body_tag', format: 'label-month-year', text });
const delco = (text: string) =>
	dated({ kind: 'casting', format: 'delco-year-month-day', text, place: 'alternator' });

const lines = (...stamps: TallyStamp[]) =>
	tallyStamps(tables, stamps).filter(({ attribute }) =>
		['date_order', 'build_window'].includes(attribute)
	);
const line = (...stamps: TallyStamp[]) => {
	const found = lines(...stamps);
	expect(found).toHaveLength(1);
	return found[0];
};

describe('a casting and the unit that it is in', () => {
	it('tally when cast before, or on the same day', () => {
		expect(line(cast('A 12 9'), engine('T0115'))).toMatchObject({
			attribute: 'date_order',
			result: 'tallies',
			reason: 'The dates agree: no later than the other, and no earlier than usual.',
			weight: 'middling',
			left: { stamp: 0, earliest: '1969-01-12', meanings: ['12 January 1969'] },
			right: { stamp: 1, latest: '1969-01-15' },
			rows: ['gm.layout.gm-casting.1', 'gm.layout.gm-engine-month-day.1', 'other.lead_time.x.1']
		});
		expect(line(engine('T0112'), cast('A 12 9'))?.result).toBe('tallies');
	});

	it('do not tally when cast later', () => {
		expect(line(cast('A 16 9'), engine('T0115'))).toMatchObject({
			result: 'does_not_tally',
			reason:
				'The casting is dated one day later: not fitted at first assembly, if both readings stand.',
			ground: 'Rests on one firm row and one fair row.',
			rows: ['gm.layout.gm-casting.1', 'gm.layout.gm-engine-month-day.1']
		});
	});

	it('cannot be told when cast unusually early', () => {
		expect(line(cast('F 12 8'), engine('T0115'))).toMatchObject({
			result: 'cannot_be_told',
			reason:
				'At least 217 days before the other, where 92 are usual at most. Unusual, not impossible: parts sat in stores.'
		});
	});

	it('are not held against each other when the casting is of another unit, or of none that is known', () => {
		expect(lines(cast('A 16 9', { part: 'gearbox case' }), engine('T0115'))).toEqual([]);
		expect(lines(cast('A 16 9', { part: 'bracket' }), engine('T0115'))).toEqual([]);
	});

	it('may be named by the place', () => {
		const stamps = [
			cast('A 16 9', { part: 'bracket', place: 'intake manifold' }),
			dated({ kind: 'engine', format: 'gm-assembly-month-day', text: '0115' })
		] as const;
		expect(line(...stamps)?.result).toBe('cannot_be_told');
	});

	it('cannot be told while the decade is open', () => {
		const stamps = [cast('A 12 9', { year: null }), engine('T0115')] as const;
		expect(line(...stamps)).toMatchObject({
			result: 'cannot_be_told',
			reason:
				'One of the dates can be of more than one year: the casting or part number, or what else gives the year, settles it.',
			left: { earliest: '1959-01-12', latest: '1989-01-12' }
		});
	});

	it('cannot be told while the year is open', () => {
		expect(line(cast('A 12 9'), engine('T0115', { year: null }))).toMatchObject({
			result: 'cannot_be_told',
			right: { earliest: null, latest: null }
		});
	});

	it('cannot be told where the days overlap', () => {
		expect(line(cast('A 1? 9'), engine('T0115'))?.reason).toBe(
			'The days that the dates can be overlap: the order cannot be told.'
		);
	});
});

describe('a part and the day of the car', () => {
	it('tally to the last day of the label’s month', () => {
		expect(line(cast('B 28 9'), label('02/69'))?.result).toBe('tallies');
		expect(line(cast('C 1 9'), label('02/69'))?.result).toBe('does_not_tally');
	});

	it('cannot be told where the form of a date rests on memory', () => {
		expect(line(delco('9 C 1'), label('02/69'))).toMatchObject({
			result: 'cannot_be_told',
			reason:
				'One day later, if the dates are read right; how they are read rests on too little to say more.'
		});
	});

	it('agree without a rule where no row gives one', () => {
		expect(line(delco('9 A 1'), label('02/69'))?.reason).toBe(
			'The dates agree: no later than the other.'
		);
	});
});

describe('a part and a body’s date', () => {
	it('tally when it comes before', () => {
		expect(line(engine('T0105'), body('01C'))?.result).toBe('tallies');
		expect(line(engine('T0115'), body('01C'))?.result).toBe('tallies');
	});

	it('cannot be told for so many days as a row lets the body’s date slip, and do not tally beyond', () => {
		const soft = line(engine('T0301'), body('01C'));
		expect(soft).toMatchObject({
			result: 'cannot_be_told',
			reason:
				'39 days later. A body or its tag may be dated before the rest: up to 60 days are taken as possible.'
		});
		expect(soft?.rows).toContain('other.lead_time.x.4');
		expect(line(engine('T0401'), body('01C'))).toMatchObject({
			result: 'does_not_tally',
			reason:
				'The unit is dated 70 days later, more than the 60 by which the other may slip: not fitted when the car was built, or the part was changed, or a date misread.'
		});
	});

	it('cannot be told where no row says how far it may slip', () => {
		expect(line(delco('9 D 1'), body('01C'))?.reason).toBe(
			'70 days later, and no row says how far a plan may slip.'
		);
	});

	it('keep both calendar years of an autumn month in mind', () => {
		expect(line(engine('T0601'), body('10B'))?.result).toBe('cannot_be_told');
	});
});

describe('two dates of the car', () => {
	it('agree within the build window', () => {
		expect(line(body('01C'), label('02/69'))).toMatchObject({
			attribute: 'build_window',
			result: 'tallies',
			reason: 'The two dates agree.',
			weight: 'heavy'
		});
	});

	it('do not tally where what comes before is much later', () => {
		expect(line(label('02/69'), body('05C'))).toMatchObject({
			result: 'does_not_tally',
			reason:
				'The date that should come before is 70 days later, more than the 30 by which it may slip: the two are not of one car, or one is misread.'
		});
	});

	it('of one sort say nothing of each other', () => {
		expect(lines(body('01C'), body('05C'))).toEqual([]);
	});
});

describe('a scheduled date', () => {
	const scheduled = compile(
		buildContent({
			rows: [
				buildRow('other', 'lead_time', '', 'Rule', {
					values: { part: 'gm-casting', against: 'scheduled', days_min: -60, days_max: 9 }
				}),
				buildRow('other', 'lead_time', '', 'Rule of a division', {
					n: 2,
					division: ['Pontiac'],
					values: { part: 'gm-casting', against: 'scheduled', days_min: 0, days_max: 9 }
				}),
				buildRow('other', 'lead_time', '', 'Rule of a year', {
					n: 3,
					years: [1970, 1971],
					values: { part: 'gm-casting', against: 'scheduled', days_min: 0, days_max: 9 }
				}),
				buildRow('other', 'lead_time', '', 'Rule of years before', {
					n: 6,
					years: [1960, 1965],
					values: { part: 'gm-casting', against: 'scheduled', days_min: 0, days_max: 9 }
				}),
				buildRow('other', 'lead_time', '', 'The same rule for one more division', {
					n: 5,
					division: ['Chevrolet'],
					values: { part: 'gm-casting', against: 'scheduled', days_min: -59, days_max: 9 }
				}),
				buildRow('other', 'lead_time', '', 'Rule of a wider sort', {
					n: 4,
					values: { part: 'cast', against: 'scheduled', days_min: 0, days_max: 99 }
				})
			],
			citations: [1, 2, 3, 4, 5, 6].map((n) => buildCitation(`other.lead_time.x.${n}`, 'memory'))
		})
	);

	it('may slip, by the row of the narrowest name that holds', () => {
		const plan = dated({ kind: 'body_tag', format: 'chrysler-scheduled', text: '112' });
		const both = (stamp: TallyStamp) =>
			tallyStamps(scheduled, [stamp, plan]).find(({ attribute }) => attribute === 'date_order');
		expect(both(cast('B 1 9'))?.reason).toBe(
			'20 days later. A scheduled date may slip: up to 59 days are taken as possible.'
		);
		expect(both(cast('A 1 9'))?.reason).toContain('where 9 are usual');
	});

	it('is looked up for a date of no maker and no year too', () => {
		const plan = dated({ kind: 'body_tag', format: 'chrysler-scheduled', text: '112' });
		const [reading] = cast('B 1 9').readings;
		const loose: TallyStamp = {
			kind: 'date',
			readings: [readingOf(reading?.fields ?? [], { maker: null, model_year: null })]
		};
		const found = tallyStamps(scheduled, [loose, plan]).find(
			({ attribute }) => attribute === 'date_order'
		);
		expect(found?.reason).toContain('may slip');
	});
});

describe('a date of several equal readings', () => {
	it('tells nothing until the form is settled', () => {
		const one = cast('A 16 9');
		const twice: TallyStamp = { ...one, readings: [...one.readings, ...one.readings] };
		expect(line(twice, engine('T0115'))?.reason).toBe(
			'A year, or the form of a date, is open: what gives it settles it.'
		);
	});

	it('is passed over where it was not read', () => {
		const impossible = cast('B 30 9');
		expect(line(impossible, engine('T0115'))).toMatchObject({
			result: 'cannot_be_told',
			left: { meanings: [] }
		});
	});
});
