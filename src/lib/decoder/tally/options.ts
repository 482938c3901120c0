/** The values that a field allows, and the attributes that they tell. */
import type { FieldName, ReadingField, RowValues, StampKind } from '../../types';
import type { CompiledRow, TableSet } from '../engine/table-set';
import { FACTS_OF, type FactAttribute } from './facts';

/** One value that a statement allows. */
export interface Option {
	readonly meaning: string;
	readonly facts: RowValues;
	/** Rows that say so: the firm and fair ones alone where there are any. */
	readonly rows: readonly CompiledRow[];
	/** Whether a firm or fair row says so. */
	readonly supported: boolean;
}

/** Why a statement has no value, or not only those listed. */
export type Gap = 'none' | 'not_listed' | 'not_used' | 'illegible' | 'contested' | 'undecided';

/** Fields whose facts are of the engine they stand on; other castings fit several engines. */
const ENGINE_PARTS = ['block', 'engine'];

const good = ({ strength }: CompiledRow): boolean => strength === 'firm' || strength === 'fair';

/** An option with what it rests on. */
export function optionOf(
	meaning: string,
	facts: RowValues,
	keys: readonly string[],
	tables: TableSet
): Option {
	const rows = keys.flatMap((key) => tables.rows.get(key) ?? []);
	const supported = rows.filter(good);
	return {
		meaning,
		facts,
		rows: supported.length > 0 ? supported : rows,
		supported: supported.length > 0
	};
}

/** Whether a field leaves something open. */
export function gapOf({ outcome, possible }: ReadingField): Gap {
	switch (outcome) {
		case 'found':
			return possible.length > 0 ? 'undecided' : 'none';
		case 'contested':
		case 'illegible':
		case 'not_listed':
		case 'not_used':
			return outcome;
	}
}

/** Every value that a field allows. */
export function optionsOf(field: ReadingField, tables: TableSet): Option[] {
	if (field.outcome === 'contested')
		return field.alternatives.map(({ meaning, values, rows }) =>
			optionOf(meaning, values, rows, tables)
		);
	if (field.possible.length > 0)
		return field.possible.map(({ meaning, values }) => {
			const own = field.rows.filter((key) => tables.rows.get(key)?.meaning === meaning);
			return optionOf(meaning, values, own, tables);
		});
	return field.meaning === null ? [] : [optionOf(field.meaning, field.values, field.rows, tables)];
}

/** Fields that tell an attribute; any field where none is named. A first gear's ratio is no axle's, a glass's year no car's. */
const TOLD_BY: Partial<Record<FactAttribute, readonly FieldName[]>> = {
	model_year: ['model_year'],
	assembly_plant: ['assembly_plant'],
	engine: ['engine', 'unit_code', 'cylinder_group', 'casting_number', 'option', 'series'],
	transmission: ['transmission', 'unit_code', 'engine', 'option'],
	axle: ['axle', 'option']
};

/** Stamps of a part: its own plant and year are not those of the car, unless a partial serial names them. */
const PARTS: readonly StampKind[] = ['engine', 'casting', 'date', 'code'];
const ofPart = (field: ReadingField, kind: StampKind): boolean =>
	PARTS.includes(kind) && field.derived_from?.includes('partial_serial') !== true;

/** Facts of a field, with what its own code says of the plant, and the year of a part told apart from that of the car. */
export function withOwn(field: ReadingField, kind: StampKind, option: Option): Option {
	const { facts } = option;
	if (field.name === 'assembly_plant')
		return { ...option, facts: { plant_code: field.code, ...facts } };
	if (field.name !== 'model_year' || !ofPart(field, kind)) return option;
	const { model_year, ...others } = facts;
	return { ...option, facts: { ...others, unit_year: model_year } };
}

/** Whether an option tells an attribute. */
export const says = (option: Option, attribute: FactAttribute): boolean =>
	FACTS_OF[attribute].some((key) => option.facts[key] !== undefined);

/** The attributes that a field's facts tell. */
export function attributesOf(
	field: ReadingField,
	kind: StampKind,
	options: readonly Option[]
): FactAttribute[] {
	const { part } = options[0]?.facts ?? {};
	if (field.name === 'casting_number' && !ENGINE_PARTS.includes(String(part))) return [];
	if (field.name === 'assembly_plant' && ofPart(field, kind)) return [];
	const told = (Object.keys(FACTS_OF) as FactAttribute[]).filter(
		(attribute) =>
			(TOLD_BY[attribute]?.includes(field.name) ?? true) &&
			options.some((option) => says(option, attribute))
	);
	const own = OWN[field.name];
	return own === undefined || told.includes(own) ? told : [...told, own];
}

/** The attribute that a field is about even when its tables say nothing. */
const OWN: Partial<Record<FieldName, FactAttribute>> = {
	division: 'division',
	line: 'line',
	model_year: 'model_year',
	assembly_plant: 'assembly_plant',
	engine: 'engine',
	unit_code: 'engine',
	transmission: 'transmission',
	axle: 'axle'
};
