import { interfaceText } from '../../text/en/interface';
import { FIELD_NAMES, MAX_STAMPS, type FieldError, type FieldName } from '../../types';
import { fault, invalid, malformed, type Parameters } from '../http';
import {
	READING_PARAMETERS,
	readContext,
	readEdition,
	readRequest,
	readStamp,
	readSwitch,
	type NamedFields,
	type ReadingParameter,
	type ReadRequest
} from './request';
import type { StampsRequest } from './stamps';

const CONTEXT = ['field', 'maker', 'division', 'year', 'plant', 'serial'] as const;
const MEMBERS: readonly string[] = [...READING_PARAMETERS, 'context', 'fields'];
const STAMPS_MEMBERS: readonly string[] = ['stamps', 'context', 'edition', 'explain'];
const STAMP_MEMBERS: readonly string[] = ['kind', 'text', 'fields', 'place'];
const MOST_OF_PLACE = 100;

type Members = Readonly<Record<string, unknown>>;

const isObject = (value: unknown): value is Members =>
	typeof value === 'object' && value !== null && !Array.isArray(value);

const within = (path: string, faults: readonly FieldError[]): FieldError[] =>
	faults.map((one) => ({ ...one, field: path + one.field }));

function unknownMembers(object: Members, accepted: readonly string[]): FieldError[] {
	return Object.keys(object)
		.filter((name) => !accepted.includes(name))
		.map((name) =>
			fault(
				name.slice(0, 40),
				'unknown_parameter',
				interfaceText.malformed.unknown(name, accepted),
				accepted
			)
		);
}

/** A member as a parameter of an address would have it; null and blank count as absent. */
function asText(name: string, value: unknown, faults: FieldError[]): string | undefined {
	if (value === undefined || value === null) return undefined;
	const plain = typeof value === 'number' || typeof value === 'boolean';
	if (typeof value === 'string' || (plain && name !== 'text')) {
		const text = String(value);
		return text.trim() === '' ? undefined : text;
	}
	faults.push(fault(name, 'not_text', interfaceText.malformed.notText(name)));
	return undefined;
}

const isFieldName = (name: string): name is FieldName =>
	(FIELD_NAMES as readonly string[]).includes(name);

/** The named fields of a body tag; blank ones count as absent. */
function asFields(value: unknown, faults: FieldError[]): NamedFields | undefined {
	if (value === undefined || value === null) return undefined;
	if (!isObject(value)) {
		faults.push(
			fault('fields', 'not_an_object', interfaceText.malformed.notAnObjectNamed('fields'))
		);
		return undefined;
	}
	const fields: Partial<Record<FieldName, string>> = {};
	for (const [name, content] of Object.entries(value)) {
		const path = `fields.${name.slice(0, 40)}`;
		if (!isFieldName(name)) {
			faults.push(fault(path, 'unknown_field', interfaceText.invalid.field(name), FIELD_NAMES));
			continue;
		}
		const text = asText(path, content, faults);
		if (text !== undefined) fields[name] = text;
	}
	return fields;
}

/** Context of a body: an object, or nothing. @throws {Refusal} 400 */
function contextOf(body: Members, accepted: readonly string[]): Members {
	const context = body['context'] ?? {};
	const unknown = unknownMembers(body, accepted);
	if (isObject(context)) unknown.push(...unknownMembers(context, CONTEXT));
	else
		unknown.push(
			fault('context', 'not_an_object', interfaceText.malformed.notAnObjectNamed('context'))
		);
	if (unknown.length > 0) throw malformed(...unknown);
	return context as Members;
}

/**
 * What a JSON body asks of one stamp: the same as in an address, the context beside the text or under
 * `context`, and for a body tag `fields` in place of the text.
 * @throws {Refusal} 400 for an unknown member; 422 for one of the wrong sort, or given twice
 */
export function requestOfBody(body: Members): ReadRequest {
	const context = contextOf(body, MEMBERS);
	const faults: FieldError[] = [];
	const given: Parameters<ReadingParameter> = {};
	for (const name of READING_PARAMETERS) {
		const value = asText(name, body[name], faults);
		if (value !== undefined) given[name] = value;
	}
	for (const name of CONTEXT) {
		const value = asText(name, context[name], faults);
		if (value === undefined) continue;
		if (given[name] === undefined) given[name] = value;
		else faults.push(fault(name, 'given_twice', interfaceText.invalid.twice(name)));
	}
	const fields = asFields(body['fields'], faults);
	if (faults.length > 0) throw invalid(...faults);
	return readRequest(given, fields);
}

function stampOf(value: unknown, faults: FieldError[]): StampsRequest['stamps'][number] {
	if (!isObject(value)) {
		faults.push(fault('', 'not_an_object', interfaceText.malformed.notAnObjectNamed('A stamp')));
		return { text: '' };
	}
	const text = asText('text', value['text'], faults);
	const kind = asText('kind', value['kind'], faults);
	const fields = asFields(value['fields'], faults);
	const place = asText('place', value['place'], faults);
	if (place !== undefined && [...place].length > MOST_OF_PLACE)
		faults.push(fault('place', 'too_long', interfaceText.invalid.place(MOST_OF_PLACE)));
	return {
		...readStamp({ kind, text, fields }, faults),
		...(place === undefined ? {} : { place })
	};
}

/**
 * What a JSON body asks of several stamps of one car. What is wrong with one names it: `stamps[2].text`.
 * @throws {Refusal} 400 for an unknown member; 422 naming everything else that is wrong
 */
export function stampsRequestOfBody(body: Members): StampsRequest {
	const known = contextOf(body, STAMPS_MEMBERS);
	const { stamps } = body;
	if (!Array.isArray(stamps) || stamps.length === 0 || stamps.length > MAX_STAMPS)
		throw invalid(fault('stamps', 'number_of_stamps', interfaceText.invalid.stamps(MAX_STAMPS)));
	const strange = stamps.flatMap((stamp, index) =>
		isObject(stamp) ? within(`stamps[${index}].`, unknownMembers(stamp, STAMP_MEMBERS)) : []
	);
	if (strange.length > 0) throw malformed(...strange);

	const faults: FieldError[] = [];
	const edition = readEdition(asText('edition', body['edition'], faults));
	const explain = readSwitch('explain', asText('explain', body['explain'], faults));
	const given: Parameters<ReadingParameter> = {};
	for (const name of CONTEXT) {
		const value = asText(name, known[name], faults);
		if (value !== undefined) given[name] = value;
	}
	const context = readContext(given, faults);
	const read = stamps.map((stamp, index) => {
		const own: FieldError[] = [];
		const request = stampOf(stamp, own);
		faults.push(
			...own.map((one) => ({
				...one,
				field: one.field === '' ? `stamps[${index}]` : `stamps[${index}].${one.field}`
			}))
		);
		return request;
	});
	if (faults.length > 0) throw invalid(...faults);
	return { stamps: read, context, edition, explain };
}
