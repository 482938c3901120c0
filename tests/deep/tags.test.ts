import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { readContent } from '../../scripts/data/read';
import { compile, linesOf, LINED_LAYOUTS, read } from '../../src/lib/decoder';
import { gmTag, chryslerTag, pad, casting } from '../fixtures/lined';

const released = compile(readContent('data'));
const invented = [gmTag, chryslerTag, pad, casting];
const kinds = fc.constantFrom('body_tag', 'engine', 'casting', 'date', 'code', undefined);

/** Pieces of real tags in any order, among signs, marks and letters of other scripts. */
const pieces = [
	...LINED_LAYOUTS.flatMap(({ examples }) => examples.good.split(' ')),
	...[
		'ST',
		'TR',
		'PNT',
		'BDY',
		'69',
		'12437',
		'NOR',
		'245876',
		'711',
		'01C',
		'E86',
		'D32',
		'19N512345'
	],
	...['/', '\n', '?', 'xx', '[38]', '*', '-', '.', 'É', 'Я', '１', '🚗', '\u2028', ' ', 'A', '7']
];
const pieced = fc
	.array(fc.tuple(fc.constantFrom(...pieces), fc.constantFrom(' ', '', ' / ', '\n')), {
		maxLength: 60
	})
	.map((parts) => parts.flat().join(''));

describe('tens of thousands of tags against the released tables', () => {
	it('are read without an error; every character stands in one field, on its line', () => {
		fc.assert(
			fc.property(
				fc.oneof({ weight: 3, arbitrary: pieced }, fc.string({ unit: 'binary', maxLength: 700 })),
				kinds,
				fc.constantFrom(LINED_LAYOUTS, invented),
				(text, kind, lined) => {
					const { readings, input } = read(released, {
						text,
						lined,
						...(kind === undefined ? {} : { kind })
					});
					for (const { layout, fields } of readings) {
						if (!lined.some(({ id }) => id === layout)) continue;
						const own = fields.filter(({ derived_from }) => derived_from === undefined);
						own.forEach(({ from, to }, index) => {
							expect(from).toBeLessThanOrEqual(to);
							expect(from).toBeGreaterThan(own[index - 1]?.to ?? 0);
						});
						if (input.kind === 'body_tag')
							expect(new Set(own.map(({ line = 1 }) => line)).size).toBeLessThanOrEqual(
								linesOf(text).lines.length
							);
					}
					expect(readings.length).toBeLessThanOrEqual(24);
				}
			),
			{ numRuns: 20_000 }
		);
	});
});
