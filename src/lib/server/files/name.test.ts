import { describe, expect, it } from 'vitest';
import { fileName } from './name';

describe('the name of a file', () => {
	it.each([
		['plate.jpg', 'plate.jpg'],
		['C:\\photos\\plate.jpg', 'plate.jpg'],
		['../../etc/passwd', 'passwd'],
		['pla\r\nte.jpg', 'plate.jpg'],
		// Written backwards on the screen, an ending could pass for another.
		['plate\u202egpj.exe', 'plategpj.exe'],
		['<script>alert(1)<', '<script>alert(1)<'],
		['e\u0301tiquette.pdf', '\u00e9tiquette.pdf'],
		['photos/', 'file'],
		['', 'file']
	])('%j is kept as %j', (given, kept) => {
		expect(fileName(given)).toBe(kept);
	});

	it('that is too long keeps its ending', () => {
		const kept = fileName(`${'😀'.repeat(300)}.jpeg`);
		expect([...kept]).toHaveLength(200);
		expect(kept.endsWith('😀.jpeg')).toBe(true);
	});
});
