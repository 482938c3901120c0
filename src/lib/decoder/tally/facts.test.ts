import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { TALLY_ATTRIBUTES, type RowValues, type TallyAttribute } from '../../types';
import { agree, type Company } from './facts';

const company: Company = {
	isLine: (name) => ['Heron', 'Curlew'].includes(name),
	beside: (_, a, b) => ([a, b].sort().join() === '396,402' ? ['gm.constraint.x.1'] : [])
};
const said = (attribute: TallyAttribute, left: RowValues, right: RowValues) =>
	agree(attribute, left, right, company);

describe('facts of two sides', () => {
	const facts = fc.record(
		{
			maker: fc.constantFrom('gm', 'ford'),
			division: fc.constantFrom('Pontiac', 'Buick', 'GM of Canada'),
			line: fc.constantFrom('Heron', 'Curlew', 'heron', 'Another word'),
			series: fc.constantFrom('Heron S', 'Heron'),
			doors: fc.constantFrom(2, 4),
			body_style: fc.constantFrom('Coupe', 'Sedan'),
			model_year: fc.constantFrom(1968, 1969),
			unit_year: fc.constantFrom(1968, 1970),
			plant_code: fc.constantFrom('N', 'L'),
			plant_city: fc.constantFrom('Norwood', 'Los Angeles'),
			displacement_cuin: fc.constantFrom(350, 396, 402),
			cylinders: fc.constantFrom(6, 8),
			carburetor_barrels: fc.constantFrom(2, 4),
			carburetors: fc.constantFrom(1, 3),
			horsepower_gross: fc.constantFrom(300, 350),
			transmission: fc.constantFrom('Manual', 'Powerglide', 'Muncie M20', 'Automatic', 'Odd'),
			speeds: fc.constantFrom(3, 4),
			ratio: fc.constantFrom(3.08, 3.55),
			locking: fc.boolean()
		},
		{ requiredKeys: [] }
	);

	it('are symmetric, and never differ from themselves', () => {
		fc.assert(
			fc.property(fc.constantFrom(...TALLY_ATTRIBUTES), facts, facts, (attribute, a, b) => {
				expect(said(attribute, a, b)).toBe(said(attribute, b, a));
				expect(said(attribute, a, a)).not.toBe(false);
			}),
			{ numRuns: 1000 }
		);
	});
});

describe('engines', () => {
	it('agree on what both tell', () => {
		const left = { displacement_cuin: 350, cylinders: 8, carburetor_barrels: 4 };
		expect(said('engine', left, { cylinders: 8 })).toBe(true);
		expect(said('engine', left, { displacement_cuin: 400, cylinders: 8 })).toBe(false);
		expect(said('engine', left, { horsepower_gross: 300 })).toBe(null);
	});

	it('differ by carburetors, one being understood', () => {
		const six = { displacement_cuin: 440, carburetor_barrels: 2, carburetors: 3 };
		expect(said('engine', six, { displacement_cuin: 440, carburetor_barrels: 2 })).toBe(false);
		expect(said('engine', six, { displacement_cuin: 440 })).toBe(true);
	});

	it('are not told apart by another rating alone', () => {
		const left = { displacement_cuin: 350, horsepower_gross: 300 };
		expect(said('engine', left, { displacement_cuin: 350, horsepower_gross: 295 })).toBe(null);
		expect(
			said(
				'engine',
				{ displacement_cuin: 350, horsepower_net: 180 },
				{ displacement_cuin: 350, horsepower_net: 175 }
			)
		).toBe(null);
	});

	it('may be of two sizes that a row lets stand beside each other', () => {
		expect(said('engine', { displacement_cuin: 396 }, { displacement_cuin: 402 })).toBe(true);
	});
});

describe('words', () => {
	it('of a line differ only where serials use both', () => {
		expect(said('line', { line: 'Heron' }, { line: 'Curlew' })).toBe(false);
		expect(said('line', { line: 'Heron' }, { line: 'Heron wagon' })).toBe(null);
	});

	it('of series and body never tell two cars apart, doors do', () => {
		expect(said('series', { series: 'Heron S' }, { series: 'Heron' })).toBe(null);
		expect(said('body_style', { body_style: 'Coupe' }, { body_style: 'Hardtop' })).toBe(null);
		expect(said('body_style', { doors: 2 }, { doors: 4 })).toBe(false);
	});

	it('leave room for cars of GM of Canada', () => {
		expect(said('division', { division: 'Pontiac' }, { division: 'Buick' })).toBe(false);
		expect(said('division', { division: 'Pontiac' }, { division: 'GM of Canada' })).toBe(null);
	});
});

describe('plants', () => {
	it('are told by city, then by code', () => {
		const norwood = { plant_code: 'N', plant_city: 'Norwood' };
		expect(said('assembly_plant', norwood, { plant_city: 'Los Angeles' })).toBe(false);
		expect(said('assembly_plant', norwood, { plant_code: 'N' })).toBe(true);
		expect(said('assembly_plant', norwood, { plant_code: '2', plant_city: 'Norwood' })).toBe(null);
		expect(said('assembly_plant', { plant_city: 'Norwood' }, { plant_city: 'Norwood' })).toBe(true);
	});
});

describe('model years', () => {
	it('are those of the car on both sides, or of a part on one', () => {
		const car = { model_year: 1969 };
		expect(said('model_year', car, { model_year: 1970 })).toBe(false);
		expect(said('model_year', car, { unit_year: 1970 })).toBe(false);
		expect(said('model_year', car, { unit_year: 1969 })).toBe(true);
		expect(said('model_year', { unit_year: 1968 }, car)).toBe(null);
		expect(said('model_year', { unit_year: 1968 }, { unit_year: 1969 })).toBe(null);
		expect(said('model_year', { unit_year: 1968 }, { unit_year: 1968 })).toBe(true);
		expect(said('model_year', car, {})).toBe(null);
	});
});

describe('gearboxes', () => {
	it('differ by kind, by name and by speeds', () => {
		const manual = { transmission: 'Manual' };
		expect(said('transmission', manual, { transmission: 'Powerglide' })).toBe(false);
		expect(said('transmission', manual, { transmission: 'Muncie M20', speeds: 4 })).toBe(true);
		expect(
			said('transmission', { transmission: 'Muncie M20' }, { transmission: 'Saginaw manual' })
		).toBe(false);
		expect(said('transmission', { speeds: 3 }, { speeds: 4 })).toBe(false);
		expect(said('transmission', manual, { transmission: 'Odd' })).toBe(null);
	});
});
