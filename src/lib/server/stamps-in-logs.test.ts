import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { maskAddress, maskStamp, maskStamps } from './stamps-in-logs';

describe('maskStamps', () => {
	it.each([
		['no layout fits 242378B123456 here', 'no layout fits 242378B****** here'],
		['*242378B123456*', '*242378B******'],
		['2 42 37 8 B 123456', '2 42 37 8 B ******'],
		['242378B-123456', '242378B-******'],
		['2423xxB123456', '2423xxB******'],
		['2 42 37 xx B 123456', '2 42 37 xx B ******'],
		['242378B12345[38]', '242378B******'],
		['242378B1234?_', '242378B******'],
		['242378B１２３４５６', '242378B******'],
		['Not found: /x/2%2042%20378B123456', 'Not found: /x/2 42 378B******'],
		['1G1YY22G965108756 and 6H24C123456', '1G1YY22G965****** and 6H24C******'],
		['ST 69 23737 PON 123456 BDY / TR 293 50 50 PNT', 'ST ******'],
		['JS23R0B440123 / D32 E55 727', 'JS23R0B******'],
		['D32 E55\nFY1 440123 / JS23 R0B 440123', 'D32 E55\nFY******'],
		['VH23 / G0B / 44 01 23 / E63 D32', 'VH23 / G0B / ******']
	])('masks %s', (text, masked) => {
		expect(maskStamps(text)).toBe(masked);
	});

	it.each([
		'Field year expects a number from 1955 to 2039',
		'connect ECONNREFUSED 127.0.0.1:33071',
		'ER_LOCK_DEADLOCK: try restarting transaction',
		'(conn:5, no: 45009, SQLState: 08S01) socket has unexpectedly been closed',
		'at read (src/lib/decoder/index.ts:12:5)',
		'listening on port 3000 after 812 ms'
	])('leaves prose alone: %s', (text) => {
		expect(maskStamps(text)).toBe(text);
	});

	const character = fc.constantFrom(...'ABCDEFGHJKLMNPRSTUVWXYZ0123456789?_');
	const stamp = fc
		.array(character, { minLength: 11, maxLength: 40 })
		.filter((characters) => characters.some((c) => /\d/.test(c)));

	it('lets no stamp of eleven or more keep its last six', () => {
		fc.assert(
			fc.property(
				stamp,
				fc.constantFrom('', ' ', '-', '.', ' - ', ' / ', '\n', '%20'),
				fc.constantFrom('', '*', '-', '**'),
				fc.constantFrom('', 'no layout fits ', 'GET /?text=', '"'),
				(characters, divider, end, before) => {
					const masked = maskStamps(`${before}${end}${characters.join(divider)}${end}`);
					const kept = masked.slice(maskStamps(before).length).replace(/[^\p{L}\p{N}?_]/gu, '');
					const most = characters.slice(0, Math.min(11, characters.length - 6)).join('');
					if (characters.length <= 17) expect(kept).toBe(most);
					else expect(most.startsWith(kept)).toBe(true);
				}
			)
		);
	});

	it('lets no running number of a text that holds several stand', () => {
		const before = fc.array(character, { maxLength: 9 });
		const number = fc.array(fc.constantFrom(...'0123456789?_'), { minLength: 6, maxLength: 6 });
		const behind = fc.array(character, { minLength: 12, maxLength: 30 });
		fc.assert(
			fc.property(before, number, behind, (first, figures, rest) => {
				const masked = maskStamp(`${first.join('')} ${figures.join('')} / ${rest.join('')}`);
				expect(first.join('').startsWith(masked.replace(/ ?\*{6}$/, ''))).toBe(true);
			})
		);
	});

	it('takes any text and is settled after one pass', () => {
		fc.assert(
			fc.property(fc.string({ unit: 'binary' }), (text) => {
				const once = maskStamps(text).replaceAll('%', '');
				expect(maskStamps(once).length).toBeLessThanOrEqual(once.length + 6);
			})
		);
	});
});

describe('maskStamp', () => {
	it.each([
		['23737', '******'],
		['242378B123456', '242378B******'],
		['', ''],
		['--', '--']
	])('masks %j', (text, masked) => {
		expect(maskStamp(text)).toBe(masked);
	});
});

describe('maskAddress', () => {
	it.each([
		['/?kind=serial&text=242378B123456&year=1967', '/?kind=serial&text=242378B******&year=1967'],
		['/api/v1/readings?text=6H24C123', '/api/v1/readings?text=6H******'],
		['/?text=2+42+37+8+B+123456', '/?text=2 42 37 8 B ******'],
		['/cars/242378B123456/report', '/cars/242378B******/report'],
		['/tables/gm/engine?limit=200', '/tables/gm/engine?limit=200'],
		['/?a=1?text=242378B123456', '/?a=1?text=242378B******'],
		['/%E0%A4%A', '/%E0%A4%A']
	])('masks %s', (address, masked) => {
		expect(maskAddress(address)).toBe(masked);
	});
});
