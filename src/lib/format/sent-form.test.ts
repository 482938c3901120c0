import { describe, expect, it } from 'vitest';
import { sentForm } from './sent-form';

const TEXTS = { address: { missing: 'An address is missing.' } };

describe('a form', () => {
	it('is as it was before anything was sent', () => {
		const form = sentForm(null, 'sign_in', TEXTS);
		expect(form.fault('address')).toBeUndefined();
		expect(form.problem).toBeUndefined();
		expect(form.typed('address')).toBe('');
		expect(form.typed('address', 'ann@example.org')).toBe('ann@example.org');
	});

	it('comes back with what was typed and a sentence beside the field', () => {
		const refusal = { form: 'sign_in', typed: { name: 'Ann' }, faults: { address: 'missing' } };
		const form = sentForm(refusal, 'sign_in', TEXTS);
		expect(form.fault('address')).toEqual({ message: 'An address is missing.' });
		expect(form.fault('name')).toBeUndefined();
		expect(form.typed('name', 'Bob')).toBe('Ann');
		expect(sentForm(refusal, 'another', TEXTS).fault('address')).toBeUndefined();
	});

	it('says how long to wait, and something for a fault that has no sentence', () => {
		const refusal = {
			form: 'x',
			typed: {},
			faults: { form: 'too_often', address: 'odd' },
			wait: 12
		};
		const form = sentForm(refusal, 'x', TEXTS);
		expect(form.problem).toMatch(/Try again in 12 minutes/);
		expect(form.fault('address')).toEqual({ message: 'This cannot be taken as it stands.' });
	});
});
