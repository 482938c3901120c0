import { describe, expect, it } from 'vitest';
import { parseData } from '../read';
import { exceptionFiles } from '../write';
import { check } from './exceptions';
import { check as canonical } from './canonical';
import { INVENTED } from './invented';

const HEAD = 'check,rows,digest,source,reason';
const LINE =
	'two_meanings,gm.engine.k.1|gm.engine.m.1,0123456789abcdef,kestrel-manual,Both stand on page 4.';
const folder = (...lines: string[]) =>
	parseData(
		new Map([...Object.entries(INVENTED), ['exceptions.csv', `${[HEAD, ...lines].join('\n')}\n`]])
	);

describe('exceptions', () => {
	it('accepts a question that a work settles, in its one form', () => {
		const data = folder(LINE);
		expect(data.exceptions).toHaveLength(1);
		expect(check(data)).toEqual([]);
		expect(canonical(data)).toEqual([]);
	});

	it('goes without the file', () => {
		const data = parseData(new Map(Object.entries(INVENTED)));
		expect(data.unreadable).toEqual([]);
		expect(exceptionFiles([])).toEqual(new Map());
	});

	it.each([
		['a row that is not there', [LINE.replace('engine.m.1', 'engine.m.7')]],
		['a work that is not there', [LINE.replace('kestrel-manual', 'heron-manual')]],
		['memory', [LINE.replace('kestrel-manual', 'memory')]],
		['the same question twice', [LINE, LINE.replace('0123', '4567')]]
	])('refuses %s', (_, lines) => {
		expect(check(folder(...lines))).toHaveLength(1);
	});

	it.each([
		['a check that there is none of', LINE.replace('two_meanings', 'three_meanings')],
		['a digest that is none', LINE.replace('0123456789abcdef', '0123')],
		['no reason', LINE.replace('Both stand on page 4.', '')]
	])('cannot be read with %s', (_, line) => {
		expect(folder(line).unreadable).toHaveLength(1);
	});

	it('refuses lines out of order', () => {
		expect(canonical(folder(LINE, LINE.replace('two_meanings', 'gap')))).toHaveLength(1);
	});
});
