import { DIVISIONS, MAKER_NAMES, MAKERS, type Division, type Maker } from '../../types';

/** Usual names beside the full one; the short key is a name too. Closed: nothing else is taken. */
const MAKER_ALIASES: Readonly<Record<Maker, readonly string[]>> = {
	gm: ['GM', 'General Motors Corporation', 'General Motors Corp'],
	chrysler: ['Chrysler', 'Chrysler Corp', 'Chrysler Motors', 'Mopar'],
	ford: ['Ford', 'Ford Motor', 'Ford Motor Co', 'FoMoCo'],
	amc: ['AMC', 'American Motors Corporation', 'American Motors Corp'],
	other: ['Other']
};

const DIVISION_ALIASES: Readonly<Record<Division, readonly string[]>> = {
	Chevrolet: ['Chevy', 'Chev'],
	Pontiac: ['Poncho'],
	Oldsmobile: ['Olds'],
	Buick: [],
	Cadillac: ['Caddy', 'Cad'],
	'GM of Canada': ['GM Canada', 'General Motors of Canada'],
	Plymouth: ['Plym'],
	Dodge: [],
	Chrysler: [],
	Imperial: [],
	Ford: [],
	Mercury: ['Merc'],
	Lincoln: [],
	AMC: ['Rambler']
};

/** A name without case, spaces and signs. */
const folded = (name: string): string => name.toLowerCase().replace(/[^a-z0-9]/g, '');

const makersByName = new Map<string, Maker>();
const divisionsByName = new Map<string, { maker: Maker; division: Division }>();
for (const maker of MAKERS) {
	for (const name of [maker, MAKER_NAMES[maker], ...MAKER_ALIASES[maker]])
		makersByName.set(folded(name), maker);
	for (const division of DIVISIONS[maker])
		for (const name of [division, ...DIVISION_ALIASES[division]])
			divisionsByName.set(folded(name), { maker, division });
}

/** What a name stands for: a corporation, or a division and its corporation. */
export interface Named {
	readonly maker: Maker;
	readonly division?: Division;
}

/**
 * Reads the name of a corporation or a division, in any case and by the usual short names.
 * A name that is both (Chrysler, Ford, AMC) means the corporation.
 * @example makerNamed('chevy') // { maker: 'gm', division: 'Chevrolet' }
 */
export function makerNamed(name: string): Named | null {
	const key = folded(name);
	const maker = makersByName.get(key);
	return maker ? { maker } : (divisionsByName.get(key) ?? null);
}

/** Reads the name of a division. @example divisionNamed('MERC') // { maker: 'ford', division: 'Mercury' } */
export const divisionNamed = (name: string): Required<Named> | null =>
	divisionsByName.get(folded(name)) ?? null;

/** Corporations and divisions with every name that is taken for them. */
export const MAKER_LIST = MAKERS.map((maker) => ({
	key: maker,
	name: MAKER_NAMES[maker],
	aliases: [...MAKER_ALIASES[maker]],
	divisions: DIVISIONS[maker].map((division) => ({
		name: division as string,
		aliases: [...DIVISION_ALIASES[division]]
	}))
}));

/** Full names, for the list of what is accepted. */
export const ACCEPTED_MAKERS: readonly string[] = MAKER_LIST.map(({ name }) => name).concat(
	MAKER_LIST.flatMap(({ divisions }) => divisions.map(({ name }) => name))
);
