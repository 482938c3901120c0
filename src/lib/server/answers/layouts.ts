import { LAYOUTS, type Layout } from '../../decoder';
import { MAKER_NAMES, type LayoutsAnswer } from '../../types';

type Entry = LayoutsAnswer['items'][number];

const entryOf = (layout: Layout): Entry => ({
	id: layout.id,
	title: layout.title,
	maker: MAKER_NAMES[layout.maker],
	maker_key: layout.maker,
	kind: layout.kind,
	years_from: layout.years[0],
	years_to: layout.years[1],
	length: layout.length,
	source: layout.source,
	example: layout.examples.good,
	fields: layout.fields.map(({ name, label, from, to, reads }) => ({
		name,
		label,
		from,
		to,
		table: reads.by === 'table' ? reads.table : null
	})),
	derived: layout.derived.map(({ name, label, parents, reads }) => ({
		name,
		label,
		derived_from: [...parents],
		table: reads.by === 'table' ? reads.table : null
	}))
});

/** Every layout that readings try, as the interface gives it. */
export const LAYOUT_LIST: readonly Entry[] = LAYOUTS.map(entryOf);
