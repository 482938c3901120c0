import { interfaceText } from '../../text/en/interface';
import type { FieldError } from '../../types';
import { fault, malformed } from './refusal';

const decode = (text: string): string => {
	if (!text.includes('%') && !text.includes('+')) return text;
	return decodeURIComponent(text.replaceAll('+', ' '));
};

/** Parameters by name; what is empty or blank is left out. */
export type Parameters<Name extends string> = Partial<Record<Name, string>>;

/**
 * The parameters of an address, each at most once. An unknown one is refused, so that a slip of the pen
 * never changes an answer in silence.
 * @param search the query with its `?`, or empty
 * @throws {Refusal} 400 naming every parameter that is unknown, repeated or cannot be decoded
 * @example readParameters('?text=ab&year=', ['text', 'year']) // { text: 'ab' }
 */
export function readParameters<Name extends string>(
	search: string,
	accepted: readonly Name[]
): Parameters<Name> {
	const given: Parameters<Name> = {};
	const errors: FieldError[] = [];
	let start = 1;
	while (start < search.length) {
		let end = search.indexOf('&', start);
		if (end < 0) end = search.length;
		if (end > start) readOne(search.slice(start, end), accepted, given, errors);
		start = end + 1;
	}
	if (errors.length > 0) throw malformed(...errors);
	return given;
}

function readOne<Name extends string>(
	pair: string,
	accepted: readonly Name[],
	given: Parameters<Name>,
	errors: FieldError[]
): void {
	const equals = pair.indexOf('=');
	let name: string;
	let value: string;
	try {
		name = decode(equals < 0 ? pair : pair.slice(0, equals));
		value = equals < 0 ? '' : decode(pair.slice(equals + 1));
	} catch (error) {
		if (!(error instanceof URIError)) throw error;
		errors.push(fault(pair.slice(0, 40), 'not_decodable', interfaceText.malformed.query));
		return;
	}
	if (!accepted.includes(name as Name)) {
		const message = interfaceText.malformed.unknown(name, accepted);
		errors.push(fault(name.slice(0, 40), 'unknown_parameter', message, accepted));
		return;
	}
	if (given[name as Name] !== undefined) {
		errors.push(fault(name, 'repeated', interfaceText.malformed.repeated(name)));
		return;
	}
	if (value.trim() !== '') given[name as Name] = value;
}
