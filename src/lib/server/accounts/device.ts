/** Browsers in the order in which they name others: each claims to be those after it. */
const BROWSERS: readonly (readonly [sign: RegExp, name: string])[] = [
	[/\bEdg(?:e|A|iOS)?\//, 'Edge'],
	[/\bOPR\//, 'Opera'],
	[/\bFirefox\/|\bFxiOS\//, 'Firefox'],
	[/\bChrome\/|\bCriOS\//, 'Chrome'],
	[/\bSafari\//, 'Safari']
];
const SYSTEMS: readonly (readonly [sign: RegExp, name: string])[] = [
	[/\bAndroid\b/, 'Android'],
	[/\biPhone\b/, 'iPhone'],
	[/\biPad\b/, 'iPad'],
	[/\bWindows\b/, 'Windows'],
	[/\bMac OS X\b/, 'Mac'],
	[/\bCrOS\b/, 'Chromebook'],
	[/\bLinux\b/, 'Linux']
];

const nameIn = (agent: string, names: typeof BROWSERS): string | undefined =>
	names.find(([sign]) => sign.test(agent))?.[1];

/**
 * By what somebody knows a session of theirs again: "Firefox on Windows". No more of what the browser says
 * is kept.
 */
export function deviceOf(agent: string | null): string {
	const browser = nameIn(agent ?? '', BROWSERS) ?? 'Unknown browser';
	const system = nameIn(agent ?? '', SYSTEMS);
	return system === undefined ? browser : `${browser} on ${system}`;
}
