import { describe, expect, it } from 'vitest';
import { detected } from './detected';

describe('detected', () => {
	it('says nothing before anything can be struck', () => {
		for (const text of ['', '  ', '%%', '- /']) expect(detected(text)).toBe('');
	});
	it('counts places, not what is typed for them', () => {
		expect(detected('*RH23-L0E[38]04127*')).toBe('13 characters: a serial number.');
		expect(detected('7f91c??????')).toBe('11 characters: a serial number.');
	});
	it('tells a code, a sequence, a beginning and too much', () => {
		expect(detected('E')).toBe('One character: a single code.');
		expect(detected('EK2')).toBe('3 characters: a single code.');
		expect(detected('904127')).toMatch(/^Six figures/);
		expect(detected('RM23N0G')).toMatch(/beginning/);
		expect(detected('1G1AY8760B5900417')).toMatch(/^17 characters/);
		expect(detected('1G1AY8760B59004170')).toMatch(/^18 characters: more/);
	});
});
