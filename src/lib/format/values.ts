import { otherValueWords, valueText, valueWords } from '../text/en/values';
import type { Facts, RowValues } from '../types';

/** A typed fact of a row, its unit written out. */
export interface ValueCell {
	readonly name: string;
	readonly label: string;
	readonly value: string;
}

const listed = (values: unknown): string[] => (Array.isArray(values) ? values.map(String) : []);

/** A condition of a package or rule: "engine is N or H". */
function conditionWords(condition: Readonly<Record<string, unknown>>): string {
	const attribute = String(condition['attribute'] ?? condition['item'] ?? '').replaceAll('_', ' ');
	if (condition['item'] !== undefined) return attribute;
	const any = listed(condition['any_of']);
	const none = listed(condition['none_of']);
	const parts = [
		...(any.length > 0 ? [valueText.anyOf(attribute, any)] : []),
		...(none.length > 0 ? [valueText.noneOf(attribute, none)] : [])
	];
	return parts.length > 0 ? parts.join(', ') : valueText.is(attribute);
}

const isObject = (value: unknown): value is Readonly<Record<string, unknown>> =>
	typeof value === 'object' && value !== null && !Array.isArray(value);

function plainWords(value: unknown): string {
	if (Array.isArray(value)) return value.map(plainWords).join('; ');
	return isObject(value) ? conditionWords(value) : String(value);
}

function factWords(name: keyof Facts, value: unknown): string {
	if (name === 'locking') return valueText.locking(value === true);
	if (name === 'month') return valueText.month(Number(value));
	const shown = name === 'units_built' ? valueText.built(Number(value)) : plainWords(value);
	return valueWords[name][1].replace('#', () => shown);
}

const isFact = (name: string): name is keyof Facts => Object.hasOwn(valueWords, name);

const ORDER = [...Object.keys(valueWords), ...Object.keys(otherValueWords)];
const place = (name: string): number => (ORDER.includes(name) ? ORDER.indexOf(name) : ORDER.length);

/**
 * Typed facts in words, in the order in which the words are listed; a name we have no words for stands last.
 * @example valueCells({ displacement_cuin: 383 }) // [{ label: 'Displacement', value: '383 cubic inches', … }]
 */
export function valueCells(values: RowValues): ValueCell[] {
	return Object.entries(values)
		.filter(([, value]) => value !== undefined)
		.sort(([a], [b]) => place(a) - place(b))
		.map(([name, value]) => {
			if (isFact(name)) return { name, label: valueWords[name][0], value: factWords(name, value) };
			const label = otherValueWords[name] ?? name.replaceAll('_', ' ');
			const words = valueText.addedLater[String(value)];
			return {
				name,
				label,
				value: name === 'added_later' && words !== undefined ? words : plainWords(value)
			};
		});
}

/** A screen's approximation of a paint, "#RRGGBB"; null when the row has none. */
export const swatchOf = (values: RowValues): string | null =>
	typeof values['hex_approximate'] === 'string' ? values['hex_approximate'] : null;
