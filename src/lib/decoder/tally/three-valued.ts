/** Kleene's three-valued logic: true, false, and null for "cannot be told". */
export type Truth = boolean | null;

export const not = (value: Truth): Truth => (value === null ? null : !value);

/** False as soon as one is false; true when all are true. */
export function all(values: readonly Truth[]): Truth {
	if (values.includes(false)) return false;
	return values.includes(null) ? null : true;
}

/** True as soon as one is true; false when all are false. */
export const any = (values: readonly Truth[]): Truth => not(all(values.map(not)));

/** What all of a set agree on: true or false when every one is, else null. An empty set tells nothing. */
export function unanimous(values: readonly Truth[]): Truth {
	const [first = null] = values;
	return values.every((value) => value === first) ? first : null;
}
