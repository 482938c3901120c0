import { describe, expect, it } from 'vitest';
import { check } from './canonical';
import { invented } from './invented';

describe('canonical', () => {
	it('accepts files that writing would not change', () => {
		expect(check(invented())).toEqual([]);
	});

	it('shows the first line that stands out of order', () => {
		const data = invented({ 'gm/engine.csv': ['1967,M,', '1967,A,'] });
		expect(check(data)).toEqual([
			{ file: 'gm/engine.csv', line: 2, message: expect.stringContaining('1967,A,') }
		]);
	});

	it.each([
		['quotes that are not needed', 'Invented Motors', '"Invented Motors"'],
		['a missing last line end', 'memory,Memory,,,memory,,,\n', 'memory,Memory,,,memory,,,']
	])('refuses %s', (_, from, to) => {
		expect(check(invented({ 'sources.csv': [from, to] }))).toHaveLength(1);
	});

	it('refuses carriage returns', () => {
		const data = invented({ 'REJECTED.csv': ['of the make\n', 'of the make\r\n'] });
		expect(check(data)).toEqual([
			{ file: 'REJECTED.csv', line: 2, message: 'holds a carriage return' }
		]);
	});

	it('refuses facts whose keys are not sorted', () => {
		const data = invented({
			'gm/engine.csv': [
				'{""cylinders"":8,""displacement_cuin"":300}',
				'{""displacement_cuin"":300,""cylinders"":8}'
			]
		});
		expect(check(data).map(({ line }) => line)).toEqual([2]);
	});

	it('refuses an empty file of rows', () => {
		const data = invented({
			'gm/paint.citations.csv': ['gm.paint.a.1,kestrel-manual,for,page,page 9,,\n', '']
		});
		expect(check(data)).toEqual([
			{ file: 'gm/paint.citations.csv', line: 1, message: 'holds no record' }
		]);
	});
});
