import { expect, it } from 'vitest';
import { checkDigitOf } from '$lib/decoder';
import { checkDigitWork } from './check-digit-work';

it('works a check digit through as the reader does', () => {
	for (const text of ['1M8GDM9AXKP042788', '1G1AY8760B5900417']) {
		const work = checkDigitWork([...text]);
		expect(work?.digit).toBe(checkDigitOf([...text]));
		expect(work?.stands).toBe(text[8]);
		expect(work?.sum).toBe((work?.quotient ?? 0) * 11 + (work?.rest ?? 0));
		expect(work?.places).toHaveLength(17);
	}
});

it('works nothing while a character is unread, never used or missing', () => {
	expect(checkDigitWork([...'1M8GDM9AXKP04278?'])).toBeNull();
	expect(checkDigitWork([...'1M8GDM9AXKPO42788'])).toBeNull();
	expect(checkDigitWork([...'1M8GDM9AXKP04278'])).toBeNull();
});
