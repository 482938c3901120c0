import { describe, expect, it } from 'vitest';
import { check } from './codes';
import { invented } from './invented';

describe('codes', () => {
	it('accepts codes as stamped and meanings without a stop', () => {
		expect(check(invented())).toEqual([]);
	});

	it.each([
		['a code in lower case', '1966,A,', '1966,a,'],
		['a code with spaces around it', '1966,A,', '1966,A ,'],
		['a meaning in lower case', 'Heron Gray', 'heron Gray'],
		['a meaning with a full stop', 'Heron Gray', 'Heron Gray.'],
		['a meaning with spaces around it', 'Heron Gray', ' Heron Gray']
	])('refuses %s', (_, from, to) => {
		expect(check(invented({ 'gm/paint.csv': [from, to] }))).toHaveLength(1);
	});

	it('leaves the ids of layouts alone', () => {
		const data = invented();
		const [row] = data.rows;
		if (row === undefined) throw new Error('the invented folder has rows');
		const layout = { ...row, value: { ...row.value, table: 'layout' as const, code: 'gm-1966' } };
		expect(check({ ...data, rows: [layout] })).toEqual([]);
	});
});
