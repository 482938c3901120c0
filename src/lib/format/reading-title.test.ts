import { describe, expect, it } from 'vitest';
import { answerTo } from '../../../tests/fixtures/readings/answers';
import { readingTitle } from './reading-title';

const titleOf = (text: string) => readingTitle(answerTo(text, 'serial').readings[0]!);

describe('readingTitle', () => {
	it('says year, division, series, body and engine', () => {
		expect(titleOf('RM23N0G904127')).toBe('1970 Plymouth Road Runner two-door hardtop, 383 V8');
	});
	it('says of a contested engine what all sources agree on', () => {
		expect(titleOf('RH23L0E904127')).toBe('1970 Plymouth Satellite two-door hardtop, 383 V8');
	});
	it('leaves out what is not told', () => {
		expect(titleOf('242379P9?4117')).toBe('1969 Pontiac GTO two-door hardtop');
		expect(titleOf('1G1AY8760B5900417')).toBe('1981 Chevrolet');
	});
	it('names the corporation where no division is told', () => {
		const [, second] = answerTo('7F91C5[38]4127', 'serial').readings;
		expect(readingTitle(second!)).toBe('1977 Ford Motor Company');
	});
});
