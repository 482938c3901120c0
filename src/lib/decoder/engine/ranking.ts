/** The order of readings, and the sentence that says why each stands where it does. */
import type { ReadContext, Reading } from '../../types';
import { decoderText as text } from '../../text/en/decoder';
import { fieldsOf, strayNumber, type Draft } from './reading';

/** At most so many readings come back; the rest is counted. */
export const MOST_READINGS = 24;

/** What speaks for and against a reading, strongest argument first, and the counts that its sentence names. */
interface Key {
	readonly notUsed: number;
	readonly outOfRun: number;
	readonly hintsMissed: number;
	readonly misfit: number;
	readonly found: number;
	readonly thin: number;
	readonly fields: number;
	readonly told: number;
	readonly contested: number;
	readonly notListed: number;
	readonly illegible: number;
}

/** Fields that every reading of a layout has in the same way: they rank nothing. */
const RANKS_NOTHING: ReadonlySet<string> = new Set(['model_year', 'unknown']);

function hintsMissed(draft: Draft, context: ReadContext): number {
	const { maker, division, year, plant } = context;
	let missed = 0;
	if (maker !== undefined && maker !== draft.maker && maker !== draft.layout.maker) missed += 1;
	if (division !== undefined && division !== draft.division) missed += 1;
	if (year !== undefined && year !== draft.year) missed += 1;
	if (plant !== undefined) {
		const own = draft.results.find(({ field }) => field.name === 'assembly_plant')?.field.code;
		if (own !== plant.toUpperCase()) missed += 1;
	}
	return missed;
}

function keyOf(draft: Draft, context: ReadContext): Key {
	let fields = 0;
	let found = 0;
	let thin = 0;
	const outcomes = { found: 0, contested: 0, not_listed: 0, not_used: 0, illegible: 0 };
	for (const { field, counts } of draft.results) {
		if (field.derived_from !== undefined) continue;
		fields += 1;
		outcomes[field.outcome] += 1;
		if (!counts || RANKS_NOTHING.has(field.name)) continue;
		found += 1;
		if (field.strength === 'thin') thin += 1;
	}
	return {
		notUsed: outcomes.not_used,
		outOfRun: strayNumber(draft) === undefined ? 0 : 1,
		hintsMissed: hintsMissed(draft, context),
		misfit: draft.misfit ?? 0,
		found,
		thin,
		fields,
		told: outcomes.found + outcomes.contested,
		contested: outcomes.contested,
		notListed: outcomes.not_listed,
		illegible: outcomes.illegible
	};
}

/** A hint that is missed weighs as much as three tokens that nothing takes. */
const HINT = 60;
const against = ({ hintsMissed: missed, misfit }: Key): number => missed * HINT + misfit;

const compareKeys = (a: Key, b: Key): number =>
	Math.sign(a.notUsed) - Math.sign(b.notUsed) ||
	against(a) - against(b) ||
	a.outOfRun - b.outOfRun ||
	b.found - a.found ||
	a.thin - b.thin;

/** Why a reading stands where it does, beside what it tells. */
type Reason =
	'none' | 'equalFirst' | 'equal' | 'fewerHints' | 'misfit' | 'outOfRun' | 'fewerFound' | 'thinner';
const REASONS = [
	'none',
	'equalFirst',
	'equal',
	'fewerHints',
	'misfit',
	'outOfRun',
	'fewerFound',
	'thinner'
] as const satisfies readonly Reason[];

function reasonOf(key: Key, first: Key, equalFirst: boolean): Reason {
	if (key === first) return equalFirst ? 'equalFirst' : 'none';
	if (compareKeys(key, first) === 0) return 'equal';
	if (key.hintsMissed > first.hintsMissed) return 'fewerHints';
	if (key.misfit > first.misfit) return 'misfit';
	if (key.outOfRun > first.outOfRun) return 'outOfRun';
	if (key.found < first.found) return 'fewerFound';
	return key.thin > first.thin ? 'thinner' : 'none';
}

/** Sentences by what they say: there are few, and every reading carries one. */
const said = new Map<number, string>();

function whyOf(key: Key, reason: Reason): string {
	const counts = [key.told, key.fields, key.contested, key.notListed, key.illegible, key.notUsed];
	// No serial has as many as sixteen fields, so each count has a digit of its own; a tag is worded anew.
	const id =
		key.fields < 16 ? counts.reduce((sum, count) => sum * 16 + count, REASONS.indexOf(reason)) : -1;
	const before = said.get(id);
	if (before !== undefined) return before;
	const words = text.why;
	const parts = [words.first(key.told, key.fields)];
	if (key.contested > 0) parts.push(words.contested(key.contested));
	if (key.notListed > 0) parts.push(words.notListed(key.notListed));
	if (key.illegible > 0) parts.push(words.illegible(key.illegible));
	if (key.notUsed > 0) parts.push(words.notUsed(key.notUsed));
	if (reason !== 'none') parts.push(words[reason]);
	const why = parts.join(' ');
	if (id >= 0) said.set(id, why);
	return why;
}

/** Orders drafts and turns them into readings; equal keys share a rank. Ties run by layout id, then year, then division. */
export function ranked(
	drafts: readonly Draft[],
	context: ReadContext,
	lookups: boolean
): { readonly readings: Reading[]; readonly more: number } {
	const keyed = drafts.map((draft) => ({ draft, key: keyOf(draft, context) }));
	const tie = (draft: Draft): string =>
		`${draft.layout.id} ${draft.year ?? 0} ${draft.division ?? ''}`;
	if (keyed.length > 1)
		keyed.sort((a, b) => compareKeys(a.key, b.key) || (tie(a.draft) < tie(b.draft) ? -1 : 1));
	const first = keyed[0]?.key;
	const readings: Reading[] = [];
	let rank = 0;
	let before: Key | undefined;
	for (const [index, { draft, key }] of keyed.slice(0, MOST_READINGS).entries()) {
		if (before === undefined || compareKeys(before, key) !== 0) rank = index + 1;
		before = key;
		const equalFirst =
			index === 0 && keyed[1] !== undefined && compareKeys(key, keyed[1].key) === 0;
		readings.push({
			layout: draft.layout.id,
			layout_title: draft.layout.title,
			maker: draft.maker,
			division: draft.division,
			model_year: draft.year,
			state: draft.complete ? 'complete' : 'partial',
			rank,
			why: whyOf(key, reasonOf(key, first as Key, equalFirst)),
			fields: fieldsOf(draft, lookups)
		});
	}
	return { readings, more: Math.max(0, keyed.length - MOST_READINGS) };
}
