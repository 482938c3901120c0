import { interfaceText } from '../../text/en/interface';
import type { FieldError } from '../../types';
import { fault, invalid, malformed, type Parameters } from '../http';
import { READING_PARAMETERS, type ReadingParameter } from './request';

const CONTEXT = ['field', 'maker', 'division', 'year', 'plant'] as const;
const MEMBERS: readonly string[] = [...READING_PARAMETERS, 'context', 'fields'];
const CONTEXT_MEMBERS: readonly string[] = [...CONTEXT, 'serial'];

type Members = Readonly<Record<string, unknown>>;

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

const isObject = (value: unknown): value is Members =>
	typeof value === 'object' && value !== null && !Array.isArray(value);

/**
 * The parameters of a reading that a JSON body gives: the same as in an address, the context beside the
 * text or under `context`.
 * @throws {Refusal} 400 for an unknown member; 422 for one of the wrong sort, given twice, or not read yet
 */
export function parametersOfBody(body: Members): Parameters<ReadingParameter> {
	const context = body['context'] ?? {};
	const unknown = unknownMembers(body, MEMBERS);
	if (isObject(context)) unknown.push(...unknownMembers(context, CONTEXT_MEMBERS));
	else unknown.push(fault('context', 'not_an_object', interfaceText.malformed.contextObject));
	if (unknown.length > 0) throw malformed(...unknown);

	const faults: FieldError[] = [];
	const given: Parameters<ReadingParameter> = {};
	for (const name of READING_PARAMETERS) {
		const value = asText(name, body[name], faults);
		if (value !== undefined) given[name] = value;
	}
	for (const name of CONTEXT) {
		const value = asText(name, (context as Members)[name], faults);
		if (value === undefined) continue;
		if (given[name] === undefined) given[name] = value;
		else faults.push(fault(name, 'given_twice', interfaceText.invalid.twice(name)));
	}
	if (body['fields'] !== undefined && body['fields'] !== null)
		faults.push(fault('fields', 'kind_not_available', interfaceText.invalid.tagFields));
	if ((context as Members)['serial'] !== undefined)
		faults.push(fault('context', 'serial_not_available', interfaceText.invalid.contextSerial));
	if (faults.length > 0) throw invalid(...faults);
	return given;
}
