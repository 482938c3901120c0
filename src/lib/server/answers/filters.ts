import { interfaceText } from '../../text/en/interface';
import {
	ALL_DIVISIONS,
	FIRST_YEAR,
	LAST_YEAR,
	MAKERS,
	SOURCE_KINDS,
	TABLE_NAMES,
	type FieldError,
	type Maker,
	type SourceKind,
	type TableName
} from '../../types';
import { fault, invalid, malformed, notFound, type Parameters } from '../http';
import { divisionNamed, makerNamed } from '../readings';

/** Longest search, in characters. */
const LONGEST_SEARCH = 100;

/** What picks rows of a table. */
export interface RowFilter {
	readonly division?: string;
	readonly year?: number;
	readonly code?: string;
	readonly q?: string;
}

/**
 * Reads what picks rows of a table; forgiving about case and space.
 * @throws {Refusal} 422 naming everything that cannot be
 */
export function readRowFilter(asked: Parameters<'division' | 'year' | 'code' | 'q'>): RowFilter {
	const faults: FieldError[] = [];
	const named = asked.division === undefined ? undefined : divisionNamed(asked.division);
	if (named === null) {
		const message = interfaceText.invalid.division(asked.division ?? '');
		faults.push(fault('division', 'unknown_division', message, ALL_DIVISIONS));
	}
	const year = asked.year === undefined ? undefined : Number(asked.year);
	if (year !== undefined && !(Number.isInteger(year) && year >= FIRST_YEAR && year <= LAST_YEAR))
		faults.push(fault('year', 'year_out_of_range', interfaceText.invalid.year));
	const q = asked.q?.trim();
	if (q !== undefined && [...q].length > LONGEST_SEARCH)
		faults.push(fault('q', 'too_long', interfaceText.invalid.search(LONGEST_SEARCH)));
	if (faults.length > 0) throw invalid(...faults);
	return { division: named?.division, year, code: asked.code?.trim().toUpperCase(), q };
}

/**
 * The corporation that a list is of, from a query; a division stands for its corporation.
 * @throws {Refusal} 422 for a name that we do not know
 */
export function makerFilter(name: string | undefined): Maker | undefined {
	if (name === undefined) return undefined;
	const named = makerNamed(name);
	if (named !== null) return named.maker;
	throw invalid(fault('maker', 'unknown_maker', interfaceText.invalid.maker(name), MAKERS));
}

/** @throws {Refusal} 422 for a kind of source that there is not */
export function sourceKindFilter(kind: string | undefined): SourceKind | undefined {
	const word = kind?.trim().toLowerCase();
	const known = SOURCE_KINDS.find((one) => one === word);
	if (word === undefined || known !== undefined) return known;
	const message = interfaceText.malformed.choice('kind', SOURCE_KINDS);
	throw invalid(fault('kind', 'unknown_kind', message, SOURCE_KINDS));
}

/**
 * Corporation and table as an address names them.
 * @throws {Refusal} 404 naming what is known
 */
export function tableAsked(maker: string, table: string): { maker: Maker; table: TableName } {
	const key = makerNamed(maker);
	if (key === null || key.division !== undefined)
		throw notFound(fault('maker', 'unknown_maker', interfaceText.unknown.maker(maker), MAKERS));
	const word = table.toLowerCase().replaceAll('-', '_');
	const name = TABLE_NAMES.find((one) => one === word);
	if (name === undefined)
		throw notFound(
			fault('table', 'unknown_table', interfaceText.unknown.table(table), TABLE_NAMES)
		);
	return { maker: key.maker, table: name };
}

const FORMATS = ['json', 'csv'] as const;
/** @throws {Refusal} 400 for another format */
export function readFormat(format: string | undefined): (typeof FORMATS)[number] | undefined {
	const word = format?.trim().toLowerCase();
	const known = FORMATS.find((one) => one === word);
	if (word === undefined || known !== undefined) return known;
	const message = interfaceText.malformed.choice('format', FORMATS);
	throw malformed(fault('format', 'unknown_format', message, FORMATS));
}
