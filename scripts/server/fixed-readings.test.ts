import { describe, expect, it } from 'vitest';
import { FixedReadings } from './fixed-readings.mjs';

const HEADERS = { 'cache-control': 'immutable', 'content-type': 'application/json' };
const at = (name: string) => `/api/v1/readings?text=${name}`;
const keep = (readings: FixedReadings, key: string, size = 10) =>
	readings.keep(at(key), 200, HEADERS, Buffer.alloc(size, key));

describe('FixedReadings', () => {
	it('lets go what was not asked for longest when there are too many', () => {
		const readings = new FixedReadings({ most: 2 });
		keep(readings, 'a');
		keep(readings, 'b');
		readings.get(at('a'));
		keep(readings, 'c');
		expect(['a', 'b', 'c'].filter((key) => readings.get(at(key)))).toEqual(['a', 'c']);
	});

	it('lets go what was not asked for longest when it holds too much', () => {
		const readings = new FixedReadings({ mostBytes: 10_000 });
		for (const key of ['a', 'b', 'c']) keep(readings, key, 4000);
		expect(readings.size).toBe(1);
		expect(readings.bytes).toBeLessThanOrEqual(10_000);
	});

	it('counts compressed forms, once, and not those of an answer let go meanwhile', async () => {
		const readings = new FixedReadings({ most: 1 });
		keep(readings, 'a', 5000);
		const entry = readings.get(at('a'))!;
		const before = readings.bytes;
		const forms = await Promise.all([readings.formOf(entry, 'br'), readings.formOf(entry, 'br')]);
		expect(readings.bytes).toBe(before + forms[0].body.length);
		const late = readings.formOf(entry, 'gzip');
		keep(readings, 'b');
		const after = readings.bytes;
		await late;
		expect(readings.bytes).toBe(after);
	});

	it('does not keep a very large answer', () => {
		expect(keep(new FixedReadings(), 'a', 300_000)).toBe(false);
	});

	it('replaces an answer without counting it twice', () => {
		const readings = new FixedReadings();
		keep(readings, 'a');
		const once = readings.bytes;
		keep(readings, 'a');
		expect(readings).toMatchObject({ size: 1, bytes: once });
	});

	it('keeps a page for as long as what it was made from is the present', () => {
		let present = '2.2026';
		const readings = new FixedReadings({ present: () => present });
		const page = { 'content-type': 'text/html', 'x-kept-while': '2.2026' };
		expect(readings.keep('/?text=a', 200, page, Buffer.from('page'))).toBe(true);
		expect(readings.get('/?text=a')?.headers).toEqual([['content-type', 'text/html']]);
		present = '3.2026';
		expect(readings.get('/?text=a')).toBeUndefined();
		expect(readings).toMatchObject({ size: 0, bytes: 0 });
	});

	it('keeps no page that does not say for how long', () => {
		const readings = new FixedReadings();
		expect(readings.keep('/?text=a', 200, { etag: '"a"' }, Buffer.from('page'))).toBe(false);
	});
});
