import { describe, expect, it } from 'vitest';
import { invented } from './invented';
import { check } from './services';

const at = (address: string) =>
	check(invented({ 'sources.csv': ['https://kestrel.example/numbers', address] }));

describe('services', () => {
	it.each([
		'https://kestrel.example/numbers',
		'https://kestrel.example/tech-vin.html',
		'https://magazine.example/how-to-decode-kestrel-numbers',
		'State library, shelf 7'
	])('accepts %s', (address) => {
		expect(at(address)).toEqual([]);
	});

	it.each([
		'https://vin-decoder.example/',
		'https://www.example/free-vin-check',
		'https://example/tools/decoder.php',
		'https://kestreldecoder.example/serial-decoder'
	])('refuses %s', (address) => {
		expect(at(address)).toEqual([
			{ file: 'sources.csv', line: 3, message: expect.stringContaining(address) }
		]);
	});
});
