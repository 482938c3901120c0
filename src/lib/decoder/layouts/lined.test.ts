import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { readContent } from '../../../../scripts/data/read';
import { compile, LAYOUTS, read, type LinedLayout } from '..';
import type { LineField, LineForm } from '../engine/lined-layout';
import { tableId } from '../engine/table-set';
import { LINED_LAYOUTS } from './lined';

const tables = compile(readContent('data'));
const listed = LINED_LAYOUTS.map((layout) => [layout.id, layout] as const);
const readAs = (layout: LinedLayout, text: string) =>
	read(tables, { text, kind: layout.kind, lined: [layout], context: { maker: layout.maker } });

/** A text of the field's shape. */
function shaped({ shape: { chars, length = 1 } }: LineField): fc.Arbitrary<string> {
	if (typeof chars !== 'string')
		return fc.tuple(...chars.map((own) => fc.constantFrom(...own))).map((own) => own.join(''));
	const [least, most] = typeof length === 'number' ? [length, length] : length;
	return fc.string({ unit: fc.constantFrom(...chars), minLength: least, maxLength: most });
}

/** Codes of the field's rows that have its shape, or any text of the shape. */
function codes(layout: LinedLayout, field: LineField): fc.Arbitrary<string> {
	const { reads, shape } = field;
	if (reads.by === 'year') return fc.constantFrom(...Object.keys(reads.years));
	if (reads.by !== 'table' || reads.parts !== undefined) return shaped(field);
	const { chars, length = 1 } = shape;
	const [least, most] =
		typeof chars !== 'string'
			? [chars.length, chars.length]
			: typeof length === 'number'
				? [length, length]
				: length;
	const fit = [...(tables.tables.get(tableId(layout.maker, reads.table))?.byCode.keys() ?? [])]
		.filter((code) => code.length >= least && code.length <= most)
		.filter((code) =>
			[...code].every((own, n) => (typeof chars === 'string' ? chars : chars[n])?.includes(own))
		);
	return fit.length === 0 ? shaped(field) : fc.constantFrom(...fit);
}

/** The lines of a plate as its layout has them, and the codes in them. */
const plates = (layout: LinedLayout): fc.Arbitrary<readonly string[][]> => {
	const forms: LineForm[] = layout.lines.filter((form) => form.optional !== true);
	const lines = forms.map((form) =>
		fc.tuple(
			...form.fields.filter((field) => field.optional !== true).map((field) => codes(layout, field))
		)
	);
	return fc
		.tuple(...lines)
		.map((own) => (layout.order === 'up' && layout.kind === 'body_tag' ? own.toReversed() : own));
};

describe('every lined layout', () => {
	it('has an id of its own', () => {
		const ids = [...LINED_LAYOUTS, ...LAYOUTS].map(({ id }) => id);
		expect(ids.length).toBe(new Set(ids).size);
	});

	it.each(listed)('%s reads its good example without a problem', (id, layout) => {
		const { readings, problems } = readAs(layout, layout.examples.good);
		expect(readings[0]?.layout).toBe(id);
		expect(problems).toEqual([]);
	});

	it.each(listed)('%s says what is wrong with its bad example', (id, layout) => {
		const { readings, problems } = readAs(layout, layout.examples.bad);
		expect(problems.length > 0 || readings[0]?.layout !== id).toBe(true);
	});

	it.each(listed)('%s reads back what is written in its form', (id, layout) => {
		fc.assert(
			fc.property(plates(layout), (lines) => {
				const text = lines.map((codesOf) => codesOf.join(' ')).join(' / ');
				const reading = readAs(layout, text).readings.find((own) => own.layout === id);
				const told = (reading?.fields ?? []).filter((field) => field.derived_from === undefined);
				expect(told.map(({ code }) => code).join('')).toBe(lines.flat().join(''));
				expect(told.filter(({ label }) => label === 'Not placed')).toEqual([]);
			}),
			{ numRuns: 60 }
		);
	});
});
