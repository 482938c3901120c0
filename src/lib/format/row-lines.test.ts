import { describe, expect, it } from 'vitest';
import { compile } from '../decoder';
import { INVENTED } from '../../../tests/fixtures/invented';
import { citedAt, rowLine, shortened } from './row-lines';

describe('a row in a list', () => {
	it('names its table, its scope and the first of its sources', () => {
		const { rows } = compile(INVENTED);
		const row = rows.get('gm.line.h.2');
		expect(row && rowLine(row)).toMatchObject({
			address: '/rows/gm.line.h.2',
			code: 'H',
			meaning: 'Plover',
			table: 'Car lines',
			scope: 'Pontiac',
			years: '1970–72',
			strength: 'firm',
			restsOn: ['Cars of the Marsh, p. 12', 'Register of the Wader Club, p. 12'],
			more: 0,
			hex: null
		});
	});

	it('cuts a long note at a word', () => {
		expect(shortened('Numbered as in the picture, of the plate', 28)).toBe(
			'Numbered as in the picture…'
		);
		expect(shortened('Short.', 28)).toBe('Short.');
	});

	it('gives the place in a work where there is one', () => {
		expect(citedAt({ title: 'Works manual', locator: 'p. 3' })).toBe('Works manual, p. 3');
		expect(citedAt({ title: 'Works manual', locator: '' })).toBe('Works manual');
	});
});
