import { describe, expect, it } from 'vitest';
import { invented } from './invented';
import { check } from './unique';

describe('unique', () => {
	it('accepts keys that stand once', () => {
		expect(check(invented())).toEqual([]);
	});

	it('names the place of the first when a row key stands twice', () => {
		const data = invented({ 'gm/note.csv': ['gm.note.x.2', 'gm.note.x.1'] });
		expect(check(data)).toEqual([
			{ file: 'gm/note.csv', line: 3, message: 'gm.note.x.1 stands at gm/note.csv:2 too' }
		]);
	});

	it('refuses a collected fact that is listed twice', () => {
		const data = invented({ 'candidates.csv': ['birds-2', 'birds-1'] });
		expect(check(data).map(({ line }) => line)).toEqual([3]);
	});
});
