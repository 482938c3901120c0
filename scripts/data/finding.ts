/** Something in the data folder that breaks a rule. `file` is relative to the folder, `line` counts from 1. */
export interface Finding {
	readonly file: string;
	readonly line: number;
	readonly message: string;
}

/** A record of a file together with where it stands. */
export interface Placed<T> {
	readonly value: T;
	readonly file: string;
	readonly line: number;
}

/** A finding about a record. */
export const at = (
	{ file, line }: Pick<Placed<unknown>, 'file' | 'line'>,
	message: string
): Finding => ({ file, line, message });
