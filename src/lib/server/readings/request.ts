import { interfaceText } from '../../text/en/interface';
import {
	ALL_DIVISIONS,
	FIELD_NAMES,
	FIRST_YEAR,
	LAST_YEAR,
	MAKER_NAMES,
	MAX_TEXT,
	STAMP_KINDS,
	type FieldError,
	type FieldName,
	type ReadContext,
	type StampKind,
	type StampRequest
} from '../../types';
import { examineText, mostCharacters } from '../../decoder';
import { fault, malformed, invalid, type Parameters } from '../http';
import { ACCEPTED_MAKERS, divisionNamed, makerNamed, type Named } from './aliases';

/** Parameters of a reading, as the permanent address and the interface have them. */
export const READING_PARAMETERS = [
	'text',
	'kind',
	'field',
	'maker',
	'division',
	'year',
	'plant',
	'serial',
	'edition',
	'reader',
	'explain'
] as const;
export type ReadingParameter = (typeof READING_PARAMETERS)[number];

/** What is to be read, checked: against which edition, and what is known beside it. */
export interface ReadRequest {
	readonly text: string;
	/** For a body tag, in place of the text: what stands in each named field. */
	readonly fields?: NamedFields;
	/** Left out: every kind that fits, ranked. */
	readonly kind?: StampKind;
	readonly context: ReadContext;
	/** Left out: the present edition. */
	readonly edition?: number;
	/** The reader that the address names; it only decides how long an answer may be kept. */
	readonly reader?: string;
	/** Whether each field tells what it looked up. */
	readonly explain: boolean;
}

/** What stands in each named field of a body tag. */
export type NamedFields = NonNullable<StampRequest['fields']>;
export type Faults = FieldError[];
const ON = ['1', 'true', 'yes', 'on'];
const OFF = ['0', 'false', 'no', 'off'];

/** A word as the closed sets spell theirs. */
const spelled = (value: string): string =>
	value
		.trim()
		.toLowerCase()
		.replace(/[\s-]+/g, '_');

function readKind(value: string | undefined, faults: Faults): StampKind | undefined {
	if (value === undefined) return undefined;
	const word = spelled(value);
	const kind = STAMP_KINDS.find((one) => one === word);
	if (kind === undefined)
		faults.push(
			fault('kind', 'unknown_kind', interfaceText.invalid.kind(value, STAMP_KINDS), STAMP_KINDS)
		);
	return kind;
}

function readField(value: string | undefined, faults: Faults): FieldName | undefined {
	if (value === undefined) return undefined;
	const word = spelled(value);
	const field = FIELD_NAMES.find((one) => one === word);
	if (field === undefined)
		faults.push(fault('field', 'unknown_field', interfaceText.invalid.field(value), FIELD_NAMES));
	return field;
}

function readMaker(
	maker: string | undefined,
	division: string | undefined,
	faults: Faults
): Partial<Named> {
	const byMaker = maker === undefined ? undefined : makerNamed(maker);
	const byDivision = division === undefined ? undefined : divisionNamed(division);
	if (byMaker === null)
		faults.push(
			fault('maker', 'unknown_maker', interfaceText.invalid.maker(maker!), ACCEPTED_MAKERS)
		);
	if (byDivision === null)
		faults.push(
			fault(
				'division',
				'unknown_division',
				interfaceText.invalid.division(division!),
				ALL_DIVISIONS
			)
		);
	if (!byDivision) return byMaker ?? {};
	if (byMaker && (byMaker.maker !== byDivision.maker || clash(byMaker, byDivision))) {
		const other = byMaker.division ?? MAKER_NAMES[byMaker.maker];
		const message = interfaceText.invalid.divisionOfMaker(byDivision.division, other);
		faults.push(fault('division', 'division_of_other_maker', message));
	}
	return byDivision;
}

const clash = (a: Named, b: Named): boolean =>
	a.division !== undefined && a.division !== b.division;

function readYear(value: string | undefined, faults: Faults): number | undefined {
	if (value === undefined) return undefined;
	const text = value.trim();
	const year = /^\d{4}$/.test(text) ? Number(text) : 0;
	if (year >= FIRST_YEAR && year <= LAST_YEAR) return year;
	faults.push(fault('year', 'year_out_of_range', interfaceText.invalid.year));
	return undefined;
}

