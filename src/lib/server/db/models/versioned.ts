/** Live from `edition_from` until before `edition_to`; null means live now. */
export interface Versioned {
	version: number;
	edition_from: number;
	edition_to: number | null;
}
