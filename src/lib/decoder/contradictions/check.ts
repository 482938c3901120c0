/** What every check over the tables has in common. */
import { FIRST_YEAR, LAST_YEAR, type Contradiction, type ReferenceRow } from '../../types';
import type { CompiledRow, TableSet } from '../engine/table-set';

/** What a check finds: `sources` are those that are asked about themselves; check, rows and sources tell hits apart. */
export type Hit = Pick<Contradiction, 'check' | 'rows' | 'sources' | 'message'>;

/** Finds what one question is asked of. Pure; says the same of the same rows, in whatever order they come. */
export type Check = (tables: TableSet) => Hit[];

/** First and last model year of a row; all years where it names none. */
export const spanOf = ({
	years_from,
	years_to
}: Pick<ReferenceRow, 'years_from' | 'years_to'>): readonly [from: number, to: number] => [
	years_from ?? FIRST_YEAR,
	years_to ?? LAST_YEAR
];

type Years = Pick<ReferenceRow, 'years_from' | 'years_to'>;

/** Whether two rows hold in a model year in common. */
export function yearsMeet(a: Years, b: Years): boolean {
	const [from, to] = spanOf(a);
	const [otherFrom, otherTo] = spanOf(b);
	return from <= otherTo && otherFrom <= to;
}

/** Whether two scope cells leave a value to both: an open one leaves every value. */
export const cellsMeet = (a: readonly string[], b: readonly string[]): boolean =>
	a.length === 0 || b.length === 0 || a.some((value) => b.includes(value));

/** Rows of every maker's table of a name. */
export const rowsNamed = (tables: TableSet, name: string): CompiledRow[] =>
	[...tables.tables.values()].filter(({ table }) => table === name).flatMap(({ rows }) => rows);

/** Every pair of a list, each once. */
export const pairsOf = <T>(list: readonly T[]): (readonly [T, T])[] =>
	list.flatMap((one, index) => list.slice(index + 1).map((other) => [one, other] as const));
