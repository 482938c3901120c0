/** What the tables are once parts of a correction are made, and why a part cannot be made. Pure. */
import type { correctionsText } from '../../text/en/corrections';
import type { Claim, CorrectionPart, ReferenceRow, Source } from '../../types';
import {
	claimText,
	entryText,
	sourceText,
	valueText,
	type Changes,
	type ContentChanges,
	type Entries,
	type RowEntry
} from '../reference';
import { entryOf } from './parts';

export type FaultCode = keyof typeof correctionsText.faults;
export interface PartFault {
	/** Which part, from 0. */
	readonly part: number;
	readonly code: FaultCode;
}
export interface Applied {
	/** Parts that cannot be made. Where there is one, nothing is to be written. */
	readonly faults: readonly PartFault[];
	readonly changes: ContentChanges;
	/** All entries as they then stand. */
	readonly entries: Entries;
}

interface Draft {
	readonly rows: Map<string, RowEntry>;
	readonly sources: Map<string, Source>;
	readonly claims: Map<string, Claim>;
}

function put<T>(
	entries: Map<string, T>,
	key: string,
	entry: T,
	how: { readonly isNew: boolean; readonly textOf: (entry: T) => string }
): FaultCode | null {
	const today = entries.get(key);
	if (today !== undefined && how.textOf(today) === how.textOf(entry)) return 'same_as_today';
	if ((today === undefined) !== how.isNew) return how.isNew ? 'already_there' : 'not_there';
	entries.set(key, entry);
	return null;
}

const remove = (entries: Map<string, unknown>, key: string): FaultCode | null =>
	entries.delete(key) ? null : 'not_there';

/** What a row says, under whatever key. */
const saidBy = ({ row_key: _, note: __, ...said }: ReferenceRow): string => valueText(said);

function putRow(
	{ rows }: Draft,
	part: Extract<CorrectionPart, { kind: 'add_row' | 'change_row' }>
): FaultCode | null {
	const { row, citations } = part;
	const today = rows.get(row.row_key)?.row;
	if (part.kind === 'change_row' && today !== undefined)
		if (today.maker !== row.maker || today.table !== row.table) return 'other_table';
	const isNew = part.kind === 'add_row';
	return put(rows, row.row_key, { row, citations }, { isNew, textOf: entryText });
}

/** A source goes, with every citation of it and every claim that rests on it; rows stay, and say how well they still stand. */
function withdraw({ rows, sources, claims }: Draft, key: string): FaultCode | null {
	for (const [row_key, { row, citations }] of rows) {
		const left = citations.filter(({ source }) => source !== key);
		if (left.length < citations.length) rows.set(row_key, { row, citations: left });
	}
	for (const [claim_key, { source }] of claims) if (source === key) claims.delete(claim_key);
	return remove(sources, key);
}

function make(draft: Draft, part: CorrectionPart): FaultCode | null {
	switch (part.kind) {
		case 'add_row':
		case 'change_row':
			return putRow(draft, part);
		case 'retire_row':
			return remove(draft.rows, part.row_key);
		case 'add_source':
		case 'correct_source': {
			const isNew = part.kind === 'add_source';
			return put(draft.sources, part.source.key, part.source, { isNew, textOf: sourceText });
		}
		case 'repeat_source': {
			const today = draft.sources.get(part.key);
			if (today === undefined) return 'not_there';
			const source = { ...today, repeats: part.repeats };
			return put(draft.sources, part.key, source, { isNew: false, textOf: sourceText });
		}
		case 'withdraw_source':
			return withdraw(draft, part.key);
		case 'add_claim':
		case 'change_claim': {
			const isNew = part.kind === 'add_claim';
			return put(draft.claims, part.claim.claim_key, part.claim, { isNew, textOf: claimText });
		}
		case 'retire_claim':
			return remove(draft.claims, part.claim_key);
	}
}

/** Whether a chain of copies bites its tail. */
function repeatsItself(key: string, sources: ReadonlyMap<string, Source>): boolean {
	const seen = new Set<string>();
	for (let at: string | null | undefined = key; at; at = sources.get(at)?.repeats) {
		if (seen.has(at)) return true;
		seen.add(at);
	}
	return false;
}

