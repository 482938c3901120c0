import type { AnsweredReading, ReadingField, RowValues } from '../types';

const ENGINE_WORDS: Readonly<Record<number, string>> = {
	3: 'three',
	4: 'four',
	5: 'five',
	6: 'six',
	8: 'V8',
	10: 'V10',
	12: 'V12'
};

/** What all values of a field agree on; undefined where they differ or nothing is told. */
function agreed(field: ReadingField | undefined, key: string): unknown {
	if (field === undefined) return undefined;
	const all: readonly RowValues[] =
		field.outcome === 'contested' ? field.alternatives.map(({ values }) => values) : [field.values];
	const [first, ...rest] = all.map((values) => values[key]);
	return rest.every((value) => value === first) ? first : undefined;
}

function fact(fields: readonly ReadingField[], key: string): string | undefined {
	for (const field of fields) {
		const value = agreed(field, key);
		if (typeof value === 'string') return value;
	}
	return undefined;
}

function engineInWords(fields: readonly ReadingField[]): string | undefined {
	const engine = fields.find((field) => field.name === 'engine');
	const displacement = agreed(engine, 'displacement_cuin');
	if (typeof displacement !== 'number') return undefined;
	const cylinders = agreed(engine, 'cylinders');
	const word = typeof cylinders === 'number' ? ENGINE_WORDS[cylinders] : undefined;
	return word === undefined ? String(displacement) : `${displacement} ${word}`;
}

const lowerFirst = (text: string): string => text.charAt(0).toLowerCase() + text.slice(1);

/**
 * A reading in one line: year, division (or corporation), series or line, body, engine; what is not told is left out.
 * Null when not even year or division is told.
 * @example '1970 Plymouth Road Runner two-door hardtop, 383 V8'
 */
export function readingTitle(reading: AnsweredReading): string | null {
	const { fields } = reading;
	const name = reading.division ?? reading.maker;
	const car = fact(fields, 'series') ?? fact(fields, 'line');
	const body = fact(fields, 'body_style');
	const words = [
		reading.model_year === null ? undefined : String(reading.model_year),
		name ?? undefined,
		car === undefined || name === null ? car : withoutPrefix(car, name),
		body === undefined ? undefined : lowerFirst(body)
	].filter((word) => word !== undefined && word !== '');
	if (words.length === 0) return null;
	const engine = engineInWords(fields);
	return engine === undefined ? words.join(' ') : `${words.join(' ')}, ${engine}`;
}

/** "Plymouth B-body" beside "Plymouth" says the division once. */
const withoutPrefix = (text: string, prefix: string): string =>
	text.startsWith(`${prefix} `) ? text.slice(prefix.length + 1) : text === prefix ? '' : text;
