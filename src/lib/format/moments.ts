import { day } from './editions';

/**
 * A day and the time of it, in UTC, so that every reader sees the same.
 * @example moment('2026-06-12T08:30:00Z') // '12 June 2026, 08:30 UTC'
 */
export const moment = (iso: string): string =>
	`${day(iso)}, ${new Date(iso).toISOString().slice(11, 16)} UTC`;
