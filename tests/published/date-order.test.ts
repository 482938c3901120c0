/**
 * Dates of real cars as published pages give them, held against each other on the released tables. No genuine car may be
 * told that its dates do not tally. Where a page gives days and no code, the code that stands here is written from them.
 */
import { describe, expect, it } from 'vitest';
import type { DateFormatId } from '../../src/lib/decoder/dates';
import { dateField } from '../../src/lib/decoder/dates/field';
import { tallyStamps } from '../../src/lib/decoder/tally';
import type { Maker, TallyStamp } from '../../src/lib/types';
import { readingOf } from '../fixtures/tally';
import { released } from './samples';

const tables = released();

function stamp(maker: Maker, id: DateFormatId, text: string, year: number): TallyStamp {
	const head = { name: 'assembly_date', label: 'Date', from: 1, to: text.length } as const;
	const field = dateField(head, id, text, { year }, tables);
	return {
		kind: id.includes('casting') ? 'casting' : 'engine',
		place: id.includes('casting') ? 'block' : 'pad',
		readings: [readingOf([field], { maker, division: null, model_year: year })]
	};
}

const result = (one: TallyStamp, other: TallyStamp): string | undefined =>
	tallyStamps(tables, [one, other]).find(({ attribute }) =>
		['date_order', 'build_window'].includes(attribute)
	)?.result;

describe('dates of one car', () => {
	it('NCRS forum, early 396: block of 20 February, engine of 13 March 1965', () => {
		const [block, engine] = [
			stamp('gm', 'gm-casting', 'B 20 5', 1965),
			stamp('gm', 'gm-engine-month-day', 'T0313', 1965)
		];
		expect(result(block, engine)).toBe('tallies');
	});

	it('428CobraJet.org: block 8C1, engine 8D10', () => {
		const [block, engine] = [
			stamp('ford', 'ford-casting', '8C1', 1968),
			stamp('ford', 'ford-engine-assembly', '8D10', 1968)
		];
		expect(result(block, engine)).toBe('tallies');
	});

	it('The Supercar Registry: a 427 block of 1968 cast nine months before its assembly is unusual, no more', () => {
		const [block, engine] = [
			stamp('gm', 'gm-casting', 'E 2 7', 1968),
			stamp('gm', 'gm-engine-month-day', 'T0205', 1968)
		];
		expect(result(block, engine)).toBe('cannot_be_told');
	});

	it('brcook.com: Superbirds scheduled for 30 November 1969 were received from October to December', () => {
		const plan = stamp('chrysler', 'chrysler-scheduled', 'B30', 1970);
		for (const label of ['10 69', '11 69', '12 69'])
			expect(result(plan, stamp('chrysler', 'label-month-year', label, 1970))).not.toBe(
				'does_not_tally'
			);
	});

	it('GTO Forum: a block of 10 May 1967 in a car of the second week of May', () => {
		const [block, body] = [
			stamp('gm', 'pontiac-casting', 'E107', 1967),
			stamp('gm', 'gm-body-month-week', '05B', 1967)
		];
		expect(result(block, body)).toBe('tallies');
	});
});

describe('dates that cannot be of one car', () => {
	// GM RPO build codes, Crankshaft Coalition wiki: an engine of D 16 5 could not be correct for a Chevrolet of 1963.
	it('Crankshaft Coalition: a block of 16 April 1965 in a body of 1963', () => {
		const [block, body] = [
			stamp('gm', 'gm-casting', 'D 16 65', 1963),
			stamp('gm', 'gm-body-month-week', '02B', 1963)
		];
		expect(result(block, body)).toBe('does_not_tally');
	});
});

describe('common practice, no source', () => {
	it('an engine of 6 July beside a tag of the last week of June: the tag may be dated before', () => {
		const [engine, body] = [
			stamp('gm', 'gm-engine-month-day', 'V0706', 1967),
			stamp('gm', 'gm-body-month-week', '06E', 1967)
		];
		expect(result(engine, body)).toBe('cannot_be_told');
	});
});
