import { expect, it } from 'vitest';
import { cameraTime, moment } from './moments';

it('says day and time in UTC, whatever the offset it was written with', () => {
	expect(moment('2026-06-12T08:05:59Z')).toBe('12 June 2026, 08:05 UTC');
	expect(moment('2026-06-12T23:30:00-02:00')).toBe('13 June 2026, 01:30 UTC');
});

it('says what a camera said, in the camera’s own zone', () => {
	expect(cameraTime('2026-06-12T23:31:07+02:00')).toBe('12 June 2026, 23:31 (+02:00)');
	expect(cameraTime('2026-06-12T10:31:07')).toBe('12 June 2026, 10:31');
});
