/** From the text of one CSV file to typed records with their line numbers. */
import { CsvError, parse } from 'csv-parse/sync';
import type { z } from 'zod';
import { ROOT_FILES } from './columns';
import type { Finding, Placed } from './finding';

/** An empty cell is "none"; several values stand with `|` between them. */
export const listOf = (cell: string): string[] => (cell === '' ? [] : cell.split('|'));
export const textOrNull = (cell: string): string | null => (cell === '' ? null : cell);
/** What is not written in plain figures stays text, so that the schema refuses it. */
export const numberOf = (cell: string): number | string | null =>
	cell === '' ? null : /^[0-9]+$/.test(cell) ? Number(cell) : cell;

/** The JSON of a `values` cell; a cell that is no JSON stays text, so that the schema refuses it. */
export function valuesOf(cell: string): unknown {
	try {
		return JSON.parse(cell);
	} catch (error) {
		if (error instanceof SyntaxError) return cell;
		throw error;
	}
}

type Cells<C extends readonly string[]> = Record<C[number], string>;

interface Numbered {
	readonly record: string[];
	readonly info: { readonly lines: number };
}

function recordsOf(text: string): Numbered[] {
	return parse(text, {
		info: true,
		record_delimiter: '\n',
		relax_column_count: true,
		skip_empty_lines: false
	}) as unknown as Numbered[];
}

const reason = (error: z.ZodError): string =>
	error.issues
		.map((issue) => `${issue.path.length === 0 ? '' : `${issue.path.join('.')}: `}${issue.message}`)
		.join('; ');

/**
 * Makes a reader of single files out of the texts of a folder.
 * Whatever does not have the shape of its file is added to `unreadable`.
 */
export function readRecords(files: ReadonlyMap<string, string>, unreadable: Finding[]) {
	for (const file of ROOT_FILES)
		if (!files.has(file)) unreadable.push({ file, line: 1, message: 'is missing' });

	return function read<C extends readonly string[], T>(
		file: string,
		columns: C,
		schema: z.ZodType<T>,
		shape: (cells: Cells<C>) => unknown = (cells) => cells
	): Placed<T>[] {
		const text = files.get(file);
		if (text === undefined) return [];
		const refuse = (line: number, message: string) => unreadable.push({ file, line, message });
		let records: Numbered[];
		try {
			records = recordsOf(text);
		} catch (error) {
			if (!(error instanceof CsvError)) throw error;
			refuse(Number((error as unknown as { lines?: number }).lines ?? 1), error.message);
			return [];
		}
		const header = records[0]?.record.join() ?? '';
		if (header !== columns.join()) {
			refuse(1, `columns are ${header}, expected ${columns.join()}`);
			return [];
		}
		const placed: Placed<T>[] = [];
		let line = 1 + (records[0]?.info.lines ?? 1);
		for (const { record, info } of records.slice(1)) {
			const first = line;
			line = info.lines + 1;
			if (record.length !== columns.length) {
				refuse(first, `has ${record.length} cells, expected ${columns.length}`);
				continue;
			}
			const cells = Object.fromEntries(
				columns.map((column, index) => [column, record[index]])
			) as Cells<C>;
			const result = schema.safeParse(shape(cells));
			if (result.success) placed.push({ value: result.data, file, line: first });
			else refuse(first, reason(result.error));
		}
		return placed;
	};
}
