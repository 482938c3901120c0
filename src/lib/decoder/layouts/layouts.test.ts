import { describe, expect, it } from 'vitest';
import {
	buildCitation,
	buildContent,
	buildRow,
	buildSource
} from '../../../../tests/fixtures/builders';
import type { Reading, ReadingField } from '../../types';
import { compile, read } from '..';
import { LAYOUTS } from '.';

const tables = compile(
	buildContent({
		rows: [
			buildRow('other', 'wmi', '1G4', 'Buick', { values: { maker_name: 'Buick' } }),
			buildRow('other', 'wmi', '1A9', 'Makers of few, United States', { n: 9, values: {} }),
			buildRow('other', 'wmi', '1J9/644', 'A maker of few', { values: {} }),
			buildRow('other', 'layout', 'iso-17', 'Seventeen characters'),
			buildRow('other', 'country', '1A-10', 'United States'),
			buildRow('other', 'country', 'WA-W0', 'Germany', { n: 2 }),
			...[1989, 2019].map((year, n) =>
				buildRow('other', 'model_year', 'K', String(year), {
					n: n + 1,
					years: [year, year],
					values: { model_year: year }
				})
			)
		],
		citations: [
			buildCitation('other.layout.iso-17.1', 'rule'),
			buildCitation('other.model_year.k.1', 'rule')
		],
		sources: [buildSource('rule', { kind: 'law' })]
	})
);
const readings = (text: string): readonly Reading[] =>
	read(tables, { text, kind: 'serial' }).readings;
const field = (text: string, name: string, nth = 0): ReadingField =>
	readings(text)[nth]?.fields.find((own) => own.name === name) as ReadingField;

describe('every layout', () => {
	it.each(LAYOUTS.map((layout) => [layout.id, layout] as const))(
		'%s takes its good example and refuses its bad one',
		(id, layout) => {
			expect(readings(layout.examples.good).map((own) => own.layout)).toContain(id);
			expect(readings(layout.examples.bad).map((own) => own.layout)).not.toContain(id);
		}
	);

	it.each(LAYOUTS.map((layout) => [layout.id, layout] as const))(
		'%s has primary fields that partition its places',
		(_, layout) => {
			const places = layout.fields.flatMap((own) =>
				Array.from({ length: own.to - own.from + 1 }, (__, n) => own.from + n)
			);
			expect(places).toEqual(Array.from({ length: layout.length }, (__, n) => n + 1));
		}
	);

	it('has an id of its own', () => {
		expect(new Set(LAYOUTS.map((layout) => layout.id)).size).toBe(LAYOUTS.length);
	});
});

