/** Reads one stamp against one edition. */
import type { FieldName, Problem, ReadContext, Reading, ReadResult, StampKind } from '../types';
import { readCode } from './code-reading';
import { readDateAlone } from './date-reading';
import { normalise, type Characters } from './engine/characters';
import type { LinedKind, LinedLayout } from './engine/lined-layout';
import { hasLines, isOneToken } from './engine/lines';
import { textOfFields, type NamedFields } from './engine/named-fields';
import type { PreparedLayout } from './engine/plan';
import { foreignLetters } from './engine/problems';
import { MOST_READINGS } from './engine/ranking';
import type { TableSet } from './engine/table-set';
import { knownCar } from './known-car';
import { PREPARED } from './layouts';
import { LINED_LAYOUTS } from './layouts/lined';
import { readLined } from './lined-stamps';
import { readSerial, shortest } from './serial-reading';

export interface ReadRequest {
	/** As typed; see `examineText` for what cannot be read at all. */
	readonly text: string;
	/** For a body tag, in place of the text: what stands in each named field. */
	readonly fields?: NamedFields;
	/** Left out: every kind that fits. */
	readonly kind?: StampKind;
	readonly context?: ReadContext;
	/** Whether fields carry the questions that they put to the tables. */
	readonly lookups?: boolean;
	/** The layouts to try: those of the product when left out. */
	readonly layouts?: readonly PreparedLayout[];
	readonly lined?: readonly LinedLayout[];
}

interface Read {
	readonly kind: StampKind;
	readonly readings: readonly Reading[];
	readonly more: number;
	readonly problems: readonly Problem[];
	/** Of stamps that are read line by line: tokens joined by one space, lines by " / ". */
	readonly normalised?: string;
}
interface Typed extends Required<Omit<ReadRequest, 'kind' | 'fields'>> {
	readonly fields?: NamedFields;
	readonly characters: Characters;
	readonly tables: TableSet;
}

/** Up to so many characters, a text without a kind is first taken as a bare code. */
const LIKELY_CODE = 3;

/** What the serial beside it tells joins what was given in so many words. */
function withSerial({ context, tables, layouts }: Typed): ReadContext {
	if (context.serial === undefined) return context;
	const { maker, division, year } = knownCar(tables, context, layouts);
	return {
		...context,
		...(maker === undefined ? {} : { maker }),
		...(division === undefined ? {} : { division }),
		...(year === undefined ? {} : { year })
	};
}

function asCode(typed: Typed, field?: FieldName): Read {
	const { characters, tables, lookups } = typed;
	const context = withSerial(typed);
	const own = field === undefined ? context : { ...context, field };
	return { kind: 'code', ...readCode(characters, tables, own, lookups) };
}

function asSerial({ characters, tables, context, lookups, layouts }: Typed): Read {
	return { kind: 'serial', ...readSerial(characters, tables, context, lookups, layouts) };
}

const asDate = (typed: Typed): Read => ({
	kind: 'date',
	...readDateAlone(typed.text, typed.tables, withSerial(typed))
});

/** One list of readings, the second's ranks after the first's; the problems are those of the first. */
function joined(first: Read, second: Read): Read {
	const all = [
		...first.readings,
		...second.readings.map((reading) => ({
			...reading,
			rank: reading.rank + first.readings.length
		}))
	];
	return {
		...first,
		readings: all.slice(0, MOST_READINGS),
		more: first.more + second.more + Math.max(0, all.length - MOST_READINGS)
	};
}

/** The field of a bare code that a lined stamp may consist of. */
const SINGLE: Partial<Record<LinedKind, FieldName>> = {
	engine: 'unit_code',
	casting: 'casting_number'
};
/** Whether a code of the stamp itself has a row, or a part of the car's number: what is only derived from a code does not tell. */
const tells = (reading: Reading | undefined): boolean =>
	reading?.fields.some(
		({ rows, derived_from }) =>
			rows.length > 0 && (derived_from === undefined || derived_from.includes('partial_serial'))
	) === true;

/**
 * Whether a text of no named kind may be such a stamp: half of its fields come to something, of a plate more, since its
 * short codes can be cut out of nearly anything.
 */
function isLikely(kind: LinedKind, reading: Reading | undefined): boolean {
	const own = (reading?.fields ?? []).filter(({ derived_from }) => derived_from === undefined);
	const told = own.filter(({ outcome }) => outcome === 'found').length;
	return tells(reading) && told * 2 > own.length - (kind === 'body_tag' ? 0 : 1);
}

