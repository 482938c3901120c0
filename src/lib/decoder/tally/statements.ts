/** From readings of a car's stamps to statements about the car. */
import type {
	FieldName,
	Maker,
	Reading,
	ReadingField,
	StampKind,
	TallyAttribute,
	TallyStamp,
	Weight
} from '../../types';
import { normalise, textOf, type Cell } from '../engine/characters';
import { tableId, type TableSet } from '../engine/table-set';
import {
	attributesOf,
	gapOf,
	optionOf,
	optionsOf,
	says,
	withOwn,
	type Gap,
	type Option
} from './options';
import { weightOf } from './weights';

/** What one field of one stamp says about one attribute of the car. */
export interface Statement {
	readonly attribute: TallyAttribute;
	/** Index of the stamp. */
	readonly stamp: number;
	readonly kind: StampKind;
	readonly place: string | null;
	readonly maker: Maker | null;
	readonly field: FieldName;
	readonly label: string;
	readonly code: string;
	readonly cells: readonly Cell[];
	readonly year: number | null;
	readonly options: readonly Option[];
	readonly gap: Gap;
	readonly weight: Weight;
	/** Whether the stamp repeats the car's own number here, rather than saying it in characters of its own. */
	readonly repeated: boolean;
}

/** Attributes that are the characters themselves, with the field that carries them. */
const BY_CHARACTERS: Partial<Record<FieldName, TallyAttribute>> = {
	sequence_number: 'sequence_number',
	order_number: 'order_number',
	body_number: 'body_number',
	paint: 'paint',
	trim: 'trim',
	roof: 'roof'
};

/** Fields of the car's own number, in part or whole. */
const NUMBER: readonly FieldName[] = ['sequence_number', 'partial_serial'];
const repeats = ({ derived_from = [] }: ReadingField): boolean =>
	derived_from.includes('partial_serial');
const ofNumber = ({ name, derived_from = [] }: ReadingField): boolean =>
	[name, ...derived_from].some((one) => NUMBER.includes(one));

interface Place {
	readonly stamp: TallyStamp;
	readonly index: number;
	readonly reading: Reading;
}

function statement(
	attribute: TallyAttribute,
	field: ReadingField,
	options: readonly Option[],
	{ stamp, index, reading }: Place
): Statement {
	return {
		attribute,
		stamp: index,
		kind: stamp.kind,
		place: stamp.place ?? null,
		maker: reading.maker,
		field: field.name,
		label: field.label,
		code: field.code,
		cells: normalise(field.code).cells,
		year: reading.model_year,
		options,
		gap: gapOf(field),
		weight: weightOf(stamp.kind, stamp.place, reading.maker, ofNumber(field)),
		repeated: repeats(field)
	};
}

/** The last six characters of a partial serial, where the reading does not name them itself. */
const SEQUENCE = 6;

function* ofPartial(place: Place): Generator<Statement> {
	const { fields } = place.reading;
	if (fields.some(({ name }) => name === 'sequence_number')) return;
	const partial = fields.find(({ name }) => name === 'partial_serial');
	if (partial === undefined) return;
	const cells = normalise(partial.code).cells.slice(-SEQUENCE);
	if (cells.length < SEQUENCE) return;
	const field = { ...partial, code: textOf(cells) };
	yield statement('sequence_number', field, [], place);
}

/** Stamps whose form itself names the maker; others are read under a maker that was given. */
const NAMING: readonly StampKind[] = ['serial', 'body_tag'];

function* ofReading(place: Place, tables: TableSet): Generator<Statement> {
	const { reading } = place;
	if (reading.maker !== null && reading.layout !== null && NAMING.includes(place.stamp.kind)) {
		const table = tables.tables.get(tableId(reading.maker, 'layout'));
		const rows = (table?.byCode.get(reading.layout)?.all ?? []).map(({ row_key }) => row_key);
		const option = optionOf(reading.layout_title, { maker: reading.maker }, rows, tables);
		const [first] = reading.fields;
		if (first !== undefined)
			yield {
				...statement('maker', first, [option], place),
				label: reading.layout_title,
				code: '',
				cells: [],
				gap: 'none'
			};
	}
	for (const field of reading.fields) {
		const characters = BY_CHARACTERS[field.name];
		if (characters !== undefined) yield statement(characters, field, [], place);
		const options = optionsOf(field, tables).map((option) =>
			withOwn(field, place.stamp.kind, option)
		);
		for (const attribute of attributesOf(field, place.stamp.kind, options))
			yield statement(
				attribute,
				field,
				options.filter((option) => says(option, attribute)),
				place
			);
	}
	yield* ofPartial(place);
}

/** Readings of the first rank: one, or several between which nothing on the stamp decides. */
const firstRank = (readings: readonly Reading[]): readonly Reading[] =>
	readings.filter(({ rank }) => rank === (readings[0] as Reading).rank);

/** Statements that several equal readings make, as one that allows what any of them does. */
function joined(parts: readonly Statement[], readings: number): Statement {
	const [first] = parts as [Statement];
	if (readings === 1) return first;
	const options = new Map<string, Option>();
	for (const part of parts)
		for (const option of part.options)
			options.set(`${option.meaning} ${JSON.stringify(option.facts)}`, option);
	const one = parts.length === readings && options.size <= 1;
	const gap = parts.find((part) => part.gap !== 'none')?.gap ?? (one ? 'none' : 'undecided');
	return { ...first, options: [...options.values()], gap };
}

/**
 * What the stamps of one car say about it, field by field. Only readings of the first rank speak; where several share it,
 * a statement allows what any of them says and stays open.
 */
export function statementsOf(tables: TableSet, stamps: readonly TallyStamp[]): Statement[] {
	return stamps.flatMap((stamp, index) => {
		const readings = firstRank(stamp.readings);
		const groups = new Map<string, Statement[]>();
		for (const reading of readings)
			for (const one of ofReading({ stamp, index, reading }, tables)) {
				const id = `${one.attribute} ${one.field} ${one.label} ${one.code}`;
				groups.set(id, [...(groups.get(id) ?? []), one]);
			}
		return [...groups.values()].map((parts) => joined(parts, readings.length));
	});
}
