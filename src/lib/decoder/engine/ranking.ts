/** The order of readings, and the sentence that says why each stands where it does. */
import type { ReadContext, Reading } from '../../types';
import { decoderText as text } from '../../text/en/decoder';
import { fieldsOf, type Draft } from './reading';

/** At most so many readings come back; the rest is counted. */
export const MOST_READINGS = 24;

/** What speaks for and against a reading, strongest argument first. */
interface Key {
	readonly notUsed: number;
	readonly hintsMissed: number;
	readonly found: number;
	readonly thin: number;
}

const GIVEN_BY_LAYOUT: ReadonlySet<string> = new Set(['model_year', 'unknown']);

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
	let notUsed = 0;
	let found = 0;
	let thin = 0;
	for (const { field, counts } of draft.results) {
		if (field.outcome === 'not_used') notUsed += 1;
		if (field.derived_from !== undefined || GIVEN_BY_LAYOUT.has(field.name)) continue;
		if (!counts) continue;
		found += 1;
		if (field.strength === 'thin') thin += 1;
	}
	return { notUsed, hintsMissed: hintsMissed(draft, context), found, thin };
}

const compareKeys = (a: Key, b: Key): number =>
	Math.sign(a.notUsed) - Math.sign(b.notUsed) ||
	a.hintsMissed - b.hintsMissed ||
	b.found - a.found ||
	a.thin - b.thin;

function whyOf(draft: Draft, key: Key, first: Key, alone: boolean): string {
	const own = draft.results.filter(({ field }) => field.derived_from === undefined);
	const outcome = (name: string): number =>
		own.filter(({ field }) => field.outcome === name).length;
	const found = outcome('found') + outcome('contested');
	const words = text.why;
	const parts: string[] = [words.first(found, own.length)];
	if (outcome('contested') > 0) parts.push(words.contested(outcome('contested')));
	if (outcome('not_listed') > 0) parts.push(words.notListed(outcome('not_listed')));
	if (outcome('illegible') > 0) parts.push(words.illegible(outcome('illegible')));
	if (key.notUsed > 0) parts.push(words.notUsed(key.notUsed));
	if (alone) return parts.join(' ');
	if (compareKeys(key, first) === 0) parts.push(words.equal);
	else if (key.hintsMissed > first.hintsMissed) parts.push(words.fewerHints);
	else if (key.found < first.found) parts.push(words.fewerFound);
	else if (key.thin > first.thin) parts.push(words.thinner);
	return parts.join(' ');
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
			why: whyOf(draft, key, first as Key, index === 0 && !equalFirst),
			fields: fieldsOf(draft, lookups)
		});
	}
	return { readings, more: Math.max(0, keyed.length - MOST_READINGS) };
}
