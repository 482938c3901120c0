/** Every format against every day of a year and of a leap year: what a test writes is what the reader reads. */
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { calendarDay, dayNumber, dayOfYear, daysInYear, isoDay } from './days';
import type { DateFormat, DatePart } from './format';
import { DATE_FORMATS } from './index';
import { readIn } from './read-date';

/** What a part would be stamped as on a day; several codes where a part can be written in more than one way. */
function codesOf(part: DatePart, format: DateFormat, number: number): string[] {
	const { year, month, day } = calendarDay(number);
	const nth = number - dayOfYear(year, 0);
	const wanted: Record<DatePart['name'], (value: number) => boolean> = {
		month: (value) => (value - 1) % 12 === month - 1,
		day: (value) => value === day,
		year: (value) => value === year,
		model_year: (value) => value === modelYear(number),
		week: (value) => value === Math.min(5, Math.ceil(day / 7)),
		week_of_year: (value) => value === Math.ceil(nth / 7),
		day_of_year: (value) => value === nth,
		day_of_run: (value) => dayOfYear(modelYear(number) - 1, value) === number,
		day_count: (value) => (format.dayZero ?? 0) + value === number,
		other: () => true
	};
	const codes = [...part.codes].flatMap(([code, values]) =>
		values.some(wanted[part.name]) ? [code] : []
	);
	return part.name === 'other' ? codes.slice(0, 1) : codes;
}

/** Model years that begin in August. */
function modelYear(number: number): number {
	const { year, month } = calendarDay(number);
	return month >= 8 ? year + 1 : year;
}

function textsOf(format: DateFormat, number: number): string[] {
	return format.parts
		.map((part) => codesOf(part, format, number))
		.reduce<string[]>(
			(texts, codes) =>
				texts.flatMap((text) =>
					codes.map((code) => (text === '' || code === '' ? text + code : `${text} ${code}`))
				),
			['']
		);
}

const YEARS: Partial<Record<string, readonly number[]>> = {
	'gm-gearbox-month-day': [1964, 1965],
	'muncie-month-day': [1964, 1965],
	'chrysler-punched': [1967, 1964],
	'rochester-month-year': [1964, 1965]
};

describe.each(DATE_FORMATS)('$id', (format) => {
	it.each(YEARS[format.id] ?? [1968, 1969])('reads every day of %i', (year) => {
		for (let n = 1; n <= daysInYear(year); n += 1) {
			const number = dayOfYear(year, n);
			const iso = isoDay(number);
			const texts = textsOf(format, number);
			expect(texts.length).toBeGreaterThan(0);
			const hit = texts.map((text) => {
				const { meanings } = readIn(format, text, { year: modelYear(number) });
				return meanings.some(
					({ earliest, latest }) => (earliest ?? '') <= iso && iso <= (latest ?? '')
				);
			});
			// A second set of month letters stands for another year.
			if (format.id === 'corvette-body-month-day' || format.id === 'ford-plate')
				expect(hit).toContain(true);
			else expect(hit).not.toContain(false);
		}
	});

	it('says of a letter left out that it was left out', () => {
		for (const part of format.parts)
			for (const letter of part.skipped) {
				const text = format.parts
					.map((own) => (own === part ? letter : ([...own.codes.keys()][0] ?? '')))
					.join(' ');
				expect(readIn(format, text, {}).fault?.code).toBe('skipped_letter');
			}
	});
});

describe('all formats', () => {
	const anyFormat = fc.constantFrom(...DATE_FORMATS);
	const context = fc.record({ year: fc.integer({ min: 1955, max: 2039 }) }, { requiredKeys: [] });

	it('take any text without throwing, and say why there is no meaning', () => {
		const text = fc.oneof(
			fc.string({ unit: 'binary', maxLength: 14 }),
			fc.string({ unit: fc.constantFrom(...'0123456789ABCDEFGHIJKLMNP?[38] -/.'), maxLength: 9 })
		);
		fc.assert(
			fc.property(anyFormat, text, context, (format, typed, known) => {
				const { meanings, fault } = readIn(format, typed, known);
				expect(meanings.length > 0).toBe(fault === null);
				expect(meanings.length).toBeLessThanOrEqual(24);
				for (const { earliest, latest, year } of meanings) {
					expect(earliest === null).toBe(latest === null);
					if (earliest === null || latest === null) continue;
					expect(earliest <= latest).toBe(true);
					expect(earliest.slice(0, 4)).toBe(String(year));
				}
			}),
			{ numRuns: 2000 }
		);
	});

	it('lose no meaning when a character becomes unread', () => {
		fc.assert(
			fc.property(
				anyFormat,
				fc.integer({ min: dayNumber(1964, 1, 1), max: dayNumber(1974, 12, 31) }),
				fc.nat(),
				fc.nat(),
				(format, number, which, at) => {
					const [first, last] = format.years;
					const { year } = calendarDay(number);
					if (year < first || year > last) return;
					const texts = textsOf(format, number);
					const text = texts[which % Math.max(1, texts.length)] ?? '';
					const place = at % Math.max(1, text.length);
					if (!/[A-Z0-9]/.test(text.charAt(place))) return;
					const marked = `${text.slice(0, place)}?${text.slice(place + 1)}`;
					const known = { year: modelYear(number) };
					const read = readIn(format, text, known);
					const wider = readIn(format, marked, known);
					if (wider.fault?.code === 'too_open' || read.fault !== null) return;
					for (const { earliest, latest } of read.meanings)
						expect(
							wider.meanings.some(
								(other) =>
									(other.earliest ?? '') <= (earliest ?? '') &&
									(latest ?? '') <= (other.latest ?? '')
							)
						).toBe(true);
				}
			),
			{ numRuns: 2000 }
		);
	});
});
