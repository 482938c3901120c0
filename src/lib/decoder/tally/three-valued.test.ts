import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { all, any, not, unanimous, type Truth } from './three-valued';

const truth = fc.constantFrom<Truth>(true, false, null);
const truths = fc.array(truth, { maxLength: 5 });

describe('three-valued logic', () => {
	it('keeps De Morgan’s laws and double negation', () => {
		fc.assert(
			fc.property(truths, truth, (values, one) => {
				expect(not(all(values))).toBe(any(values.map(not)));
				expect(not(any(values))).toBe(all(values.map(not)));
				expect(not(not(one))).toBe(one);
			})
		);
	});

	it('does not turn on order or repetition', () => {
		fc.assert(
			fc.property(truths, (values) => {
				const turned = [...values].reverse();
				expect(all(turned)).toBe(all(values));
				expect(any(turned)).toBe(any(values));
				expect(unanimous(turned)).toBe(unanimous(values));
				expect(all([...values, ...values])).toBe(all(values));
			})
		);
	});

	it('never changes its mind when something becomes known', () => {
		fc.assert(
			fc.property(truths, fc.boolean(), (values, known) => {
				const told = values.map((value) => value ?? known);
				for (const join of [all, any]) {
					const before = join(values);
					if (before !== null) expect(join(told)).toBe(before);
				}
			})
		);
	});

	it('says the classical thing of the classical values', () => {
		fc.assert(
			fc.property(fc.array(fc.boolean()), (values) => {
				expect(all(values)).toBe(values.every(Boolean));
				expect(any(values)).toBe(values.some(Boolean));
			})
		);
		expect(unanimous([])).toBe(null);
		expect(unanimous([false, false])).toBe(false);
		expect(unanimous([true, false])).toBe(null);
	});
});
