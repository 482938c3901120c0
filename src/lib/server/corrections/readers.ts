/** How many moderators a correction needs, and why two. Pure. */
import type { TableSet } from '../../decoder';
import type { correctionsText } from '../../text/en/corrections';
import type { CorrectionPart } from '../../types';
import type { EffectSheet } from './effect';

/** More saved readings than this that change ask for a second reader. */
export const READINGS_FOR_TWO = 25;

/** Why a second moderator reads it. */
export type SecondReaderReason = keyof typeof correctionsText.secondReader;

export interface ForReaders {
	readonly author: string;
	readonly parts: readonly CorrectionPart[];
	readonly sheet: EffectSheet;
	/** The tables as they stand, and as they would be. */
	readonly before: TableSet;
	readonly after: TableSet;
}

const rowsOf = (parts: readonly CorrectionPart[]): string[] =>
	parts.flatMap((part) => {
		if (part.kind === 'retire_row') return [part.row_key];
		return 'row' in part ? [part.row.row_key] : [];
	});

/**
 * Every reason for a second reader; with none, one is enough. Whether a change is a gain for the author's own car is not
 * weighed: that anything of it changes is enough.
 */
export function reasonsForTwo({
	author,
	parts,
	sheet,
	before,
	after
}: ForReaders): SecondReaderReason[] {
	const isContested = (key: string): boolean =>
		[before, after].some(({ rows }) => rows.get(key)?.strength === 'contested');
	const holds: Readonly<Record<SecondReaderReason, boolean>> = {
		flips: sheet.changed.some(({ flips }) => flips.length > 0),
		many: sheet.changed.length > READINGS_FOR_TWO,
		retires: parts.some(({ kind }) => kind === 'retire_row'),
		contested: rowsOf(parts).some(isContested),
		own_car: sheet.changed.some(({ owner }) => owner === author)
	};
	return (Object.keys(holds) as SecondReaderReason[]).filter((reason) => holds[reason]);
}

export const readersFor = (asked: ForReaders): 1 | 2 => (reasonsForTwo(asked).length > 0 ? 2 : 1);