describe('seventeen characters', () => {
	it('reads maker, country and check digit of a North American number', () => {
		const text = '1G4AH59H45G118341';
		expect(readings(text)).toHaveLength(1);
		expect(readings(text)[0]?.model_year).toBe(2005);
		expect(field(text, 'wmi').meaning).toBe('Buick');
		expect(field(text, 'country')).toMatchObject({ meaning: 'United States', from: 1, to: 3 });
		expect(field(text, 'check_digit')).toMatchObject({
			meaning: '4: fits',
			strength: 'firm',
			values: { check_digit_expected: '4', check_digit_fits: true }
		});
		expect(field(text, 'check_digit').detail).toContain('proves nothing');
	});

	it('tells the thirty-year cycle by position 7, and says for which vehicles', () => {
		expect(field('1M8GDM9AXKP042788', 'model_year')).toMatchObject({
			meaning: '1989',
			strength: 'firm',
			rows: ['other.model_year.k.1']
		});
		expect(field('1M8GDM9AXKP042788', 'model_year').detail).toContain('light trucks');
		expect(readings('1M8GDMDA?KP042788')[0]?.model_year).toBe(2019);
		expect(readings('1M8GDM?AXKP042788').map((own) => own.model_year)).toEqual([1989, 2019]);
		expect(field('1M8GDM?AXKP042788', 'model_year').detail).toContain('stands for this year');
		expect(readings('1M8GDM[9D]AXKP042788')).toHaveLength(2);
	});

	it('leaves the year open outside North America', () => {
		const own = field('WP0ZZZ91ZKS100001', 'model_year');
		expect(own).toMatchObject({ outcome: 'not_listed', meaning: null });
		expect(own.possible.map((one) => one.meaning)).toEqual(['1989', '2019']);
		expect(readings('WP0ZZZ91ZKS100001')[0]?.model_year).toBeNull();
		expect(field('WP0ZZZ91ZAS100001', 'model_year').possible).toEqual([]);
		expect(readings('[1W]P0ZZZ91ZKS100001').map((own) => own.model_year)).toEqual([null, 1989]);
		expect(readings('?P0ZZZ91ZKS100001').map((own) => own.model_year)).toEqual([null, 1989]);
	});

	it('refuses a character that stands for no model year, and offers a look-alike that does', () => {
		const { readings: none, problems } = read(tables, {
			text: '1G4AH59H40G118341',
			kind: 'serial'
		});
		expect(none).toEqual([]);
		expect(problems).toEqual([
			{
				layout: 'iso-17',
				position: 10,
				code: 'character',
				message:
					'Nearest is 17 characters, ISO 3779 and 49 CFR 565. It breaks at character 10, where the figure 0 stands and a code of a model year is expected.',
				offers: [{ text: '1G4AH59H4DG118341', why: 'D as character 10' }]
			}
		]);
	});

	it('says what a failed check does and does not mean, by region', () => {
		const home = field('1G4AH59H55G118341', 'check_digit');
		expect(home.meaning).toBe('5: does not fit, 4 is called for');
		expect(home.detail).toContain('no sign of forgery');
		const abroad = field('WP0ZZZ912KS100001', 'check_digit');
		expect(abroad.detail).toContain('Nothing follows');
		expect(field('WP0ZZZ91ZKS100001', 'check_digit')).toMatchObject({ outcome: 'not_listed' });
	});

	it('works out an unread check digit, and narrows one unread place by a read one', () => {
		expect(field('1G4AH59H?5G118341', 'check_digit').possible).toMatchObject([{ code: '4' }]);
		expect(field('1G4AH59H?5G11834?', 'check_digit').possible).toEqual([]);
		const own = field('1G4AH59H45G11834?', 'check_digit');
		expect(own.outcome).toBe('illegible');
		expect(own.detail).toContain('character 17 is A, J or 1');
	});

	it('offers look-alikes that would make a failed check fit', () => {
		const { problems } = read(tables, { text: '1G4AH59H45G11B341', kind: 'serial' });
		expect(problems.find((own) => own.position === 9)?.offers).toContainEqual({
			text: '1G4AH59H45G118341',
			why: '8 as character 14'
		});
		const fine = read(tables, { text: '1G4AH59H45G118341', kind: 'serial' });
		expect(fine.problems.filter((own) => own.position === 9)).toEqual([]);
		const abroad = read(tables, { text: 'VF1AH59H55G118341', kind: 'serial' });
		expect(abroad.problems.filter((own) => own.position === 9)).toEqual([]);
		const hopeless = read(tables, { text: '3TT4M7T4WJTT47343', kind: 'serial' });
		expect(hopeless.problems.filter((own) => own.position === 9)).toEqual([]);
	});

	it('reads the longer identifier of a maker of few vehicles', () => {
		const text = '1J9RP1A36A1644345';
		expect(readings(text)[0]?.layout).toBe('iso-17-few');
		expect(field(text, 'wmi')).toMatchObject({ code: '1J9/644', meaning: 'A maker of few' });
		expect(field(text, 'sequence_number')).toMatchObject({ code: '345', strength: 'not_rated' });
	});

	it('falls back on the shared first part where the whole identifier has no row', () => {
		expect(field('1A9RP1A36A1999345', 'wmi').meaning).toBe('Makers of few, United States');
		expect(field('5A9RP1A36A1999345', 'wmi').outcome).toBe('not_listed');
	});

	it('says how much of the maker’s description is unread', () => {
		expect(field('1G4AH5?H?5G118341', 'unknown').detail).toContain('One of five unread');
		expect(field('1G4AH59H45G118341', 'unknown').detail).toContain('maker decides');
		expect(field('1G4AH', 'check_digit').detail).toBe('Not typed yet.');
	});

	it('is read once while its year is not typed', () => {
		expect(readings('1G4').filter((own) => own.layout === 'iso-17')).toHaveLength(1);
		expect(field('1G4', 'model_year')).toMatchObject({ outcome: 'illegible', possible: [] });
	});

	it('takes the check digit’s standing from the layout’s row, where there is one', () => {
		expect(field('1J9RP1A36A1644345', 'check_digit').strength).toBe('not_rated');
	});
});

describe('the model year of the 17-character standard', () => {
	const yearsOf = (first: string, seventh: string, tenth: string) =>
		readings(`${first}G4AH5${seventh}?5${tenth}G118341`)
			.filter(({ layout }) => layout === 'iso-17')
			.map(({ model_year }) => model_year)
			.sort();

	it.each([
		['1', '9', 'G', [1986]],
		['1', 'A', 'G', [2016]],
		['1', '?', 'G', [1986, 2016]],
		['1', '[9A]', 'G', [1986, 2016]],
		['W', '9', 'G', [null]],
		['[1W]', '9', 'G', [1986, null]],
		['[WS]', '9', 'G', [null]],
		['?', '9', 'G', [1986, null]],
		['?', 'A', 'G', [2016, null]]
	])('of %s…%s…%s is %j', (first, seventh, tenth, expected) => {
		expect(yearsOf(first, seventh, tenth)).toEqual(expected);
	});

	it('is open where its character is unread, and none where it stands for none', () => {
		expect(yearsOf('1', '9', '?').length).toBeGreaterThan(1);
		expect(yearsOf('1', '9', '0')).toEqual([]);
	});
});
