/** What a car's serial tells, for reading its other stamps. */
import type { Maker, ReadContext, Reading, ReadingField } from '../types';
import { isRead, normalise } from './engine/characters';
import type { Scope } from './engine/look-up';
import type { PreparedLayout } from './engine/plan';
import { readSerial } from './serial-reading';
import type { TableSet } from './engine/table-set';

/** What is known of the car that a stamp belongs to; what is not known is left out. */
export interface KnownCar extends Omit<Scope, 'year'> {
	readonly maker?: Maker;
	readonly year?: number;
}

/** The one value that all readings agree on. */
function agreed<Value>(
	readings: readonly Reading[],
	of: (reading: Reading) => Value
): Value | undefined {
	const [first, ...others] = readings.map(of);
	return others.every((other) => other === first) ? first : undefined;
}

const codeOf = (name: ReadingField['name']) => (reading: Reading) => {
	const code = reading.fields.find((field) => field.name === name)?.code;
	return code !== undefined && normalise(code).cells.every(isRead) ? code : undefined;
};
const lineOf = ({ fields }: Reading): string | undefined => {
	const line = fields.find(({ values }) => typeof values.line === 'string')?.values.line;
	return line as string | undefined;
};

const given = <Value extends object>(facts: {
	[Key in keyof Value]?: Value[Key] | null | undefined;
}) =>
	Object.fromEntries(
		Object.entries(facts).filter(([, value]) => value !== undefined && value !== null)
	) as Partial<Value>;

/** What equally likely readings of a serial agree on. */
export function carOf(readings: readonly Reading[]): KnownCar {
	const equal = readings.filter(({ rank }) => rank === readings[0]?.rank);
	const line = agreed(equal, lineOf);
	return given<KnownCar>({
		maker: agreed(equal, ({ maker }) => maker),
		division: agreed(equal, ({ division }) => division),
		year: agreed(equal, (reading) => reading.model_year),
		plant: agreed(equal, codeOf('assembly_plant')),
		body: agreed(equal, codeOf('body_style')),
		engine: agreed(equal, codeOf('engine')),
		line: line === undefined ? undefined : [line]
	});
}

/** The serial that stands beside a stamp, and what was given in so many words, which goes before it. */
export function knownCar(
	tables: TableSet,
	context: ReadContext,
	layouts: readonly PreparedLayout[]
): KnownCar {
	const { maker, division, year, plant, serial = '' } = context;
	const characters = normalise(serial);
	const readings =
		characters.cells.length === 0
			? []
			: readSerial(characters, tables, context, false, layouts).readings;
	return {
		...carOf(readings),
		...given<KnownCar>({ maker, division, year, plant: plant?.toUpperCase() })
	};
}
