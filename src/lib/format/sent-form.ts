import { accountsText } from '../text/en/accounts';
import type { FaultTexts, FormRefusal } from '../types';

/** A form of a page, as it came back or as it is at first. */
export interface SentForm {
	/** The sentence beside a field; undefined when nothing is wrong with it. */
	readonly fault: (field: string) => { readonly message: string } | undefined;
	/** What stands in a field: what was typed, or else what stood there before. */
	readonly typed: (field: string, otherwise?: string) => string;
	/** The sentence over the form as a whole. */
	readonly problem: string | undefined;
}

/**
 * What to show of a form.
 * @param refusal of the page's last action, of whichever of its forms
 * @param texts sentences by field and code
 */
export function sentForm(
	refusal: Partial<FormRefusal> | null | undefined,
	form: string,
	texts: FaultTexts
): SentForm {
	const mine = refusal?.form === form ? refusal : {};
	const { faults = {}, typed = {}, wait = 1 } = mine;
	const { other, tooOften } = accountsText.faults;
	const sentence = (field: string): string | undefined => {
		const code = faults[field];
		if (code === undefined) return undefined;
		return code === 'too_often' ? tooOften(wait) : (texts[field]?.[code] ?? other);
	};
	return {
		fault: (field) => {
			const message = sentence(field);
			return message === undefined ? undefined : { message };
		},
		typed: (field, otherwise = '') => typed[field] ?? otherwise,
		problem: sentence('form')
	};
}
