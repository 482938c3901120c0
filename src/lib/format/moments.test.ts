import { expect, it } from 'vitest';
import { moment } from './moments';

it('says day and time in UTC, whatever the offset it was written with', () => {
	expect(moment('2026-06-12T08:05:59Z')).toBe('12 June 2026, 08:05 UTC');
	expect(moment('2026-06-12T23:30:00-02:00')).toBe('13 June 2026, 01:30 UTC');
});
