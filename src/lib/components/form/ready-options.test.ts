import { describe, expect, it } from 'vitest';
import { readyOptions } from './ready-options';

describe('readyOptions', () => {
	const options = readyOptions([
		{ value: '', label: 'Any' },
		{ label: 'A & B', choices: [{ value: 'a"b', label: '<b>' }] }
	]);

	it('chooses one', () => {
		expect(options('')).toContain('<option value="" selected>Any</option>');
		expect(options('a"b')).toContain('<option value="a&quot;b" selected>');
		expect(options('a"b').match(/selected/g)).toHaveLength(1);
	});

	it('chooses none for what is not among them', () => {
		expect(options('c')).not.toContain('selected');
	});

	it('writes what stands in them as text', () => {
		expect(options('')).toContain('<optgroup label="A &amp; B">');
		expect(options('')).toContain('>&lt;b&gt;</option>');
	});
});
