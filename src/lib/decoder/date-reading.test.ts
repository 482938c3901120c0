import { describe, expect, it } from 'vitest';
import { buildCitation, buildRow } from '../../../tests/fixtures/builders';
import { INVENTED } from '../../../tests/fixtures/invented';
import { dateFieldName, readDateAlone } from './date-reading';
import { dateFormat } from './dates';
import { dateField } from './dates/field';
import { compile } from './engine/compile';

const bare = compile(INVENTED);
/** The invented edition with rows of table `layout` for two date forms. */
const cited = compile({
	...INVENTED,
	rows: [
		...INVENTED.rows,
		buildRow('gm', 'layout', 'gm-casting', 'Month letter, day, year figure'),
		buildRow('ford', 'layout', 'ford-casting', 'Year figure, month letter, day')
	],
	citations: [
		...INVENTED.citations,
		buildCitation('gm.layout.gm-casting.1', 'marsh-book'),
		buildCitation('ford.layout.ford-casting.1', 'web-one')
	]
});
const head = { name: 'casting_date', label: 'Cast', from: 1, to: 4 } as const;

describe('a date as a field', () => {
	it('carries its days, what it dates and what its form rests on', () => {
		expect(dateField(head, 'gm-casting', 'A 12 9', { year: 1969 }, cited)).toMatchObject({
			code: 'A129',
			outcome: 'found',
			meaning: '12 January 1969',
			values: {
				earliest: '1969-01-12',
				latest: '1969-01-12',
				dates: 'cast',
				format: 'gm-casting'
			},
			possible: [],
			strength: 'fair',
			rows: ['gm.layout.gm-casting.1']
		});
	});

	it('lists the decades while nothing settles them', () => {
		const field = dateField(head, 'gm-casting', 'A 12 9', { years: [1960, 1979] }, bare);
		expect(field).toMatchObject({
			outcome: 'found',
			meaning: '12 January 1969 or 12 January 1979',
			values: { dates: 'cast', format: 'gm-casting' },
			strength: 'not_rated',
			rows: []
		});
		expect(field.possible.map(({ values }) => values.earliest)).toEqual([
			'1969-01-12',
			'1979-01-12'
		]);
	});

	it('is illegible where a character is unread', () => {
		const field = dateField(head, 'gm-casting', 'A 1? 9', { year: 1969 }, bare);
		expect(field).toMatchObject({ outcome: 'illegible', values: { latest: '1969-01-19' } });
	});

	it('has no days while the year is open', () => {
		const field = dateField(head, 'gm-body-month-week', '01C', {}, bare);
		expect(field.values).toEqual({ dates: 'body_finished', format: 'gm-body-month-week' });
		expect(field.meaning).toBe('third week of January');
	});

	it('is not listed when impossible, and says why', () => {
		expect(dateField(head, 'gm-casting', 'B 30 9', { year: 1969 }, bare)).toMatchObject({
			outcome: 'not_listed',
			meaning: null,
			detail: 'February 1969 has 28 days.'
		});
	});
});

describe('a date alone', () => {
	const layouts = (text: string, context = {}, tables = bare) =>
		readDateAlone(text, tables, context).readings.map(({ layout, rank }) => [layout, rank]);

	it('is read in every form that it fits, equal where nothing orders them', () => {
		expect(layouts('9C15')).toEqual([
			['delco-year-month-day', 1],
			['ford-casting', 1],
			['ford-engine-assembly', 1],
			['ford-axle-tag', 1]
		]);
	});

	it('is narrowed by the maker, and by the division that has one', () => {
		const makers = (context: object) =>
			new Set(readDateAlone('9C15', bare, context).readings.map(({ maker }) => maker));
		expect(makers({ maker: 'ford' })).toEqual(new Set(['ford']));
		expect(makers({ division: 'Mercury' })).toEqual(new Set(['ford']));
		expect(makers({ maker: 'gm' })).toEqual(new Set(['gm']));
	});

	it('is read as another maker’s where the maker has no such form', () => {
		expect(layouts('209N15', { maker: 'gm' })).toEqual([['amc-engine-day-build', 1]]);
	});

	it('puts the forms of the year and the better supported first', () => {
		expect(layouts('A129', { maker: 'gm', year: 1985 }).map(([id]) => id)).toEqual([
			'gm-casting',
			'pontiac-casting'
		]);
		expect(layouts('9C15', { maker: 'ford' }, cited)[0]).toEqual(['ford-casting', 1]);
		expect(layouts('9C15', { maker: 'ford' }, cited)[1]?.[1]).toBe(2);
	});

	it('puts a form after others when it was not in use in any year that the date can be of', () => {
		expect(layouts('C9')).toEqual([
			['ford-part-year', 1],
			['carter-month-year', 1],
			['rochester-month-year', 3]
		]);
	});

	it('puts what makers share after the maker’s own', () => {
		const ids = layouts('71', { maker: 'chrysler' }).map(([id]) => id);
		expect(ids).toEqual(['chrysler-pad', 'week-year', 'part-month-year']);
	});

	it('is narrowed by the field', () => {
		const ids = layouts('9C15', { field: 'casting_date' }).map(([id]) => id);
		expect(ids).toEqual(['ford-casting']);
	});

	it('says why the nearest forms do not fit', () => {
		const { readings, problems } = readDateAlone('B 30 69', bare, { maker: 'gm' });
		expect(readings).toEqual([]);
		expect(problems).toEqual([
			{
				layout: 'gm-casting',
				code: 'no_such_day',
				message: 'General Motors casting date: month letter, day, year. February 1969 has 28 days.',
				offers: []
			}
		]);
	});

	it('says that no form fits', () => {
		expect(readDateAlone('ZZZZZZ', bare, {}).problems).toEqual([
			{
				code: 'no_date_form',
				message:
					'ZZZZZZ fits none of the date forms that we know. That says nothing against the part.',
				offers: []
			}
		]);
	});
});

describe('the field of a date', () => {
	it('follows from what it dates', () => {
		const names = (['gm-casting', 'ford-part-year', 'week-year', 'ford-plate'] as const).map((id) =>
			dateFieldName(dateFormat(id))
		);
		expect(names).toEqual(['casting_date', 'casting_number', 'assembly_date', 'build_date']);
	});
});
