/** Fields read from others: a fact of the parent's row, or a code of several places. */
import { decoderText as text } from '../../text/en/decoder';
import {
	contestedField,
	foundField,
	keepTold,
	toldBefore,
	type FieldHead,
	type FieldResult
} from './field';
import type { DerivedField, PrimaryField } from './layout';
import type { Question } from './plan';
import { tableField, type Reader } from './table-field';
import type { CompiledRow } from './table-set';

type FactKey = Extract<DerivedField['reads'], { by: 'value' }>['key'];

/** The places of a derived field are those of its parents. */
export function derivedHead(field: DerivedField, primaries: readonly PrimaryField[]): FieldHead {
	const parents = primaries.filter((own) => field.parents.includes(own.name));
	return {
		name: field.name,
		label: field.label,
		from: Math.min(...parents.map((own) => own.from)),
		to: Math.max(...parents.map((own) => own.to)),
		derived_from: field.parents
	};
}

interface Fact {
	readonly meaning: string;
	readonly values: Readonly<Record<string, unknown>>;
	readonly row: CompiledRow;
}

function factOf(row: CompiledRow, key: FactKey): Fact | null {
	const value = row.values[key];
	if (typeof value === 'string') return { meaning: value, values: { [key]: value }, row };
	if (typeof value === 'number')
		return { meaning: text.cylinders(value), values: { [key]: value }, row };
	return null;
}

/** A fact of the parent's row as a field of its own; null when the parent gives none. */
function factField(head: FieldHead, key: FactKey, parent: FieldResult): FieldResult | null {
	const { outcome, code } = parent.field;
	if (outcome !== 'found' && outcome !== 'contested') return null;
	const facts = parent.rows.map((row) => factOf(row, key)).filter((fact) => fact !== null);
	const [first] = facts;
	if (first === undefined) return null;
	const groups = new Map<string, CompiledRow[]>();
	for (const fact of facts)
		groups.set(fact.meaning, [...(groups.get(fact.meaning) ?? []), fact.row]);
	const rows = facts.map((fact) => fact.row);
	const field =
		groups.size === 1
			? foundField(head, code, rows, first)
			: contestedField(head, code, [...groups.values()], (row) => factOf(row, key) as Fact);
	return { field, rows, counts: false, table: null };
}

/** Reads a derived field; null when there is nothing to say, which leaves it out of the reading. */
export function derivedField(
	field: DerivedField,
	head: FieldHead,
	question: Question | null,
	parent: FieldResult,
	reader: Reader
): FieldResult | null {
	if (field.reads.by === 'value') {
		const { key } = field.reads;
		const [row] = parent.rows;
		const alone = row !== undefined && parent.rows.length === 1 && parent.counts;
		const before = alone ? toldBefore(row, head) : undefined;
		if (before !== undefined) return before;
		const result = factField(head, key, parent);
		return alone && result !== null ? keepTold(row, head, result) : result;
	}
	const result = tableField(head, question as Question, reader);
	if (!result.counts && field.always !== true) return null;
	return { ...result, counts: false };
}
