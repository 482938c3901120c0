/** Every word with which the interface refuses a request. The pages show the same words beside the field. */
import { FIRST_YEAR, LAST_YEAR } from '../../types';

const listed = (values: readonly string[]): string => values.join(', ');
/** What a visitor wrote, cut short so that a message stays a message. */
const quoted = (value: string): string =>
	`“${value.length > 40 ? `${value.slice(0, 40)}…` : value}”`;

export const interfaceText = {
	malformed: {
		query: 'The address cannot be read: a % must be followed by two hexadecimal figures.',
		unknown: (name: string, accepted: readonly string[]) =>
			accepted.length === 0
				? `There is no parameter ${quoted(name)} here; none is taken.`
				: `There is no parameter ${quoted(name)} here. Taken: ${listed(accepted)}.`,
		repeated: (name: string) => `${name} is given more than once.`,
		json: 'The body is no JSON.',
		notAnObject: 'The body must be one JSON object.',
		notAnObjectNamed: (name: string) => `${name} must be an object.`,
		notText: (name: string) => `${name} must be a text.`,
		limit: (most: number) => `limit is a whole number from 1 to ${most}.`,
		cursor: 'The cursor is none of ours, or belongs to another list or other filters.',
		cursorEdition: (edition: number) => `The cursor belongs to edition ${edition}.`,
		edition: 'An edition is a whole number.',
		choice: (name: string, accepted: readonly string[]) => `${name} is one of ${listed(accepted)}.`
	},
	/** Texts of which nothing can be read; the most characters are handed in. */
	text: {
		empty: () => 'Type what is struck on the car.',
		too_long: (most: number) => `A text of this kind has ${most} characters at most.`,
		nothing_struck: () =>
			'There is no letter or figure in it that can be struck. Type at least one that you can read, and ? for the others.'
	},
	invalid: {
		kind: (value: string, accepted: readonly string[]) =>
			`${quoted(value)} is no kind of stamp. Taken: ${listed(accepted)}.`,
		fieldsOfTag: 'fields are those of a body tag: leave kind out, or give body_tag.',
		fieldsAndText: 'Give either the text of the tag or its fields.',
		place: (most: number) => `A place has ${most} characters at most.`,
		stamps: (most: number) => `stamps is a list of 1 to ${most} stamps of one car.`,
		field: (value: string) => `${quoted(value)} is no field of a reading.`,
		maker: (value: string) => `We know no maker by the name of ${quoted(value)}.`,
		division: (value: string) => `We know no division by the name of ${quoted(value)}.`,
		divisionOfMaker: (division: string, maker: string) => `${division} is no division of ${maker}.`,
		year: `A model year is a whole number from ${FIRST_YEAR} to ${LAST_YEAR}.`,
		plant: 'A plant code has 3 characters at most.',
		search: (most: number) => `A search has ${most} characters at most.`,
		twice: (name: string) => `${name} is given both beside the text and in context.`
	},
	unknown: {
		path: 'Nothing stands at this address. /api/v1/openapi.json lists what does.',
		edition: (number: string) => `There is no edition ${quoted(number)}.`,
		maker: (value: string) => `We keep no tables of ${quoted(value)}.`,
		table: (value: string) => `There is no table ${quoted(value)}.`
	},
	method: (method: string, allowed: readonly string[]) =>
		`${quoted(method)} is not answered here. Taken: ${listed(allowed)}.`,
	notAcceptable: (types: readonly string[]) => `We can answer in ${listed(types)}.`,
	tooLarge: (most: number) => `The body may hold ${most.toLocaleString('en-US')} bytes.`,
	mediaType: 'The body must be application/json, in UTF-8, not compressed.',
	tooMany: (seconds: number) =>
		`Too many requests from this address. Ask again in ${seconds} ${seconds === 1 ? 'second' : 'seconds'}.`,
	document: {
		summary: 'What the stamps of a collector car say, on which sources, and how sure that is.',
		description:
			'GETs need no account and allow any origin, without credentials. Every refusal is application/problem+json. Parameters are forgiving about case and space; an empty one counts as absent, an unknown one is refused. A reading never proves title or authenticity.'
	}
} as const;
