import { at, type Finding } from '../finding';
import type { Data } from '../read';

export const name = 'colors';

const HEX = /^#[0-9A-F]{6}$/;

/** Screen colors are six capital figures after `#`, and stand nowhere but in `hex_approximate`. */
export function check(data: Data): Finding[] {
	const findings: Finding[] = [];
	for (const row of data.rows)
		for (const [key, value] of Object.entries(row.value.values)) {
			const isColor = key === 'hex_approximate';
			if (isColor && !HEX.test(String(value)))
				findings.push(at(row, `${String(value)} is no color of the form #1A2B3C`));
			if (!isColor && typeof value === 'string' && value.startsWith('#'))
				findings.push(at(row, `${value} belongs in hex_approximate`));
		}
	return findings;
}
