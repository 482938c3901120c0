/** What the plates and labels of Ford are read as: their forms, not what the released tables say of the codes. */
import { describe, expect, it } from 'vitest';
import { readContent } from '../../../../../scripts/data/read';
import { compile, read } from '../..';
import type { ReadContext, Reading } from '../../../types';
import { CHRYSLER_LINED } from '../chrysler';

const tables = compile(readContent('data'));
const readingsOf = (text: string, context: ReadContext = {}): readonly Reading[] =>
	read(tables, { text, kind: 'body_tag', context }).readings;
const codesOf = (reading: Reading | undefined) =>
	Object.fromEntries(
		(reading?.fields ?? [])
			.filter((field) => field.derived_from === undefined)
			.map(({ label, code }) => [label, code])
	);

describe('a plate of Ford', () => {
	it('is read alike with the serial number above or below', () => {
		const [above] = readingsOf('9F94H575103 / 76B P 6A 27E 46 6 X');
		const [below] = readingsOf('76B P 6A 27E 46 6 X / 9F94H575103');
		expect(codesOf(above)).toEqual(codesOf(below));
		expect(codesOf(above)).toMatchObject({ District: '46', Axle: '6', Transmission: 'X' });
	});

	it('is not one of years that its own number denies', () => {
		const [first, ...others] = readingsOf('9F94H575103 / 76B P 6A 27E 46 6 X');
		expect(first?.layout).toBe('ford-plate-1962-1969');
		expect(first?.model_year).toBe(1969);
		for (const other of others.filter(({ layout }) => layout === 'ford-plate-1960-1963'))
			expect(other.rank).toBeGreaterThan(first?.rank as number);
	});

	it('of 1963 is told with axle and transmission in either order', () => {
		const orders = readingsOf('54A M 85 15E 34 1 4', { maker: 'ford', year: 1963 }).map(codesOf);
		const told = orders.map(({ Axle, Transmission }) => `${Axle}${Transmission}`);
		expect(told).toContain('14');
		expect(told).toContain('41');
	});

	it('keeps district and special order apart, with a divider or without', () => {
		for (const text of ['65A W 1A 10A 892500 1 U', '65A W 1A 10A 89 2500 1 U'])
			expect(codesOf(readingsOf(text, { year: 1969 })[0])).toMatchObject({
				District: '89',
				'Special order': '2500',
				Axle: '1',
				Transmission: 'U'
			});
	});

	it('with two colors names both', () => {
		const [reading] = readingsOf('6P66X209474 / 63B VM 64 28G 73 1 7');
		const paints = reading?.fields.filter(({ name }) => name.startsWith('paint')) ?? [];
		expect(paints.map(({ name }) => name)).toEqual(['paint', 'paint_upper']);
	});

	it('may have a day of one figure, and no date at all', () => {
		const year = { year: 1966 };
		expect(codesOf(readingsOf('63B M 22 5E 21 1 6', year)[0])).toMatchObject({
			'Scheduled date': '5E',
			District: '21'
		});
		expect(codesOf(readingsOf('63B M 22 21 1 6', year)[0])).toMatchObject({ District: '21' });
	});
});

it('a label of Ford has words beside its codes, and no scheduled date', () => {
	const [reading] = readingsOf(
		'08/70 / 1F91Mxxxxxx / BODY 65D COLOR J TRIM 1A AXLE 6 TRANS X DSO 21'
	);
	expect(reading?.layout).toBe('ford-label-1970-1980');
	expect(codesOf(reading)).toMatchObject({
		Manufactured: '0870',
		Body: '65D',
		Paint: 'J',
		District: '21'
	});
});

it('a tag of more lines than these plates have is read as without them', () => {
	const lines = [
		...Array.from({ length: 10 }, (_, n) => `V1X Y0${n} C16 M${n + 20}`),
		'EV2 H6X9 000 B30 E12345',
		'E74 D32 RM23 R0B1xxxxx'
	];
	const request = { text: lines.join(' / '), kind: 'body_tag' } as const;
	const every = read(tables, { ...request, context: {} });
	const alone = read(tables, { ...request, context: {}, lined: CHRYSLER_LINED });
	expect(every.readings).toEqual(alone.readings);
	expect(every.problems).toEqual(alone.problems);
});
