/** The names of car lines, and the rows that set them. */
import type { CompiledRow, TableSet } from '../engine/table-set';
import { rowsNamed } from './check';

/** Tables whose rows set a line. */
const SETTING = ['line', 'series', 'body_serial'] as const;

/** Rows that set a line, by maker and name. */
export function linesOf(tables: TableSet): ReadonlyMap<string, readonly CompiledRow[]> {
	const lines = new Map<string, CompiledRow[]>();
	for (const row of SETTING.flatMap((table) => rowsNamed(tables, table))) {
		const { line } = row.values;
		if (typeof line !== 'string') continue;
		const key = lineKey(row.maker, line);
		lines.set(key, [...(lines.get(key) ?? []), row]);
	}
	return lines;
}

export const lineKey = (maker: string, name: string): string => `${maker}/${name}`;
