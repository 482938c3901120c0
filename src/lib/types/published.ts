import type { StampKind } from './readings';

/** Makers whose published examples stand in files of their own. */
export const KNOWN_MAKERS = ['gm', 'chrysler', 'ford', 'amc'] as const;

/** The worked examples of published pages that the tables are held against. */
export interface PublishedExamples {
	/** How many are met, of how many, by kind of stamp. */
	readonly kinds: readonly {
		readonly kind: StampKind;
		readonly met: number;
		readonly of: number;
	}[];
	/** Those that the tables knowingly disagree with. */
	readonly misses: readonly {
		readonly text: string;
		readonly kind: StampKind;
		readonly source: string;
		readonly reason: string;
	}[];
}
