/** How well a row is supported, computed from its citations: never typed. */
import type { Citation, Source, SourceKind, Strength } from '../../types';
import { decoderText as text } from '../../text/en/decoder';

export interface StrengthFinding {
	readonly strength: Exclude<Strength, 'contested'>;
	/** What it rests on, in a sentence. */
	readonly why: string;
	/** Whether anything above memory and common practice speaks for the row. */
	readonly cited: boolean;
}

const AUTHORITIES: ReadonlySet<SourceKind> = new Set(['factory_paper', 'law', 'standard']);
const RESEARCH: ReadonlySet<SourceKind> = new Set(['book', 'club_research']);
const UNPUBLISHED: ReadonlySet<SourceKind> = new Set(['memory', 'common_practice']);
const LOWERED: Readonly<Record<StrengthFinding['strength'], StrengthFinding['strength']>> = {
	firm: 'fair',
	fair: 'thin',
	thin: 'not_rated',
	not_rated: 'not_rated'
};

/** The work at the end of a chain of copies: copies count once. A chain that bites its tail ends where it began. */
function origin(key: string, sources: ReadonlyMap<string, Source>): string {
	const seen = new Set<string>();
	let current = key;
	while (!seen.has(current)) {
		seen.add(current);
		const repeats = sources.get(current)?.repeats;
		if (repeats === null || repeats === undefined) return current;
		current = repeats;
	}
	return key;
}

const rate = (kinds: readonly SourceKind[], carsFor: number, carsAgainst: number) => {
	const has = (set: ReadonlySet<SourceKind>) => kinds.some((kind) => set.has(kind));
	const published = kinds.filter((kind) => !UNPUBLISHED.has(kind));
	if (has(AUTHORITIES)) return 'firm';
	if (published.length >= 2 && has(RESEARCH)) return 'firm';
	if (has(RESEARCH) || kinds.includes('magazine') || published.length >= 2) return 'fair';
	if (carsFor >= 3 && carsAgainst === 0) return 'fair';
	if (kinds.length > 0 || carsFor > 0) return 'thin';
	return 'not_rated';
};

/**
 * Rates one row. Sources read by title only count as nothing; cars seen count as cars, not as works.
 * @param citations those of this row, for and against
 */
export function strengthOf(
	citations: readonly Citation[],
	sources: ReadonlyMap<string, Source>
): StrengthFinding {
	const kinds = new Map<string, SourceKind>();
	let carsFor = 0;
	let carsAgainst = 0;
	let against = 0;
	for (const citation of citations) {
		const source = sources.get(citation.source);
		if (source === undefined || citation.read === 'title') continue;
		const isFor = citation.stance === 'for';
		if (source.kind === 'car_seen') {
			if (isFor) carsFor += 1;
			else carsAgainst += 1;
		} else if (isFor) {
			const root = origin(citation.source, sources);
			kinds.set(root, sources.get(root)?.kind ?? source.kind);
		} else against += 1;
	}
	const list = [...kinds.values()];
	const rated = rate(list, carsFor, carsAgainst);
	const strength = carsAgainst > 0 ? LOWERED[rated] : rated;
	return {
		strength,
		why: text.strengthWhy(list, carsFor, carsAgainst, against),
		cited: carsFor > 0 || list.some((kind) => !UNPUBLISHED.has(kind))
	};
}
