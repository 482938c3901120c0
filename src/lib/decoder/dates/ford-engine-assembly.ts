/**
 * The date stamped or inked on an assembled Ford unit, in the form of the casting date, as 8D10.
 * Source: 428CobraJet.org, "Engine identification codes", and Ford Classics, "Casting and manufacturing date codes"; row
 * `ford-engine-assembly` of table `layout` cites all.
 */
import type { DateFormat } from './format';
import { dayNumberPart, monthLetters, yearFigure } from './parts';

export const fordEngineAssembly = {
	id: 'ford-engine-assembly',
	title: 'Ford assembly stamp: year, month letter, day',
	maker: 'ford',
	dates: 'unit_assembled',
	source: '428CobraJet.org, Engine identification codes',
	years: [1950, 1989],
	parts: [yearFigure(), monthLetters('ABCDEFGHJKLM'), dayNumberPart()],
	example: { text: '8D10', year: 1968, earliest: '1968-04-10', latest: '1968-04-10' }
} as const satisfies DateFormat;
