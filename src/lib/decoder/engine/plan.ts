/** A layout made ready for reading: everything about it that does not depend on a text, worked out once. */
import { tableDefinition, type FieldName, type ScopeColumn, type TableName } from '../../types';
import { derivedHead } from './derived-field';
import type { FieldHead } from './field';
import type { DerivedField, FieldReads, Layout, PrimaryField, Span } from './layout';
import { tableId } from './table-set';

/** Scope columns that a field's own characters give. */
export type CodeColumn = Extract<ScopeColumn, 'body' | 'engine' | 'plant'>;

/** What a field asks a table, worked out. */
export interface Question {
	readonly table: TableName;
	/** Key of the compiled table. */
	readonly id: string;
	readonly range: boolean;
	readonly parts: readonly Span[];
	/** Places to ask with when the first find no row. */
	readonly otherwise: readonly Span[] | null;
}

export interface PreparedLayout {
	readonly layout: Layout;
	/** For each place, the characters allowed. */
	readonly allowed: readonly string[];
	/** For each place, by character code: 1 where allowed. */
	readonly masks: readonly Uint8Array[];
	/** Indexes of the primary fields in the order in which they are asked: what others depend on comes first. */
	readonly order: readonly number[];
	/** Indexes of the fields that turn on the running number or on the whole of it. */
	readonly open: readonly number[];
	/** The places of all other fields. */
	readonly settling: readonly Span[];
	/** For each primary field, what it asks; null when it asks no table. */
	readonly questions: readonly (Question | null)[];
	/** The primary field that names the division. */
	readonly division: number;
	/** The fields that give a scope column by their characters. */
	readonly codeColumns: readonly { readonly column: CodeColumn; readonly field: PrimaryField }[];
	/** For each primary field, the derived fields that follow it. */
	readonly derived: readonly (readonly {
		readonly field: DerivedField;
		readonly head: FieldHead;
		readonly question: Question | null;
	}[])[];
	/** Keys of the compiled tables that calculated fields ask. */
	readonly ids: { readonly layout: string; readonly sequence: string; readonly year: string };
	/** The field that tells each scope column, for saying on what a meaning depends. */
	readonly parents: ReadonlyMap<string, PrimaryField>;
}

const CODE_COLUMNS: Partial<Record<FieldName, CodeColumn>> = {
	body_style: 'body',
	engine: 'engine',
	assembly_plant: 'plant'
};

function allowedIn(layout: Layout): string[] {
	const allowed: string[] = [];
	for (const { from, to, chars } of layout.fields)
		for (let place = from; place <= to; place += 1)
			allowed[place - 1] = typeof chars === 'string' ? chars : (chars[place - from] as string);
	return allowed;
}

const maskOf = (set: string): Uint8Array => {
	const mask = new Uint8Array(128);
	for (const character of set) mask[character.charCodeAt(0)] = 1;
	return mask;
};

/** The spans between fields, in the order of their places. */
function between(fields: readonly PrimaryField[], length: number): Span[] {
	const starts = [1, ...fields.map(({ to }) => to + 1)];
	const ends = [...fields.map(({ from }) => from - 1), length];
	return starts
		.map((start, index): Span => [start, ends[index] as number])
		.filter(([start, end]) => start <= end);
}

function questionOf(
	{ maker }: Layout,
	reads: FieldReads | DerivedField['reads'],
	own: readonly Span[]
): Question | null {
	if (reads.by !== 'table') return null;
	const { table, parts = own, otherwise = null } = reads;
	const range = tableDefinition(table).match === 'range';
	return { table, id: tableId(maker, table), range, parts, otherwise };
}

/**
 * Works a layout out.
 * @throws RangeError when the field that is to name division or line is not among its fields
 */
export function prepare(layout: Layout): PreparedLayout {
	const { fields, lookFirst = [] } = layout;
	const indexOf = (name: FieldName): number => {
		const index = fields.findIndex((field) => field.name === name);
		if (index < 0) throw new RangeError(`${layout.id} has no field ${name}`);
		return index;
	};
	const allowed = allowedIn(layout);
	const codeColumns = fields.flatMap((field) => {
		const column = CODE_COLUMNS[field.name];
		return column === undefined ? [] : [{ column, field }];
	});
	const division = indexOf(layout.divisionFrom);
	const parents = new Map<string, PrimaryField>([
		['division', fields[division] as PrimaryField],
		['line', fields[indexOf(layout.lineFrom)] as PrimaryField],
		...codeColumns.map(({ column, field }): [string, PrimaryField] => [column, field])
	]);
	const early = lookFirst.map(indexOf);
	const isOpen = ({ reads }: PrimaryField): boolean =>
		reads.by === 'sequence' || reads.by === 'check_digit';
	return {
		layout,
		allowed,
		masks: allowed.map(maskOf),
		order: [...early, ...fields.keys()].filter((index, at, all) => all.indexOf(index) === at),
		open: [...fields.keys()].filter((index) => isOpen(fields[index] as PrimaryField)),
		settling: between(fields.filter(isOpen), layout.length),
		questions: fields.map((field) => questionOf(layout, field.reads, [[field.from, field.to]])),
		division,
		codeColumns,
		derived: fields.map((primary) =>
			layout.derived
				.filter((field) => field.parents[field.parents.length - 1] === primary.name)
				.map((field) => ({
					field,
					head: derivedHead(field, fields),
					question: questionOf(layout, field.reads, [])
				}))
		),
		ids: {
			layout: tableId(layout.maker, 'layout'),
			sequence: tableId(layout.maker, 'sequence'),
			year: tableId(layout.maker, 'model_year')
		},
		parents
	};
}
