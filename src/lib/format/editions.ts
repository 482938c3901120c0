const MONTHS = [
	'January',
	'February',
	'March',
	'April',
	'May',
	'June',
	'July',
	'August',
	'September',
	'October',
	'November',
	'December'
];

/**
 * A day in words, in UTC, so that every reader sees the same day.
 * @example day('2026-06-12T08:30:00Z') // '12 June 2026'
 */
export function day(iso: string): string {
	const date = new Date(iso);
	return `${date.getUTCDate()} ${MONTHS[date.getUTCMonth()]} ${date.getUTCFullYear()}`;
}

/**
 * The first twelve figures of a digest in groups of four, for the eye; the whole stands in reports.
 * @example digestShort('9f3c07be51d2…') // '9f3c 07be 51d2'
 */
export const digestShort = (digest: string): string =>
	(digest.slice(0, 12).match(/.{1,4}/g) ?? []).join(' ');
