/**
 * Worked serials as published pages print them, held against the released tables.
 * Each line of `serials/*.csv` names its source; misprints and known misses say so and why.
 */
import { describe, expect, it } from 'vitest';
import { read } from '../../src/lib/decoder';
import type { ReadingField } from '../../src/lib/types';
import { firstReading, released, samples, unmet, type Expectation } from './samples';

const tables = released();

describe.each(['gm', 'chrysler', 'ford', 'amc'])('published serials of %s', (maker) => {
	const list = samples(`serials/${maker}.csv`);

	it.each(
		list
			.filter((sample) => sample.known_miss === '')
			.map((sample) => [sample.text, sample.source, sample] as const)
	)('%s reads as %s says', (_, __, sample) => {
		const expectation = JSON.parse(sample.expect ?? '{}') as Expectation;
		expect(Object.keys(expectation).length).toBeGreaterThan(0);
		expect(unmet(firstReading(tables, sample), expectation)).toEqual([]);
	});

	const misses = list.filter((sample) => sample.known_miss !== '');
	if (misses.length > 0)
		it.each(misses.map((sample) => [sample.text, sample.known_miss, sample] as const))(
			'%s is still missed: %s',
			(_, __, sample) => {
				const expectation = JSON.parse(sample.expect ?? '{}') as Expectation;
				expect(unmet(firstReading(tables, sample), expectation)).not.toEqual([]);
			}
		);
});

describe('a published serial with a slip of the hand', () => {
	const serials = ['gm', 'chrysler', 'ford', 'amc']
		.flatMap((maker) => samples(`serials/${maker}.csv`))
		.map(({ text = '' }) => text)
		// Masked through and through, as little is left of them as of any code.
		.filter((text) => !/\s|x{7}/.test(text));
	const isSequence = ({ name }: ReadingField) => name === 'sequence_number';
	const slips: readonly (readonly [string, (text: string) => string])[] = [
		['a character too few', (text) => text.slice(0, -1)],
		['a Z for a figure', (text) => text.slice(0, 2) + 'Z' + text.slice(3)],
		['its beginning alone', (text) => text.slice(0, 9)]
	];

	it.each(slips)('%s, is not cut up as a plate, and still told of as a serial', (_, slip) => {
		for (const serial of serials) {
			const { input, readings, problems } = read(tables, { text: slip(serial) });
			expect([serial, input.kind]).not.toEqual([serial, 'body_tag']);
			const isSerial = readings.some(({ fields }) => fields.some(isSequence));
			expect([serial, isSerial || problems.length > 0]).toEqual([serial, true]);
		}
	});
});

describe('the list', () => {
	it('holds sixty published serials of these makers or more, each with its source', () => {
		const list = ['gm', 'chrysler', 'ford', 'amc'].flatMap((maker) =>
			samples(`serials/${maker}.csv`)
		);
		expect(list.length).toBeGreaterThanOrEqual(60);
		expect(list.filter((sample) => sample.source === '')).toEqual([]);
	});
});

describe('common practice, no source', () => {
	it('the engine letter C of 1966 is the base 289 V8 with two-barrel carburetor in the Ford family', () => {
		for (const text of ['6F43C100xxx', '6K35C100xxx', '6H22C500xxx']) {
			const engine = firstReading(tables, { text, maker: 'ford', year: '1966' })?.fields.find(
				(field) => field.name === 'engine'
			);
			expect(engine).toMatchObject({
				outcome: 'found',
				values: { displacement_cuin: 289, carburetor_barrels: 2, cylinders: 8 }
			});
		}
	});
});
