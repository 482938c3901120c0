/** Asks one table what a code means under the scope that is known so far. */
import { FIRST_YEAR, LAST_YEAR, type Claim, type ScopeColumn } from '../../types';
import { isRead, mayBe, type Cell } from './characters';
import { saysTheSame } from './compare';
import { rowsInYear, type CodeEntry, type CompiledRow, type CompiledTable } from './table-set';

/** What is known of the car while a reading is made; a missing value is unknown. */
export interface Scope {
	readonly year: number | null;
	division?: string;
	line?: readonly string[];
	body?: string;
	engine?: string;
	plant?: string;
}

export type Answer =
	/** One meaning; several rows when they say the same. */
	| { readonly kind: 'found'; readonly rows: readonly CompiledRow[] }
	/** Cited rows that differ: one group a meaning. */
	| { readonly kind: 'contested'; readonly groups: readonly (readonly CompiledRow[])[] }
	/** Rows exist, but which of them holds turns on something unknown. */
	| { readonly kind: 'depends'; readonly on: ScopeColumn; readonly rows: readonly CompiledRow[] }
	| { readonly kind: 'missing' };

const MISSING: Answer = { kind: 'missing' };
/** The column that leaves it open whether a row holds, null when it holds, false when it does not. */
function openColumn(row: CompiledRow, scope: Scope): ScopeColumn | null | false {
	let open: ScopeColumn | null = null;
	for (const column of row.scoped) {
		const wanted = row[column];
		const known = scope[column];
		if (known === undefined) {
			open ??= column;
			continue;
		}
		if (typeof known === 'string') {
			if (!wanted.includes(known)) return false;
			continue;
		}
		const meeting = known.filter((value) => wanted.includes(value)).length;
		if (meeting === 0) return false;
		if (meeting < known.length) open ??= column;
	}
	return open;
}

function groupByMeaning(rows: readonly CompiledRow[]): CompiledRow[][] {
	const groups: CompiledRow[][] = [];
	for (const row of rows) {
		const own = groups.find((group) => saysTheSame(group[0] as CompiledRow, row));
		if (own === undefined) groups.push([row]);
		else own.push(row);
	}
	return groups;
}

/** One meaning among rows that all hold: the narrowest stand before wider ones, cited before memory. */
function settle(rows: readonly CompiledRow[]): Answer {
	if (rows.length === 1) return { kind: 'found', rows };
	const narrowest = Math.max(...rows.map((row) => row.narrowness));
	const groups = groupByMeaning(rows.filter((row) => row.narrowness === narrowest));
	if (groups.length === 1) return { kind: 'found', rows: groups[0] as CompiledRow[] };
	const cited = groups.filter((group) => group.some((row) => row.cited));
	if (cited.length === 1) return { kind: 'found', rows: cited[0] as CompiledRow[] };
	return { kind: 'contested', groups: cited.length > 1 ? cited : groups };
}

/** Chooses among the rows of one code. */
export function choose(candidates: readonly CompiledRow[], scope: Scope): Answer {
	if (candidates.length === 0) return MISSING;
	const [only] = candidates;
	if (only !== undefined && candidates.length === 1 && openColumn(only, scope) === null)
		return { kind: 'found', rows: candidates };
	const holding: CompiledRow[] = [];
	const open: CompiledRow[] = [];
	let on: ScopeColumn = 'line';
	for (const row of candidates) {
		const column = openColumn(row, scope);
		if (column === false) continue;
		if (column === null) holding.push(row);
		else {
			if (open.length === 0) on = column;
			open.push(row);
		}
	}
	// A row for one market stands only where no row holds for all.
	const unbound = holding.filter((row) => row.market.length === 0);
	const sure = unbound.length > 0 ? unbound : holding;
	if (open.length === 0) return sure.length === 0 ? MISSING : settle(sure);
	const all = [...sure, ...open];
	// Only a row that surely holds can carry those that may: alone, they name a line or plant that nobody has read.
	if (sure.length > 0 && groupByMeaning(all).length === 1) return { kind: 'found', rows: all };
	return { kind: 'depends', on, rows: all };
}

/** Asks a table what a code means. */
export function lookUp(table: CompiledTable | undefined, code: string, scope: Scope): Answer {
	const entry = table?.byCode.get(code);
	return entry === undefined ? MISSING : choose(rowsInYear(entry, scope.year), scope);
}

/** Asks a table whose rows are found by scope; rows of the plant's own code come with those of none. */
export function lookUpByScope(table: CompiledTable | undefined, scope: Scope): Answer {
	const plant = scope.plant === undefined ? undefined : table?.byCode.get(scope.plant);
	const open = table?.byCode.get('');
	for (const entry of [plant, open]) {
		if (entry === undefined) continue;
		const answer = choose(rowsInYear(entry, scope.year), scope);
		if (answer.kind !== 'missing') return answer;
	}
	return MISSING;
}

/** The codes that a text with unread places may stand for and that have rows. */
export function entriesMatching(
	table: CompiledTable | undefined,
	cells: readonly Cell[]
): CodeEntry[] {
	if (table === undefined) return [];
	if (cells.every(isRead)) {
		const entry = table.byCode.get(cells.join(''));
		return entry === undefined ? [] : [entry];
	}
	const matching: CodeEntry[] = [];
	for (const entry of table.byCode.values()) {
		if (entry.code.length !== cells.length) continue;
		if (cells.every((cell, index) => mayBe(cell, entry.code.charAt(index)))) matching.push(entry);
	}
	return matching;
}

/** The claim of completeness that covers this scope whole, if there is one. */
export function claimFor(table: CompiledTable | undefined, scope: Scope): Claim | undefined {
	const { year, division, line } = scope;
	if (year === null) return undefined;
	return table?.claims.find(
		(claim) =>
			(claim.years_from ?? FIRST_YEAR) <= year &&
			year <= (claim.years_to ?? LAST_YEAR) &&
			(claim.division.length === 0 ||
				(division !== undefined && claim.division.includes(division))) &&
			(claim.line.length === 0 ||
				(line !== undefined && line.every((name) => claim.line.includes(name))))
	);
}
