/** What holds of the parts of a correction before the tables are looked at: what they rest on, weigh and repeat. Pure. */
import type { CorrectionPart, Evidence, PartKind } from '../../types';
import { valueText } from '../reference';

/**
 * Whether something can be sent on this: it says where it stands and shows it, in words or in a picture. From memory
 * there is nothing to show, and the row stays thin.
 */
export const isCited = ({ kind, locator, address, quotation, photograph }: Evidence): boolean =>
	kind === 'memory' ||
	((locator !== '' || address !== '') && (quotation !== '' || photograph !== null));

/** Whether every part has something to rest on. */
export const areCited = (parts: readonly CorrectionPart[]): boolean =>
	parts.every(({ evidence }) => evidence.some(isCited));

/** How much of a reader's attention a part asks for. */
const POINTS: Readonly<Record<PartKind, 1 | 3 | 5>> = {
	add_row: 1,
	add_source: 1,
	add_claim: 1,
	change_row: 3,
	correct_source: 3,
	repeat_source: 3,
	change_claim: 3,
	retire_row: 5,
	withdraw_source: 5,
	retire_claim: 5
};
/** Points that somebody may have open at a time, at first and once so many of their corrections were accepted. */
export const OPEN_POINTS = { first: 30, trusted: 120, trusted_after: 10 } as const;

export const pointsOf = (parts: readonly Pick<CorrectionPart, 'kind'>[]): number =>
	parts.reduce((sum, { kind }) => sum + POINTS[kind], 0);

/**
 * Points that are left to somebody; below zero where more is open than may be.
 * @param open all parts of their corrections that are sent and not decided
 * @param accepted how many of their corrections were accepted
 */
export const pointsLeft = (
	open: readonly Pick<CorrectionPart, 'kind'>[],
	accepted: number
): number =>
	(accepted >= OPEN_POINTS.trusted_after ? OPEN_POINTS.trusted : OPEN_POINTS.first) -
	pointsOf(open);

/** The entry that a part speaks of. */
export function entryOf(part: CorrectionPart): string {
	switch (part.kind) {
		case 'add_row':
		case 'change_row':
			return `row ${part.row.row_key}`;
		case 'retire_row':
			return `row ${part.row_key}`;
		case 'add_source':
		case 'correct_source':
			return `source ${part.source.key}`;
		case 'repeat_source':
		case 'withdraw_source':
			return `source ${part.key}`;
		case 'add_claim':
		case 'change_claim':
			return `claim ${part.claim.claim_key}`;
		case 'retire_claim':
			return `claim ${part.claim_key}`;
	}
}

/** What a part asks for, whoever asks and whatever it rests on. */
export const askedText = ({ evidence: _, ...asked }: CorrectionPart): string => valueText(asked);

/** The parts with those that ask for the same joined in the first of them, which then rests on the evidence of all. */
export function joined(parts: readonly CorrectionPart[]): CorrectionPart[] {
	const first = new Map<string, CorrectionPart>();
	for (const part of parts) {
		const text = askedText(part);
		const before = first.get(text);
		if (before === undefined) {
			first.set(text, part);
			continue;
		}
		const known = new Set(before.evidence.map(valueText));
		const further = part.evidence.filter((evidence) => !known.has(valueText(evidence)));
		first.set(text, { ...before, evidence: [...before.evidence, ...further] });
	}
	return [...first.values()];
}
