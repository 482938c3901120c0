import { describe, expect, it } from 'vitest';
import { chooseType } from './accept';
import { Refusal } from './refusal';

const offered = ['application/json', 'text/csv'] as const;

describe('the type of an answer', () => {
	it.each([
		[null, 'application/json'],
		['', 'application/json'],
		['*/*', 'application/json'],
		['application/*', 'application/json'],
		['text/csv', 'text/csv'],
		['TEXT/CSV', 'text/csv'],
		['text/*', 'text/csv'],
		['text/csv;q=0.5, application/json;q=0.4', 'text/csv'],
		['text/csv;q=0.5, */*;q=0.5', 'application/json'],
		['text/html,application/xhtml+xml,*/*;q=0.8', 'application/json'],
		['application/json;q=0, */*', 'text/csv']
	])('for Accept: %s is %s', (accept, type) => {
		expect(chooseType(accept, offered)).toBe(type);
	});

	it.each(['text/html', 'image/*', 'application/json;q=0', 'application/json;q=none'])(
		'for Accept: %s is refused with 406',
		(accept) => {
			expect(() => chooseType(accept, ['application/json'])).toThrow(Refusal);
		}
	);
});
