/** One bare code: a reading for each table where it stands. */
import {
	makerOf,
	tableDefinition,
	type FieldName,
	type Problem,
	type ReadContext,
	type Reading,
	type ReadingField,
	type TableName
} from '../types';
import { decoderText as text } from '../text/en/decoder';
import { isRead, type Characters } from './engine/characters';
import { answerAlone } from './engine/answer-alone';
import { contestedField, fieldOf, foundField, possibleOf, type FieldHead } from './engine/field';
import { entriesMatching, type Scope } from './engine/look-up';
import {
	rowsInYear,
	type CompiledRow,
	type CompiledTable,
	type TableSet
} from './engine/table-set';

/** The field that a bare code of a table would be, in the order in which tables answer. */
const FIELD_OF: Partial<Record<TableName, FieldName>> = {
	paint: 'paint',
	trim: 'trim',
	roof: 'roof',
	axle: 'axle',
	option: 'option',
	unit_code: 'unit_code',
	engine_tag: 'unit_code',
	casting_number: 'casting_number',
	part_number: 'casting_number',
	sales_district: 'sales_district',
	transmission: 'transmission',
	engine: 'engine',
	assembly_plant: 'assembly_plant',
	plant_abbreviation: 'assembly_plant',
	series: 'series',
	body_serial: 'series',
	line: 'line',
	price_class: 'price_class',
	body_style: 'body_style',
	style_number: 'body_style',
	body_code: 'body_style',
	stripe: 'option',
	wmi: 'wmi'
};
const ORDER = Object.keys(FIELD_OF) as TableName[];
/** At most so many readings come back; the rest is counted. */
const MOST = 24;

function readField(
	head: FieldHead,
	characters: Characters,
	rows: readonly CompiledRow[],
	scope: Scope
): ReadingField | null {
	const { cells, normalised } = characters;
	if (!cells.every(isRead))
		return fieldOf(head, {
			code: normalised,
			outcome: 'illegible',
			detail: text.fields.unread(cells),
			possible: possibleOf(rows)
		});
	const answer = answerAlone(rows, scope);
	switch (answer.kind) {
		case 'found':
			return foundField(head, normalised, answer.rows);
		case 'contested':
			return contestedField(head, normalised, answer.groups);
		case 'depends':
			return fieldOf(head, {
				code: normalised,
				outcome: 'found',
				meaning: text.code.depends,
				detail: text.code.narrowedBy,
				rows: answer.rows.map((row) => row.row_key),
				possible: possibleOf(answer.rows)
			});
		case 'missing':
			return null;
	}
}

function readIn(
	table: CompiledTable,
	name: FieldName,
	characters: Characters,
	context: ReadContext,
	lookups: boolean
): Omit<Reading, 'rank'> | null {
	const scope: Scope = { year: context.year ?? null };
	if (context.division !== undefined) scope.division = context.division;
	if (context.plant !== undefined) scope.plant = context.plant.toUpperCase();
	const rows = entriesMatching(table, characters.cells).flatMap((entry) =>
		rowsInYear(entry, scope.year)
	);
	if (rows.length === 0) return null;
	const { label } = tableDefinition(table.table);
	const head: FieldHead = { name, label, from: 1, to: characters.cells.length };
	const field = readField(head, characters, rows, scope);
	if (field === null) return null;
	const asked = rows.map((row) => ({ table: row.table, code: row.code, row_key: row.row_key }));
	const divisions = [...new Set(rows.flatMap((row) => row.division))];
	return {
		layout: null,
		layout_title: label,
		maker: table.maker,
		division: divisions.length === 1 ? (divisions[0] as string) : null,
		model_year: scope.year,
		state: 'complete',
		why: text.why.table(label),
		fields: [lookups ? { ...field, lookups: asked } : field]
	};
}

/** Reads a bare code. Context narrows it; nothing is guessed where it does not. */
export function readCode(
	characters: Characters,
	tables: TableSet,
	context: ReadContext,
	lookups: boolean
): { readonly readings: Reading[]; readonly more: number; readonly problems: Problem[] } {
	const maker =
		context.maker ?? (context.division === undefined ? undefined : makerOf(context.division));
	const found: Omit<Reading, 'rank'>[] = [];
	for (const name of ORDER) {
		const field = FIELD_OF[name] as FieldName;
		if (context.field !== undefined && context.field !== field) continue;
		for (const table of tables.tables.values()) {
			if (table.table !== name || (maker !== undefined && table.maker !== maker)) continue;
			const reading = readIn(table, field, characters, context, lookups);
			if (reading !== null) found.push(reading);
		}
	}
	const readings = found.slice(0, MOST).map((reading) => ({ ...reading, rank: 1 }));
	const problems: Problem[] =
		found.length > 0
			? []
			: [
					{
						code: 'not_in_tables',
						message: text.problems.notInTables(characters.normalised),
						offers: []
					}
				];
	return { readings, more: found.length - readings.length, problems };
}
