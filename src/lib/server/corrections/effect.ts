/**
 * What a change of the tables does to readings that people have saved: each field old and new, before anything is
 * accepted. Pure. Readings are found by the look-ups that they made, those that found nothing too: an added row answers a
 * miss.
 */
import { read, sameContent, type TableSet } from '../../decoder';
import type {
	Outcome,
	ReadContext,
	Reading,
	ReadingField,
	StampKind,
	Strength,
	TableName
} from '../../types';

/** A saved reading, with the look-ups that it rests on. */
export interface SavedForEffect {
	readonly id: string;
	readonly owner: string | null;
	readonly kind: StampKind;
	readonly text: string;
	readonly context: ReadContext;
	readonly uses: readonly {
		readonly table: TableName;
		readonly code: string;
		/** Null for a look-up that found nothing. */
		readonly row_key: string | null;
	}[];
}

/** What a field says: its outcome, its words, how well they are supported. */
export interface FieldState {
	readonly outcome: Outcome;
	readonly meaning: string | null;
	readonly strength: Strength | null;
}
export interface FieldEffect {
	readonly label: string;
	readonly code: string;
	/** Null where the field is not there: another form reads the stamp. */
	readonly old: FieldState | null;
	readonly now: FieldState | null;
}
export interface ReadingEffect {
	readonly id: string;
	readonly owner: string | null;
	readonly text: string;
	readonly division: string | null;
	readonly model_year: number | null;
	readonly assembly_plant: string | null;
	readonly fields: readonly FieldEffect[];
	/** Tallies of the car that come out otherwise, in words. */
	readonly flips: readonly string[];
}
export interface EffectSheet {
	/** Those whose tallies flip first, then those with the most fields that change. */
	readonly changed: readonly ReadingEffect[];
	/** Readings that look at what changes and still say the same. */
	readonly same: number;
}

/** Which tallies of a saved car come out otherwise. Car files answer it; where there are none, nothing flips. */
export type TallyFlips = (
	saved: SavedForEffect,
	before: TableSet,
	after: TableSet
) => readonly string[];
const NO_FLIPS: TallyFlips = () => [];

interface Touched {
	readonly rows: ReadonlySet<string>;
	readonly codes: ReadonlySet<string>;
	/** Tables of which a claim is otherwise: what is not listed in one may be not used. */
	readonly claimed: ReadonlySet<string>;
}
const codeKey = (table: string, code: string): string => `${table}\n${code}`;

/** Rows and claims that say something else, or are there on one side only, and the codes that rows are found under. */
function touchedBy(before: TableSet, after: TableSet): Touched {
	const rows = new Set<string>();
	const codes = new Set<string>();
	const sides = [before, after];
	for (const [index, { rows: own }] of sides.entries()) {
		const other = (sides[1 - index] as TableSet).rows;
		for (const [key, row] of own) {
			if (sameContent(row, other.get(key))) continue;
			rows.add(key);
			codes.add(codeKey(row.table, row.code));
		}
	}
	const claims = sides.map((side) => new Map(side.claims.map((claim) => [claim.claim_key, claim])));
	const claimed = new Set(
		sides.flatMap((side, index) =>
			side.claims
				.filter((claim) => !sameContent(claim, claims[1 - index]?.get(claim.claim_key)))
				.map(({ table }) => table)
		)
	);
	return { rows, codes, claimed };
}

const looksAt = ({ uses }: SavedForEffect, { rows, codes, claimed }: Touched): boolean =>
	uses.some(
		({ table, code, row_key }) =>
			(row_key === null ? claimed.has(table) : rows.has(row_key)) || codes.has(codeKey(table, code))
	);

const firstReading = (
	tables: TableSet,
	{ text, kind, context }: SavedForEffect
): Reading | undefined => read(tables, { text, kind, context }).readings[0];

const stateOf = ({ outcome, meaning, strength }: ReadingField): FieldState => ({
	outcome,
	meaning,
	strength
});
/** A field stands for the same characters in both readings. */
const placeOf = ({ name, from, to, line }: ReadingField): string =>
	JSON.stringify([name, from, to, line ?? null]);

function fieldEffects(old: Reading | undefined, now: Reading | undefined): FieldEffect[] {
	const before = new Map((old?.fields ?? []).map((field) => [placeOf(field), field]));
	const after = new Map((now?.fields ?? []).map((field) => [placeOf(field), field]));
	return [...new Set([...before.keys(), ...after.keys()])].flatMap((place) => {
		const [was, is] = [before.get(place), after.get(place)];
		const { label, code } = (is ?? was) as ReadingField;
		const [oldState, nowState] = [was ? stateOf(was) : null, is ? stateOf(is) : null];
		return sameContent(oldState, nowState) ? [] : [{ label, code, old: oldState, now: nowState }];
	});
}

const plantOf = (reading: Reading | undefined): string | null =>
	reading?.fields.find(({ name }) => name === 'assembly_plant')?.meaning ?? null;

/**
 * The effect of a change on saved readings.
 * @param flips which tallies of a car flip; nothing does where car files are not there to tell
 */
export function effectOf(
	before: TableSet,
	after: TableSet,
	saved: readonly SavedForEffect[],
	flips: TallyFlips = NO_FLIPS
): EffectSheet {
	const touched = touchedBy(before, after);
	const effects = saved
		.filter((one) => looksAt(one, touched))
		.map((one): ReadingEffect => {
			const [old, now] = [firstReading(before, one), firstReading(after, one)];
			return {
				id: one.id,
				owner: one.owner,
				text: one.text,
				division: (now ?? old)?.division ?? null,
				model_year: (now ?? old)?.model_year ?? null,
				assembly_plant: plantOf(now ?? old),
				fields: fieldEffects(old, now),
				flips: flips(one, before, after)
			};
		});
	const changed = effects.filter(({ fields, flips: own }) => fields.length + own.length > 0);
	return {
		changed: changed.sort(
			(a, b) =>
				b.flips.length - a.flips.length ||
				b.fields.length - a.fields.length ||
				Number(a.id > b.id) - Number(a.id < b.id)
		),
		same: effects.length - changed.length
	};
}

/** What of an effect somebody may see: of readings that are not their own how much changes, division, year and plant. */
export interface ShownEffect {
	readonly division: string | null;
	readonly model_year: number | null;
	readonly assembly_plant: string | null;
	/** How many fields change, and how many tallies come out otherwise. */
	readonly fields: number;
	readonly flips: number;
	/** The stamp and what changes; null where the reading is somebody else's. */
	readonly own: Pick<ReadingEffect, 'text' | 'fields' | 'flips'> | null;
}

/** The sheet as `viewer` sees it, contributor and moderator alike. @param viewer an id; null for nobody signed in */
export const shownTo = ({ changed }: EffectSheet, viewer: string | null): readonly ShownEffect[] =>
	changed.map(({ owner, text, division, model_year, assembly_plant, fields, flips }) => ({
		division,
		model_year,
		assembly_plant,
		fields: fields.length,
		flips: flips.length,
		own: owner !== null && owner === viewer ? { text, fields, flips } : null
	}));
