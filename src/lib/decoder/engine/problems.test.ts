import { describe, expect, it } from 'vitest';
import { buildRow } from '../../../../tests/fixtures/builders';
import { INVENTED } from '../../../../tests/fixtures/invented';
import { INVENTED_LAYOUTS } from '../../../../tests/fixtures/invented-layout';
import { read } from '../read';
import { compile } from './compile';
import { misfit } from './problems';

const tables = compile(INVENTED);
const ask = (text: string) => read(tables, { text, kind: 'serial', layouts: INVENTED_LAYOUTS });
const problem = (text: string) => ask(text).problems[0];

describe('when nothing fits', () => {
	it('names layout, place, what stands there and what is expected, and offers a look-alike', () => {
		expect(problem('2H3OT6P100')).toMatchObject({
			layout: 'gm-invented-9',
			position: 4,
			code: 'character',
			message:
				'Nearest is Invented, 10 characters, 1965–76. It breaks at character 4, where the letter O stands and a figure is expected.',
			offers: [{ text: '2H30T6P100', why: '0 as character 4' }]
		});
	});

	it('names figures and letters for what they are, and offers nothing where nothing looks alike', () => {
		expect(problem('2737T6P100')?.message).toContain(
			'the figure 7 stands and a letter is expected'
		);
		expect(problem('2737T6P100')?.offers).toEqual([]);
		expect(problem('2H37T9P100')?.message).toContain('one of 5 6 7 0');
	});

	it('counts what is missing or too many', () => {
		const long = problem('2H37T6P1000');
		expect(long).toMatchObject({ code: 'too_many', offers: [] });
		expect(long?.message).toContain('One too many');
		expect(misfit(INVENTED_LAYOUTS, [...'2H37T6P1'])).toMatchObject({
			code: 'too_short',
			offers: [{ text: '2H37T6P1??' }]
		});
		expect(misfit(INVENTED_LAYOUTS, [...'2737T6P10']).offers).toEqual([]);
	});

	it('needs a layout to compare with', () => {
		expect(() => misfit([], ['1'])).toThrow(RangeError);
	});
});

describe('look-alikes', () => {
	it('are offered where a field has no row, and never applied', () => {
		const result = ask('2H37T6O100');
		expect(result.readings[0]?.fields.find((own) => own.name === 'assembly_plant')?.outcome).toBe(
			'not_listed'
		);
		expect(result.problems).toEqual([
			{
				layout: 'gm-invented-9',
				position: 7,
				code: 'look_alike',
				message: 'No row for O as assembly plant. A look-alike would have one:',
				offers: [{ text: '2H37T60100', why: 'would read Ouzelville, Georgia' }]
			}
		]);
	});
});

describe('a look-alike', () => {
	it('is offered for the year of the reading, where one figure stands for two', () => {
		expect(problem('2H37T6O100')?.offers).toEqual([
			{ text: '2H37T60100', why: 'would read Ouzelville, Georgia' }
		]);
	});

	it('is not offered when its row holds for other years', () => {
		const row = buildRow('gm', 'assembly_plant', 'S', 'Smew Falls', { years: [1975, 1976] });
		const other = compile({ ...INVENTED, rows: [...INVENTED.rows, row] });
		const ask = (text: string) =>
			read(other, { text, kind: 'serial', layouts: INVENTED_LAYOUTS }).problems;
		expect(ask('2H37T75600')).toEqual([]);
	});
});

describe('six figures alone', () => {
	it('are offered as a sequence number', () => {
		expect(read(tables, { text: '904127' }).problems[0]).toMatchObject({
			code: 'bare_sequence',
			offers: [{ text: '???????904127' }, { text: '??????904127' }, { text: '?????904127' }]
		});
	});
});

describe('letters of no die set', () => {
	it('are taken as unread, and said', () => {
		const result = ask('2H37ÉжP100');
		expect(result.input.normalised).toBe('2H37??P100');
		expect(result.problems.map((own) => [own.code, own.position])).toEqual([
			['foreign_letter', 5],
			['foreign_letter', 6]
		]);
	});
});
