import { expect, it } from 'vitest';
import { day, digestShort } from './editions';

it('says a day in words, the same for every reader', () => {
	expect(day('2026-06-12T23:59:59Z')).toBe('12 June 2026');
	expect(day('2026-01-01T00:00:00+02:00')).toBe('31 December 2025');
});

it('shows the first twelve figures of a digest', () => {
	expect(digestShort('9f3c07be51d2aabb')).toBe('9f3c 07be 51d2');
	expect(digestShort('')).toBe('');
});
