import { expect, it } from 'vitest';
import { yearSpan } from './years';

it('says the century of a span once', () => {
	expect(yearSpan(1968, 1980)).toBe('1968–80');
	expect(yearSpan(1970, 1970)).toBe('1970');
	expect(yearSpan(1998, 2004)).toBe('1998–2004');
	expect(yearSpan(2001, 2009)).toBe('2001–09');
	expect(yearSpan(null, null)).toBe('all years');
});