/** Whether a form of one division's engines reads what was given as another's. */
function isOfOther({ lined, context: { division } }: Typed, reading: Reading | undefined): boolean {
	const own = lined.find(({ id }) => id === reading?.layout)?.divisions;
	return own !== undefined && division !== undefined && !own.includes(division);
}

function asLined(kind: LinedKind, typed: Typed): Read & { readonly whole: boolean } {
	const lined = readLined(typed.tables, { ...typed, kind });
	const single = SINGLE[kind];
	const [first] = lined.readings;
	const isSure = lined.whole && tells(first) && !isOfOther(typed, first);
	if (single === undefined || isSure) return { kind, ...lined };
	// A pad or casting may be worn down to one code, or be one of which no form is known.
	const code = asCode(typed, single);
	if (code.readings.length === 0) return { kind, ...lined };
	const all = joined(code, { ...lined, kind });
	return { ...all, kind, whole: true, normalised: lined.normalised };
}

function asKind(kind: StampKind, typed: Typed): Read {
	switch (kind) {
		case 'serial':
			return asSerial(typed);
		case 'code':
			return asCode(typed);
		case 'date':
			return asDate(typed);
		default:
			return asLined(kind, typed);
	}
}

const NO_CODE: Read = { kind: 'code', readings: [], more: 0, problems: [] };
const hasReadings = ({ readings }: Read): boolean => readings.length > 0;

/** Reads a text as every kind that fits: a serial that fits whole is one, and nothing else is tried. */
function asAny(typed: Typed): Read {
	const { characters, text, layouts } = typed;
	if (typed.fields !== undefined || hasLines(text)) return asLined('body_tag', typed);
	const { cells } = characters;
	const serial = asSerial(typed);
	if (serial.readings[0]?.state === 'complete') return serial;
	// No plate has all of its codes in one: such a text would be cut up at will.
	const kinds: readonly LinedKind[] = isOneToken(text)
		? ['engine', 'casting']
		: ['engine', 'casting', 'body_tag'];
	const parts = kinds.flatMap((kind) => {
		const lined = asLined(kind, typed);
		return isLikely(kind, lined.readings[0]) ? [lined] : [];
	});
	const sure = parts.filter(({ whole }) => whole);
	const code = cells.length < shortest(layouts) ? asCode(typed) : NO_CODE;
	const likelyCode = cells.length <= LIKELY_CODE;
	const one = likelyCode ? [code, ...sure] : [...sure, code];
	const first = likelyCode || sure.length > 0 || serial.readings.length === 0;
	const fitting = (first ? [...one, serial] : [serial, code]).filter(hasReadings);
	// What only may be one is told after the serial, whose problems say what stands in its way.
	const others = [asDate(typed), ...parts.filter(({ whole }) => !whole)].filter(hasReadings);
	return [...(fitting.length === 0 ? [serial] : fitting), ...others].reduce(joined);
}

/**
 * Reads a stamp. Never throws: a text of which nothing can be read gives no readings and a problem.
 * The result depends on the tables and the request alone; the order of rows makes no difference.
 * @example read(tables, { text: 'RM23N0Gxxxxxx' }).readings[0]?.model_year // 1970
 */
export function read(tables: TableSet, request: ReadRequest): ReadResult {
	const { fields, kind, context = {}, lookups = false } = request;
	const { layouts = PREPARED, lined = LINED_LAYOUTS } = request;
	const text = fields === undefined ? request.text : textOfFields(fields);
	const characters = normalise(text);
	const { cells, normalised } = characters;
	if (cells.length === 0)
		return {
			input: { kind: kind ?? null, text, normalised },
			readings: [],
			more: 0,
			problems: []
		};
	const typed: Typed = {
		tables,
		characters,
		text,
		context,
		lookups,
		layouts,
		lined,
		...(fields === undefined ? {} : { fields })
	};
	const result = kind === undefined ? asAny(typed) : asKind(kind, typed);
	const foreign = normalised === text ? [] : foreignLetters(text, characters);
	return {
		input: { kind: result.kind, text, normalised: result.normalised ?? normalised },
		readings: result.readings,
		more: result.more,
		problems: foreign.length === 0 ? result.problems : [...foreign, ...result.problems]
	};
}
