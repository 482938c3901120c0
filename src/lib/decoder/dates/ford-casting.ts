/**
 * The date cast into Ford iron: year figure, month letter without I, day, as 6 B 10. The decade comes from the part number.
 * Source: Ford Classics, "Casting and manufacturing date codes"; row `ford-casting` of table `layout` cites all.
 */
import type { DateFormat } from './format';
import { dayNumberPart, monthLetters, yearFigure } from './parts';

export const fordCasting = {
	id: 'ford-casting',
	title: 'Ford casting date: year, month letter, day',
	maker: 'ford',
	dates: 'cast',
	source: 'Ford Classics, Casting and manufacturing date codes',
	years: [1950, 1989],
	parts: [yearFigure(), monthLetters('ABCDEFGHJKLM'), dayNumberPart()],
	example: { text: '6 B 10', year: 1966, earliest: '1966-02-10', latest: '1966-02-10' }
} as const satisfies DateFormat;
