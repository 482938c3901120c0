/**
 * The date cast into General Motors iron: month letter A to L with I in its place, day, last figure of the year (two
 * figures were seen on blocks of Tonawanda, 1965), as A 12 9.
 * Source: National Nostalgic Nova, "Engine info 4: casting and date codes"; row `gm-casting` of table `layout` cites all.
 */
import type { DateFormat } from './format';
import { dayNumberPart, monthLetters, yearFigureOrTwo } from './parts';

export const gmCasting = {
	id: 'gm-casting',
	title: 'General Motors casting date: month letter, day, year',
	maker: 'gm',
	dates: 'cast',
	source: 'National Nostalgic Nova, Engine info 4: casting and date codes',
	years: [1955, 1989],
	parts: [monthLetters('ABCDEFGHIJKL'), dayNumberPart(), yearFigureOrTwo()],
	example: { text: 'A 24 9', year: 1969, earliest: '1969-01-24', latest: '1969-01-24' }
} as const satisfies DateFormat;