function readPlant(value: string | undefined, faults: Faults): string | undefined {
	const plant = value?.trim().toUpperCase();
	if (plant === undefined || [...plant].length <= 3) return plant;
	faults.push(fault('plant', 'plant_too_long', interfaceText.invalid.plant));
	return undefined;
}

/**
 * An edition's number as an address has it.
 * @throws {Refusal} 400 unless a whole number
 */
export function readEdition(value: string | undefined): number | undefined {
	if (value === undefined) return undefined;
	const text = value.trim();
	if (/^\d{1,9}$/.test(text)) return Number(text);
	throw malformed(fault('edition', 'edition_invalid', interfaceText.malformed.edition));
}

/** A switch as an address has it. @throws {Refusal} 400 unless one of the words for on and off */
export function readSwitch(name: string, value: string | undefined): boolean {
	const text = value?.trim().toLowerCase();
	if (text === undefined || OFF.includes(text)) return false;
	if (ON.includes(text)) return true;
	const accepted = [ON[0]!, OFF[0]!];
	throw malformed(
		fault(name, 'no_switch', interfaceText.malformed.choice(name, accepted), accepted)
	);
}

function readSerial(value: string | undefined, faults: Faults): string | undefined {
	if (value === undefined || [...value].length <= MAX_TEXT.serial) return value;
	faults.push(fault('serial', 'too_long', interfaceText.text.too_long(MAX_TEXT.serial)));
	return undefined;
}

/** What is known beside a stamp, checked; what is wrong with it joins `faults`. */
export function readContext(given: Parameters<ReadingParameter>, faults: Faults): ReadContext {
	const serial = readSerial(given.serial, faults);
	return {
		...readMaker(given.maker, given.division, faults),
		year: readYear(given.year, faults),
		plant: readPlant(given.plant, faults),
		field: readField(given.field, faults),
		// A stamp beside it that is a serial stands in for one that is not given.
		...(serial === undefined ? {} : { serial })
	};
}

const allOf = (fields: NamedFields): string => Object.values(fields).join(' / ');

/** One stamp, checked: its kind, and its text or fields; what is wrong with it joins `faults`. */
export function readStamp(
	given: { readonly kind?: string; readonly text?: string; readonly fields?: NamedFields },
	faults: Faults
): Pick<ReadRequest, 'kind' | 'text' | 'fields'> {
	const { fields } = given;
	const kind = readKind(given.kind, faults);
	if (fields !== undefined && kind !== undefined && kind !== 'body_tag')
		faults.push(fault('fields', 'fields_of_other_kind', interfaceText.invalid.fieldsOfTag));
	if (fields !== undefined && given.text !== undefined)
		faults.push(fault('fields', 'given_twice', interfaceText.invalid.fieldsAndText));
	const text = given.text ?? '';
	const [typed, limited]: [string, StampKind?] =
		fields === undefined ? [text, kind] : [allOf(fields), 'body_tag'];
	const unreadable = examineText(typed, limited);
	if (unreadable !== null) {
		const name = fields === undefined ? 'text' : 'fields';
		const most = mostCharacters(typed, limited);
		faults.push(fault(name, unreadable, interfaceText.text[unreadable](most)));
	}
	return { text, kind, ...(fields === undefined ? {} : { fields }) };
}

/**
 * Checks what an address or a form gives. Forgiving about case and space; what is blank counts as absent.
 * @throws {Refusal} 400 for an edition or switch that cannot be one; 422 naming everything else that is wrong
 */
export function readRequest(
	given: Parameters<ReadingParameter>,
	fields?: NamedFields
): ReadRequest {
	const edition = readEdition(given.edition);
	const explain = readSwitch('explain', given.explain);
	const faults: Faults = [];
	const stamp = readStamp({ kind: given.kind, text: given.text, fields }, faults);
	const context = readContext(given, faults);
	if (faults.length > 0) throw invalid(...faults);
	return { ...stamp, context, edition, reader: given.reader, explain };
}
