import type { CompiledRow, TableSet } from '../../decoder';
import type { Citation, Source } from '../../types';
import { UnknownSourceError } from './errors';

/** A source with the number of rows that cite it, for or against. */
export interface CountedSource extends Source {
	readonly cited_by: number;
}
export interface CitingRow {
	readonly row: CompiledRow;
	/** What the row takes from this source; more than one when it is cited in several places. */
	readonly citations: readonly Citation[];
}
export interface SourceWithRows {
	readonly source: CountedSource;
	/** By row key. */
	readonly rows: readonly CitingRow[];
	/** Sources that copy this one. */
	readonly repeated_by: readonly Source[];
}

/** Made once per edition, when first asked. */
const cited = new WeakMap<TableSet, ReadonlyMap<string, readonly CitingRow[]>>();

function citingRows(tables: TableSet): ReadonlyMap<string, readonly CitingRow[]> {
	let known = cited.get(tables);
	if (!known) {
		const bySource = new Map<string, CitingRow[]>();
		const rows = [...tables.rows.values()].sort((a, b) => (a.row_key < b.row_key ? -1 : 1));
		for (const row of rows)
			for (const key of new Set(row.citations.map(({ source }) => source))) {
				const citations = row.citations.filter(({ source }) => source === key);
				const list = bySource.get(key);
				if (list) list.push({ row, citations });
				else bySource.set(key, [{ row, citations }]);
			}
		cited.set(tables, (known = bySource));
	}
	return known;
}

const counted = (tables: TableSet, source: Source): CountedSource => ({
	...source,
	cited_by: citingRows(tables).get(source.key)?.length ?? 0
});

/** All sources of an edition by title. */
export const sourcesList = (tables: TableSet): CountedSource[] =>
	[...tables.sources.values()]
		.map((source) => counted(tables, source))
		.sort((a, b) => a.title.localeCompare(b.title, 'en') || (a.key < b.key ? -1 : 1));

/** One source with the rows that cite it. @throws {UnknownSourceError} */
export function sourceWithRows(tables: TableSet, key: string): SourceWithRows {
	const source = tables.sources.get(key);
	if (!source) throw new UnknownSourceError(key);
	return {
		source: counted(tables, source),
		rows: citingRows(tables).get(key) ?? [],
		repeated_by: [...tables.sources.values()].filter(({ repeats }) => repeats === key)
	};
}
