import { LAYOUTS, LINED_LAYOUTS, type Layout, type LinedLayout } from '../../decoder';
import { MAKER_NAMES, type LayoutsAnswer, type TableName } from '../../types';

type Entry = LayoutsAnswer['items'][number];

/** The table that a field is looked up in; null where its characters stand for themselves. */
const tableOf = (reads: { by: string; table?: TableName }): TableName | null => reads.table ?? null;

const headOf = ({ id, title, maker, kind, years, source, examples }: Layout | LinedLayout) => ({
	id,
	title,
	maker: MAKER_NAMES[maker],
	maker_key: maker,
	kind,
	years_from: years[0],
	years_to: years[1],
	source,
	example: examples.good
});

const serialEntry = (layout: Layout): Entry => ({
	...headOf(layout),
	length: layout.length,
	order: null,
	lines: [],
	fields: layout.fields.map(({ name, label, from, to, reads }) => ({
		name,
		label,
		line: null,
		from,
		to,
		table: tableOf(reads)
	})),
	derived: layout.derived.map(({ name, label, parents, reads }) => ({
		name,
		label,
		derived_from: [...parents],
		table: tableOf(reads)
	}))
});

const linedEntry = (layout: LinedLayout): Entry => ({
	...headOf(layout),
	length: null,
	order: layout.order,
	lines: layout.lines.map(({ label, optional = false, repeats = false }) => ({
		label,
		optional,
		repeats
	})),
	fields: layout.lines.flatMap(({ fields }, line) =>
		fields.map(({ name, label, reads }) => ({
			name,
			label,
			line: line + 1,
			from: null,
			to: null,
			table: tableOf(reads)
		}))
	),
	derived: layout.lines
		.flatMap(({ fields }) => fields)
		.flatMap(({ name: parent, reads }) =>
			reads.by !== 'table'
				? []
				: (reads.also ?? []).map((also) => ({
						name: also.name,
						label: also.label,
						derived_from: [parent],
						table: also.by === 'table' ? also.table : null
					}))
		)
});

/** Every layout that readings try, as the interface gives it: serial numbers, then stamps of lines. */
export const LAYOUT_LIST: readonly Entry[] = [
	...LAYOUTS.map(serialEntry),
	...LINED_LAYOUTS.map(linedEntry)
];
