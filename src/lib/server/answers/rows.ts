import type { CompiledRow, CompiledTable, TableSet } from '../../decoder';
import {
	MAKER_NAMES,
	tableDefinition,
	type ItemsAnswer,
	type ReferenceRow,
	type RowAnswer,
	type RowDetail,
	type TablesAnswer
} from '../../types';

/** What a row says, with its maker by name and key. */
export const contentAnswer = (row: ReferenceRow) => ({
	row_key: row.row_key,
	maker: MAKER_NAMES[row.maker],
	maker_key: row.maker,
	table: row.table,
	division: [...row.division],
	line: [...row.line],
	body: [...row.body],
	engine: [...row.engine],
	plant: [...row.plant],
	market: [...row.market],
	years_from: row.years_from,
	years_to: row.years_to,
	code: row.code,
	meaning: row.meaning,
	values: row.values,
	note: row.note
});

/** A row as the interface gives it: nothing of how it is compiled. */
export const rowAnswer = (row: CompiledRow): RowAnswer => ({
	...contentAnswer(row),
	strength: row.strength,
	strength_why: row.strength_why,
	sources: [...row.sources],
	contested_by: [...row.contested_by]
});

/** What a row rests on, each work by its title. */
export const citationsOf = (row: CompiledRow, { sources }: TableSet): RowDetail['citations'] =>
	row.citations.flatMap(({ source, stance, read, locator, quotation, seen_on }) => {
		const work = sources.get(source);
		if (work === undefined) return [];
		const { title, kind } = work;
		return [{ source, title, kind, stance, read, locator, quotation, seen_on }];
	});

/** What names a table, on its page and in lists. */
export const tableHead = ({ maker, table }: Pick<CompiledTable, 'maker' | 'table'>) => {
	const { label, about } = tableDefinition(table);
	return { maker: MAKER_NAMES[maker], maker_key: maker, table, label, about };
};

/** A table in a list of tables. */
export const tableEntry = (table: CompiledTable): TablesAnswer['items'][number] => ({
	...tableHead(table),
	rows: table.rows.length
});

/** A row of table `item`, whose values hold where it sits and how easily it is added later. */
export const itemEntry = (row: CompiledRow): ItemsAnswer['items'][number] => {
	const { place, added_later, look_for } = row.values as ItemsAnswer['items'][number];
	return {
		row_key: row.row_key,
		maker: MAKER_NAMES[row.maker],
		maker_key: row.maker,
		division: [...row.division],
		years_from: row.years_from,
		years_to: row.years_to,
		item: row.code,
		meaning: row.meaning,
		place,
		added_later,
		...(look_for !== undefined && { look_for }),
		strength: row.strength
	};
};
