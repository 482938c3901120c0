/** What a loose part is and when it was made, out of the readings of its number and its date. */
import { rowAddress } from '$lib/format/addresses';
import { scopeWords } from '$lib/format/scope';
import { stampCells } from '$lib/format/stamp';
import { yearSpan } from '$lib/format/years';
import { markOf, type LineMark } from '$lib/format/strength-line';
import type { CompiledRow } from '$lib/decoder';
import { partText as text } from '$lib/text/en/part';
import { tableDefinition, type AnsweredReading, type ReadingField } from '$lib/types';

/** One row that names the part, or something of it. */
export interface PartFact {
	readonly key: string;
	readonly label: string;
	readonly cells: readonly string[];
	readonly meaning: string;
	readonly note: string;
	/** "Chevrolet; Camaro, 1967–69"; empty where the row does not say. */
	readonly fits: string;
	readonly mark: LineMark;
	readonly sources: readonly string[];
	readonly address: string;
}
/** One way to read the number: all that it tells under one form. */
export interface PartWhat {
	readonly title: string;
	readonly facts: readonly PartFact[];
}
/** A day or days that a date can mean. */
export interface PartDay {
	readonly words: string;
	/** Whether the years of the number allow it; null where there are none to hold it against. */
	readonly allowed: boolean | null;
}
/** One form that fits the date. */
export interface PartWhen {
	readonly key: string;
	readonly form: string;
	/** "Cast", "Assembled". */
	readonly label: string;
	readonly cells: readonly string[];
	readonly days: readonly PartDay[];
	readonly mark: LineMark;
	/** What the number's years settle; empty for nothing. */
	readonly settled: string;
}
export type Span = readonly [from: number, to: number];

/** A part is cast before the car's model year begins, at most this many years. */
const AHEAD = 1;
const isDate = ({ name, values }: ReadingField): boolean =>
	/_date$/.test(name) || values['earliest'] !== undefined;

/** Fields that came to a row, dates aside. */
const told = ({ fields }: AnsweredReading): readonly ReadingField[] =>
	fields.filter((field) => field.rows.length > 0 && !isDate(field));

function factsOf(field: ReadingField, rowOf: (key: string) => CompiledRow | undefined): PartFact[] {
	return field.rows.flatMap((key) => {
		const row = rowOf(key);
		if (row === undefined) return [];
		return [
			{
				key,
				label: `${field.label}: ${tableDefinition(row.table).label.toLowerCase()}`,
				cells: stampCells(field.code),
				meaning: row.meaning,
				note: row.note,
				fits: [scopeWords(row), yearSpan(row.years_from, row.years_to)].filter(Boolean).join(', '),
				mark: row.strength,
				sources: [...new Set(row.sources.map(({ title }) => title))],
				address: rowAddress(key)
			}
		];
	});
}

/** What the readings of a number tell, each row once, the reading that says most first. */
export function whatOf(
	readings: readonly AnsweredReading[],
	rowOf: (key: string) => CompiledRow | undefined
): PartWhat[] {
	const seen = new Set<string>();
	return readings.flatMap((reading) => {
		const facts = told(reading)
			.flatMap((field) => factsOf(field, rowOf))
			.filter(({ key }) => !seen.has(key));
		for (const { key } of facts) seen.add(key);
		return facts.length === 0 ? [] : [{ title: reading.layout_title, facts }];
	});
}

/** Model years of the rows that name the part itself. */
export function spansOf(rows: readonly CompiledRow[]): Span[] {
	return rows.flatMap(({ table, years_from, years_to }) =>
		table === 'casting_number' && years_from !== null && years_to !== null
			? [[years_from, years_to] as const]
			: []
	);
}

/** Whether a part of these model years can have been made on a day; null where no years are known. */
export function allowed(earliest: string | undefined, spans: readonly Span[]): boolean | null {
	if (spans.length === 0 || earliest === undefined) return null;
	const year = Number(earliest.slice(0, 4));
	return spans.some(([from, to]) => year >= from - AHEAD && year <= to);
}

const dayOf = (values: ReadingField['values']): string | undefined =>
	typeof values['earliest'] === 'string' ? values['earliest'] : undefined;

/** What the readings of a date tell, each form once, held against the number's years. */
export function whenOf(readings: readonly AnsweredReading[], spans: readonly Span[]): PartWhen[] {
	const forms = new Map<string, PartWhen>();
	for (const reading of readings)
		for (const field of reading.fields) {
			if (!isDate(field) || field.outcome !== 'found') continue;
			const form = String(field.values['format'] ?? reading.layout ?? field.name);
			if (forms.has(form)) continue;
			const all =
				field.possible.length > 0
					? field.possible.map(({ meaning, values }) => ({ words: meaning, day: dayOf(values) }))
					: [{ words: field.meaning ?? field.code, day: dayOf(field.values) }];
			const days = all.map(({ words, day }) => ({ words, allowed: allowed(day, spans) }));
			const left = days.filter((day) => day.allowed === true);
			const isOpen = days.length > 1;
			forms.set(form, {
				key: form,
				form: reading.layout_title,
				label: field.label,
				cells: stampCells(field.code),
				days,
				mark: markOf(field),
				settled:
					spans.length === 0
						? isOpen
							? text.when.open
							: ''
						: left.length === 0
							? text.when.none
							: isOpen && left.length === 1
								? text.when.one(left[0]?.words ?? '')
								: ''
			});
		}
	return [...forms.values()];
}
