/** The seventeen-character standard against published samples, tables and a general-purpose library. */
import { faker } from '@faker-js/faker';
import { describe, expect, it } from 'vitest';
import { checkDigitOf, read } from '../../src/lib/decoder';
import { firstReading, released, samples, unmet, type Expectation } from './samples';

const tables = released();
const field = (text: string, name: string) =>
	firstReading(tables, { text })?.fields.find((own) => own.name === name);

describe('published samples', () => {
	it.each(
		samples('standards.csv').map((sample) => [sample.text ?? '', sample.source, sample] as const)
	)('%s: %s', (text, _, sample) => {
		const { check_digit, check, ...rest } = JSON.parse(sample.expect ?? '{}') as Record<
			string,
			string
		>;
		const digit = field(text, 'check_digit');
		if (check !== undefined) expect(digit?.values.check_digit_fits ?? false).toBe(check === 'pass');
		if (check_digit !== undefined) expect(checkDigitOf([...text])).toBe(check_digit);
		expect(unmet(firstReading(tables, { text }), rest as Expectation)).toEqual([]);
	});
});

describe('the model-year table', () => {
	it.each(
		samples('model-years.csv').map(
			(sample) => [sample.code ?? '', Number(sample.year), sample.source] as const
		)
	)('%s is %i by %s', (code, year) => {
		const seventh = year < 2010 ? '1' : 'A';
		const years = read(tables, { text: `1G4AH5${seventh}H?${code}G118341` }).readings.map(
			(reading) => reading.model_year
		);
		expect(years).toEqual([year]);
	});
});

describe('country ranges', () => {
	it.each(
		samples('countries.csv').map(
			(sample) => [sample.range ?? '', sample.country ?? '', sample.source] as const
		)
	)('%s is %s by %s', (range, country) => {
		const [from = '', to = from] = range.split('-');
		for (const start of [from, to]) {
			const told = field(`${start}ZZZZZZ?K?000001`.padEnd(17, '1'), 'country');
			const meanings = [told?.meaning, ...(told?.alternatives.map((one) => one.meaning) ?? [])];
			expect(meanings.join(' | ').toLowerCase()).toContain(country.toLowerCase());
		}
	});
});

describe('@faker-js/faker, a general test-data library', () => {
	it('makes numbers whose check digit is ours: two thousand of them', () => {
		faker.seed(1977);
		const wrong = Array.from({ length: 2000 }, () => faker.vehicle.vin()).filter(
			(vin) => checkDigitOf([...vin]) !== vin.charAt(8)
		);
		expect(wrong).toEqual([]);
	});
});
