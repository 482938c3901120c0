import { describe, expect, it } from 'vitest';
import { readParameters } from './parameters';
import { Refusal } from './refusal';

const NAMES = ['text', 'maker', 'year'] as const;
const refused = (search: string) => {
	try {
		readParameters(search, NAMES);
	} catch (error) {
		if (error instanceof Refusal)
			return [error.status, ...error.errors.map(({ field, code }) => `${field} ${code}`)];
		throw error;
	}
	return 'taken';
};

describe('parameters of an address', () => {
	it('are read by name, decoded', () => {
		expect(readParameters('?text=%5B38%5D+7%2B&maker=gm', NAMES)).toEqual({
			text: '[38] 7+',
			maker: 'gm'
		});
	});

	it('count as absent when empty or blank', () => {
		expect(readParameters('?text=&maker=+%20&year&&', NAMES)).toEqual({});
		expect(readParameters('', NAMES)).toEqual({});
		expect(readParameters('?', NAMES)).toEqual({});
	});

	it('keep an equals sign in the value', () => {
		expect(readParameters('?text=a=b', NAMES)).toEqual({ text: 'a=b' });
	});

	it('are refused when unknown, all of them at once, with what is taken', () => {
		expect(refused('?txt=a&yaer=1967&text=a')).toEqual([
			400,
			'txt unknown_parameter',
			'yaer unknown_parameter'
		]);
		expect(refused('?__proto__=1')).toEqual([400, '__proto__ unknown_parameter']);
	});

	it('are refused when given twice', () => {
		expect(refused('?text=a&text=b')).toEqual([400, 'text repeated']);
	});

	it('are refused when they cannot be decoded', () => {
		expect(refused('?text=%zz')).toEqual([400, 'text=%zz not_decodable']);
		expect(refused('?text=%FF')).toEqual([400, 'text=%FF not_decodable']);
	});
});
