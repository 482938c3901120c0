/**
 * A span of model years, the century said once.
 * @example yearSpan(1968, 1980) // '1968–80'
 * @example yearSpan(1998, 2004) // '1998–2004'
 */
export function yearSpan(from: number | null, to: number | null): string {
	if (from === null || to === null) return 'all years';
	if (from === to) return String(from);
	const short = Math.floor(from / 100) === Math.floor(to / 100);
	return `${from}–${short ? String(to % 100).padStart(2, '0') : to}`;
}
