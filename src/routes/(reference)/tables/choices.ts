/** What the forms of the tables offer. */
import type { Choice, ChoiceGroup } from '$lib/components/form/SelectField.svelte';
import type { TableSet } from '$lib/decoder';
import { tablesText } from '$lib/text/en/tables';
import {
	DIVISIONS,
	MAKER_NAMES,
	MAKERS,
	STRENGTHS,
	TABLE_NAMES,
	tableDefinition,
	type Maker,
	type TableDefinition
} from '$lib/types';

const text = tablesText.find;
type Choices = readonly (Choice | ChoiceGroup)[];

/** Tables with rows of any maker, those that are looked up first. */
export function tableChoices({ tables }: TableSet): Choices {
	const present = new Set([...tables.values()].map(({ table }) => table));
	const group = (label: string, sort: TableDefinition['sort']) => ({
		label,
		choices: TABLE_NAMES.filter(
			(name) => present.has(name) && tableDefinition(name).sort === sort
		).map((name) => ({ value: name, label: tableDefinition(name).label }))
	});
	return [
		{ value: '', label: text.allTables },
		...[group(text.codeTables, 'code'), group(text.knowledgeTables, 'knowledge')].filter(
			({ choices }) => choices.length > 0
		)
	];
}

/** Makes under their corporations; of corporations with tables only. */
export function divisionChoices({ tables }: TableSet): Choices {
	const present = new Set([...tables.values()].map(({ maker }) => maker));
	return [
		{ value: '', label: text.allDivisions },
		...MAKERS.filter((maker) => present.has(maker)).map((maker) => ({
			label: MAKER_NAMES[maker],
			choices: [
				{ value: MAKER_NAMES[maker], label: text.allOf(MAKER_NAMES[maker]) },
				...DIVISIONS[maker].map((division) => ({ value: division, label: division }))
			]
		}))
	];
}

/** Makes of one corporation; none when there is nothing to choose. */
export function divisionsOf(maker: Maker): readonly Choice[] {
	const divisions: readonly string[] = DIVISIONS[maker];
	if (divisions.length < 2) return [];
	return [
		{ value: '', label: text.allDivisions },
		...divisions.map((division) => ({ value: division, label: division }))
	];
}

export const strengthChoices: readonly Choice[] = [
	{ value: '', label: text.allStrengths },
	...STRENGTHS.map((strength) => ({ value: strength, label: tablesText.strengthOf[strength] }))
];
