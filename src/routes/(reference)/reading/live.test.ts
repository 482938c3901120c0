// @vitest-environment jsdom
import { describe, expect, it } from 'vitest';
import { entryText } from '$lib/text/en/entry';
import { looksLike } from './live.js';

describe('looksLike', () => {
	it('says nothing before anything can be struck', () => {
		for (const text of ['', '  ', '%%', '- /']) expect(looksLike(text)).toBeNull();
	});
	it('counts places, not what is typed for them', () => {
		expect(looksLike('*RH23-L0E[38]04127*')).toEqual({ places: 13, kind: 'serial' });
		expect(looksLike('7f91c??????')).toEqual({ places: 11, kind: 'serial' });
	});
	it('tells a code, a sequence, a beginning and too much, and has a sentence for each', () => {
		const kinds = ['E', 'EK2', '904127', 'RM23N0G', '1G1AY8760B5900417', '1G1AY8760B59004170'].map(
			(text) => looksLike(text)?.kind
		);
		expect(kinds).toEqual(['code', 'code', 'sequence', 'short', 'seventeen', 'long']);
		for (const kind of kinds) expect(entryText.detected[kind!]).toBeTruthy();
	});
});
