import { day } from './editions';

/**
 * A day and the time of it, in UTC, so that every reader sees the same.
 * @example moment('2026-06-12T08:30:00Z') // '12 June 2026, 08:30 UTC'
 */
export const moment = (iso: string): string =>
	`${day(iso)}, ${new Date(iso).toISOString().slice(11, 16)} UTC`;

/**
 * What a camera's clock said, with its offset where it knew one: never turned into another zone.
 * @example cameraTime('2026-06-12T10:31:07+02:00') // '12 June 2026, 10:31 (+02:00)'
 */
export function cameraTime(iso: string): string {
	const offset = /[+-]\d\d:\d\d$/.exec(iso)?.[0];
	const shown = `${day(`${iso.slice(0, 10)}T00:00:00Z`)}, ${iso.slice(11, 16)}`;
	return offset ? `${shown} (${offset})` : shown;
}
