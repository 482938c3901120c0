import { describe, expect, it } from 'vitest';
import { swatchOf, valueCells } from './values';

const words = (values: Record<string, unknown>) =>
	valueCells(values).map(({ label, value }) => `${label}: ${value}`);

describe('values of a row', () => {
	it('are written out with their units, in one order whatever the row’s', () => {
		expect(
			words({
				horsepower_gross: 335,
				cylinders: 8,
				compression_ratio: 10.25,
				displacement_cuin: 383
			})
		).toEqual([
			'Displacement: 383 cubic inches',
			'Power: 335 horsepower, gross',
			'Compression: 10.25 to 1',
			'Cylinders: 8'
		]);
	});

	it('name months and kinds, group figures that count, and leave numbers of cars alone', () => {
		expect(
			words({ month: 4, locking: true, units_built: 12496, first_sequence: 100001, ratio: 3.23 })
		).toEqual([
			'First sequence number: 100001',
			'Ratio: 3.23 to 1',
			'Differential: locking or limited slip',
			'Month: April',
			'Built: 12,496 cars'
		]);
		expect(words({ locking: false })).toEqual(['Differential: conventional']);
	});

	it('say what items, packages and rules hold', () => {
		expect(
			words({
				added_later: 'bolted',
				brings: [{ item: 'hood_scoop' }],
				excludes: [{ attribute: 'transmission', none_of: ['manual'] }],
				requires: [
					{ attribute: 'engine', any_of: ['R', 'V'] },
					{ attribute: 'body_style', any_of: ['23'], none_of: ['27'] },
					{ attribute: 'plant' }
				],
				odd_one: ['a', 'b']
			})
		).toEqual([
			'Added later: bolted on: easily added',
			'Requires: engine is R or V; body style is 23, body style is not 27; plant is told',
			'Brings: hood scoop',
			'Excludes: transmission is not manual',
			'odd one: a; b'
		]);
	});

	it('have a color for the screen or none', () => {
		expect(swatchOf({ hex_approximate: '#D2691E' })).toBe('#D2691E');
		expect(swatchOf({})).toBeNull();
	});
});
