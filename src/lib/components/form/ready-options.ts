import type { Choice, ChoiceGroup } from './SelectField.svelte';

const ESCAPED: Readonly<Record<string, string>> = {
	'&': '&amp;',
	'<': '&lt;',
	'>': '&gt;',
	'"': '&quot;'
};
const escaped = (text: string): string => text.replace(/[&<>"]/g, (mark) => ESCAPED[mark]!);

const optionOf = ({ value, label }: Choice): string =>
	`<option value="${escaped(value)}">${escaped(label)}</option>`;

/**
 * Options written once for all pages that show them: a list of a hundred costs more to draw than the rest of a form.
 * @returns the HTML of the options, with one of them chosen
 */
export function readyOptions(
	choices: readonly (Choice | ChoiceGroup)[]
): (chosen: string) => string {
	const html = choices
		.map((choice) =>
			'choices' in choice
				? `<optgroup label="${escaped(choice.label)}">${choice.choices.map(optionOf).join('')}</optgroup>`
				: optionOf(choice)
		)
		.join('');
	return (chosen) => {
		const start = `<option value="${escaped(chosen)}"`;
		return html.replace(`${start}>`, () => `${start} selected>`);
	};
}
