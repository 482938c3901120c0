/** Fields that the layout or arithmetic tells: model year, running number, check digit. */
import type { Possible } from '../../types';
import { decoderText as text } from '../../text/en/decoder';
import { isRead, textOf, type Cell } from './characters';
import { checkDigitOf, isNorthAmerican, narrowByCheckDigit } from './check-digit';
import {
	fieldOf,
	foundField,
	keepTold,
	toldBefore,
	type FieldHead,
	type FieldResult
} from './field';
import type { Layout } from './layout';
import { lookUp, lookUpByScope } from './look-up';
import type { Reader } from './table-field';
import type { CompiledRow } from './table-set';

/** Rows of table `layout` that say how a number is built: what its fixed fields rest on. */
export function layoutRows(reader: Reader, layout: Layout): readonly CompiledRow[] {
	const table = reader.tables.tables.get(reader.prepared.ids.layout);
	return table?.byCode.get(layout.id)?.all ?? [];
}

/** The model year: the layout's rule, with the row that says so where there is one. */
export function yearField(head: FieldHead, layout: Layout, reader: Reader): FieldResult {
	const cells = reader.cells.slice(head.from - 1, head.to);
	const code = textOf(cells);
	const { year } = reader.scope;
	const yearPossible = (years: readonly number[]): Possible[] =>
		years.map((other) => ({ meaning: String(other), values: { model_year: other } }));
	const done = (field: FieldResult['field'], rows: readonly CompiledRow[] = []): FieldResult => ({
		field,
		rows,
		counts: false,
		table: 'model_year'
	});
	if (!cells.every(isRead)) {
		if (head.from > reader.typed)
			return done(fieldOf(head, { code, outcome: 'illegible', detail: text.fields.notTyped }));
		const candidates = layout.yearsOf(reader.cells).filter((other) => other !== null);
		const possible = yearPossible(candidates);
		return done(fieldOf(head, { code, outcome: 'illegible', detail: text.year.unread, possible }));
	}
	const table = reader.tables.tables.get(reader.prepared.ids.year);
	if (year === null) {
		const rows = table?.byCode.get(code)?.all ?? [];
		const years = [...new Set(rows.map((row) => Number(row.values.model_year)))];
		return done(
			fieldOf(head, {
				code,
				outcome: 'not_listed',
				detail: text.year.openWhy,
				possible: yearPossible(years)
			})
		);
	}
	const answer = lookUp(table, code, reader.scope);
	const rows = answer.kind === 'found' ? answer.rows : layoutRows(reader, layout);
	const [row] = rows;
	const once = row !== undefined && answer.kind === 'found' && layout.yearDetail === undefined;
	const before = once ? toldBefore(row, head) : undefined;
	if (before !== undefined) return before;
	const result = tellYear(head, code, year, rows, layout, reader);
	return once ? keepTold(row, head, result) : result;
}

function tellYear(
	head: FieldHead,
	code: string,
	year: number,
	rows: readonly CompiledRow[],
	layout: Layout,
	reader: Reader
): FieldResult {
	const shown = {
		meaning: String(year),
		values: { model_year: year },
		detail: layout.yearDetail?.(reader.cells) ?? text.year.byLayout
	};
	const field =
		rows.length > 0
			? foundField(head, code, rows, shown)
			: fieldOf(head, {
					code,
					outcome: 'found',
					...shown,
					strength: 'not_rated',
					strength_why: text.layoutStrength
				});
	return { field, rows, counts: false, table: 'model_year' };
}

/** The running number, held against first and last numbers where rows give them. */
export function sequenceField(head: FieldHead, layout: Layout, reader: Reader): FieldResult {
	const cells = reader.cells.slice(head.from - 1, head.to);
	const code = reader.text?.slice(head.from - 1, head.to) ?? textOf(cells);
	if (reader.text === null && !cells.every(isRead)) {
		const detail = head.from > reader.typed ? text.fields.notTyped : text.fields.unread(cells);
		return {
			field: fieldOf(head, { code, outcome: 'illegible', detail }),
			rows: [],
			counts: false,
			table: null
		};
	}
	const table = reader.tables.tables.get(reader.prepared.ids.sequence);
	const answer = lookUpByScope(table, reader.scope);
	const known = answer.kind === 'found' ? answer.rows : [];
	const run = known[0]?.values ?? {};
	const first = typeof run.first_sequence === 'number' ? run.first_sequence : null;
	const last = typeof run.last_sequence === 'number' ? run.last_sequence : null;
	const number = Number(code);
	const below = first !== null && number < first;
	const above = last !== null && number > last;
	const inside = (first !== null || last !== null) && !below && !above;
	let detail: string = text.sequence.noRow;
	if (below) detail = text.sequence.below(first);
	else if (above) detail = text.sequence.above(last);
	else if (first !== null) detail = text.sequence.inRun(first, number - first + 1);
	const rows = known.length > 0 ? known : layoutRows(reader, layout);
	const shown = { meaning: code, values: {}, detail };
	const field =
		rows.length > 0
			? foundField(head, code, rows, shown)
			: fieldOf(head, {
					code,
					outcome: 'found',
					...shown,
					strength: 'not_rated',
					strength_why: text.layoutStrength
				});
	return { field, rows: known, counts: inside, outOfRun: below || above, table: 'sequence' };
}

/** The check digit: worked out, and what may and may not be concluded. */
export function checkField(head: FieldHead, layout: Layout, reader: Reader): FieldResult {
	const { cells } = reader;
	const digit = cells[head.from - 1] as string;
	const rows = layoutRows(reader, layout);
	const best = rows[0];
	const strength = {
		strength: best?.strength ?? ('not_rated' as const),
		strength_why: best?.strength_why ?? text.layoutStrength,
		rows: rows.map((row) => row.row_key),
		sources: best?.sources ?? []
	};
	const result = (field: FieldResult['field'], counts: boolean): FieldResult => ({
		field,
		rows: [],
		counts,
		table: null
	});
	const expected = checkDigitOf(cells);
	if (!isRead(digit)) {
		const detail = head.from > reader.typed ? text.fields.notTyped : text.fields.unread([digit]);
		const possible =
			expected === null
				? []
				: [{ code: expected, meaning: text.check.calledFor(expected), values: {} }];
		return result(fieldOf(head, { code: digit, outcome: 'illegible', detail, possible }), false);
	}
	if (!/[0-9X]/.test(digit))
		return result(
			fieldOf(head, { code: digit, outcome: 'not_listed', detail: text.check.notDigit }),
			false
		);
	if (expected === null) {
		const narrowed = [...narrowByCheckDigit(cells)].map(([place, set]) =>
			text.check.narrowed(place, set)
		);
		const detail = [text.check.cannot, ...narrowed].join(' ');
		return result(fieldOf(head, { code: digit, outcome: 'illegible', detail }), false);
	}
	const fits = expected === digit;
	const northAmerica = isNorthAmerican(cells[0] as Cell);
	const failWhy = northAmerica ? text.check.failNorthAmerica : text.check.failElsewhere;
	return result(
		fieldOf(head, {
			code: digit,
			outcome: 'found',
			meaning: fits ? text.check.fits(digit) : text.check.fails(digit, expected),
			detail: fits ? text.check.passWhy : failWhy,
			values: { check_digit_expected: expected, check_digit_fits: fits },
			...strength
		}),
		fits
	);
}