function isSaidElsewhere(row: ReferenceRow, rows: ReadonlyMap<string, RowEntry>): boolean {
	const said = saidBy(row);
	for (const { row: other } of rows.values())
		if (other.code === row.code && other.row_key !== row.row_key && saidBy(other) === said)
			return true;
	return false;
}

/** What a part leaves that cannot stand, once all parts are made: the same said twice, a work that is cited and is not there. */
function leaves(part: CorrectionPart, { rows, sources, claims }: Draft): FaultCode | null {
	switch (part.kind) {
		case 'add_row':
		case 'change_row': {
			const citations = rows.get(part.row.row_key)?.citations ?? [];
			if (!citations.every(({ source }) => sources.has(source))) return 'unknown_source';
			return isSaidElsewhere(part.row, rows) ? 'said_elsewhere' : null;
		}
		case 'add_source':
		case 'correct_source':
		case 'repeat_source': {
			const key = part.kind === 'repeat_source' ? part.key : part.source.key;
			const repeats = sources.get(key)?.repeats ?? null;
			if (repeats !== null && !sources.has(repeats)) return 'unknown_source';
			return repeatsItself(key, sources) ? 'repeats_itself' : null;
		}
		case 'withdraw_source':
			return [...sources.values()].some(({ repeats }) => repeats === part.key)
				? 'still_repeated'
				: null;
		case 'add_claim':
		case 'change_claim': {
			const kind = sources.get(claims.get(part.claim.claim_key)?.source ?? '')?.kind;
			if (kind === undefined) return 'unknown_source';
			return kind === 'memory' || kind === 'common_practice' ? 'claim_from_memory' : null;
		}
		default:
			return null;
	}
}

function changesBetween<T>(
	before: ReadonlyMap<string, T>,
	now: ReadonlyMap<string, T>,
	textOf: (entry: T) => string
): Changes<T> {
	const changes: Changes<T> = { put: [], retire: [] };
	for (const [key, entry] of now) {
		const old = before.get(key);
		if (old !== entry && (old === undefined || textOf(old) !== textOf(entry)))
			changes.put.push(entry);
	}
	for (const key of before.keys()) if (!now.has(key)) changes.retire.push(key);
	return changes;
}

/** Everything that is otherwise in the second entries than in the first. */
export const changesOf = (before: Entries, now: Entries): ContentChanges => ({
	rows: changesBetween(before.rows, now.rows, entryText),
	sources: changesBetween(before.sources, now.sources, sourceText),
	claims: changesBetween(before.claims, now.claims, claimText)
});

const WITHDRAWALS_FIRST = (part: CorrectionPart): number =>
	part.kind === 'withdraw_source' ? 0 : 1;

/**
 * Makes the parts on the tables as they stand. Their order makes no difference: each speaks of an entry of its own, and
 * withdrawals are made first, so that no other part is stripped of a citation in silence.
 */
export function apply(before: Entries, parts: readonly CorrectionPart[]): Applied {
	const draft: Draft = {
		rows: new Map(before.rows),
		sources: new Map(before.sources),
		claims: new Map(before.claims)
	};
	const faults = new Map<number, FaultCode>();
	const spoken = new Set<string>();
	const ordered = parts
		.map((part, index) => ({ part, index }))
		.sort((a, b) => WITHDRAWALS_FIRST(a.part) - WITHDRAWALS_FIRST(b.part));
	for (const { part, index } of ordered) {
		const entry = entryOf(part);
		const code = spoken.has(entry) ? 'twice' : make(draft, part);
		spoken.add(entry);
		if (code !== null) faults.set(index, code);
	}
	for (const { part, index } of ordered) {
		const code = faults.has(index) ? null : leaves(part, draft);
		if (code !== null) faults.set(index, code);
	}
	return {
		faults: [...faults].sort(([a], [b]) => a - b).map(([part, code]) => ({ part, code })),
		changes: changesOf(before, draft),
		entries: draft
	};
}
