/** What the form offers beside the field: makers and model years. */
import { readyOptions } from '$lib/components/form/ready-options';
import type { Choice, ChoiceGroup } from '$lib/components/form/SelectField.svelte';
import { MAKER_LIST, makerNamed } from '$lib/server/readings';
import { entryText as words } from '$lib/text/en/entry';
import { FIRST_YEAR } from '$lib/types';

const any: Choice = { value: '', label: words.any };
/** A name that is a corporation's too means the corporation: it stands for both. */
const isOwnName = (division: string): boolean => makerNamed(division)?.division === division;

/** Corporations, each over its divisions. */
const makerChoices: readonly (Choice | ChoiceGroup)[] = [
	any,
	...MAKER_LIST.filter(({ key }) => key !== 'other').map(({ key, name, divisions }) => {
		const own = divisions.filter((division) => isOwnName(division.name));
		const whole = { value: key, label: own.length === 0 ? name : words.wholeMaker(name) };
		return {
			label: name,
			choices: [
				whole,
				...own.map((division) => ({ value: division.name.toLowerCase(), label: division.name }))
			]
		};
	})
];

/** Options of all makers, with one of them chosen. */
export const makerOptions = readyOptions(makerChoices);

const names = new Map(
	makerChoices
		.flatMap((choice) => ('choices' in choice ? choice.choices : []))
		.map(({ value, label }) => [value, label])
);
/** The name of a choice; empty for none. */
export const makerNameOf = (choice: string): string => names.get(choice) ?? '';

/** The corporation that a name stands for or belongs to, for the drawing of places; empty for none. */
export const corporationOf = (name: string): string => makerNamed(name)?.maker ?? '';

/** The choice that a name stands for; empty when it is none. */
export function makerChoice(name: string): string {
	const named = makerNamed(name);
	if (named === null) return '';
	return named.division?.toLowerCase() ?? named.maker;
}

const optionsTo = new Map<number, ReturnType<typeof readyOptions>>();

/** Options of model years from the first that we speak of to the next, with one of them chosen. */
export function yearOptions(now: Date): (chosen: string) => string {
	const last = now.getUTCFullYear() + 1;
	const known = optionsTo.get(last);
	if (known) return known;
	const years = Array.from({ length: last - FIRST_YEAR + 1 }, (_, offset) => {
		const year = String(FIRST_YEAR + offset);
		return { value: year, label: year };
	});
	const options = readyOptions([any, ...years]);
	optionsTo.set(last, options);
	return options;
}
