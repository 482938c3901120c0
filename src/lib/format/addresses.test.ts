import { expect, it } from 'vitest';
import { readingAddress, rowAddress, sourceAddress } from './addresses';

it('writes the parts of a reading’s address in one order and leaves out what is empty', () => {
	const address = readingAddress({
		edition: 43,
		year: 1970,
		maker: 'plymouth',
		text: 'RH23L0E9?4127',
		kind: 'serial'
	});
	expect(address).toBe('/?kind=serial&text=RH23L0E9%3F4127&maker=plymouth&year=1970&edition=43');
	expect(readingAddress({ kind: '', text: 'EK2', maker: null, year: '' })).toBe('/?text=EK2');
});

it('names a reading only when it is not the first', () => {
	expect(readingAddress({ text: 'A', reading: 1 })).toBe('/?text=A');
	expect(readingAddress({ text: 'A', reading: 2 })).toBe('/?text=A&reading=2');
});

it('survives every sign that can be typed', () => {
	const text = '[38] +&=#%é/';
	const address = readingAddress({ text });
	expect(new URL(address, 'http://localhost').searchParams.get('text')).toBe(text);
});

it('leads to rows and sources', () => {
	expect(rowAddress('gm.engine.t.1')).toBe('/rows/gm.engine.t.1');
	expect(sourceAddress('club-page')).toBe('/sources/club-page');
});
