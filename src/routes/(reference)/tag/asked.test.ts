import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { tagAddress } from '$lib/format/addresses';
import { askedTag } from './asked';

const asked = (query: string) => askedTag(new URLSearchParams(query));

describe('what the address of the tag page asks', () => {
	it('keeps each line in its place, blank ones too', () => {
		expect(asked('text=V1X+END&text=&text=E63+D32').lines).toEqual(['V1X END', '', 'E63 D32']);
	});

	it('divides what was pasted into one field where lines end', () => {
		expect(asked('text=V1X+END%0D%0AE63+D32+/+A1').lines).toEqual(['V1X END', 'E63 D32', 'A1']);
	});

	it('keeps a slash that stands inside a code', () => {
		expect(asked('text=C7AE-A/B').lines).toEqual(['C7AE-A/B']);
	});

	it('leaves out blank lines past the fourteenth, and nothing that was typed', () => {
		const { lines } = asked(`${'text=&'.repeat(500)}text=END`);
		expect(lines).toHaveLength(15);
		expect(lines.at(-1)).toBe('END');
	});

	it('is asked again by the address that is written for it', () => {
		const line = fc.stringMatching(/^[A-Z0-9 ?[\]&=#+-]{0,20}$/);
		fc.assert(
			fc.property(
				fc.constantFrom('', 'gm', 'plymouth'),
				fc.constantFrom('', '1970'),
				line,
				fc.array(line, { maxLength: 14 }),
				(maker, year, serial, lines) => {
					const address = new URL(tagAddress({ maker, year, serial, lines }), 'http://localhost');
					expect(askedTag(address.searchParams)).toEqual({ maker, year, serial, lines });
				}
			)
		);
	});
});
