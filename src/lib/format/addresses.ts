/** What a reading was asked with; what is empty is left out of the address. */
export interface ReadingQuery {
	readonly kind?: string | null;
	readonly text: string;
	readonly maker?: string | null;
	readonly year?: number | string | null;
	readonly edition?: number | string | null;
	/** Which of several readings is shown, from 1; the first needs no word. */
	readonly reading?: number;
}

/**
 * Address of a reading. With an edition it is permanent. Parts stand in one order, so that one reading has one address.
 * @example readingAddress({ kind: 'serial', text: 'RH23L0E9?4127' }) // '/?kind=serial&text=RH23L0E9%3F4127'
 */
export function readingAddress(query: ReadingQuery): string {
	const { kind, text, maker, year, edition, reading } = query;
	const parts: [string, string | number | null | undefined][] = [
		['kind', kind],
		['text', text],
		['maker', maker],
		['year', year],
		['edition', edition],
		['reading', reading !== undefined && reading > 1 ? reading : null]
	];
	const given = parts
		.filter(([, value]) => value !== null && value !== undefined && value !== '')
		.map(([name, value]) => `${name}=${encodeURIComponent(String(value))}`);
	return `/?${given.join('&')}`;
}

export const rowAddress = (rowKey: string): string => `/rows/${encodeURIComponent(rowKey)}`;
export const sourceAddress = (key: string): string => `/sources/${encodeURIComponent(key)}`;

/** What the tag page is asked with. */
export interface TagQuery {
	readonly maker: string;
	readonly year: string;
	readonly serial: string;
	/** As they stand on the tag, from the top; blank ones keep their places. */
	readonly lines: readonly string[];
}

/** @example tagAddress({ maker: 'gm', year: '', serial: '', lines: ['ST 70'] }) // '/tag?maker=gm&text=ST%2070' */
export function tagAddress({ maker, year, serial, lines }: TagQuery): string {
	const given = [
		...[
			['maker', maker],
			['year', year],
			['serial', serial]
		].filter(([, value]) => value !== ''),
		...lines.map((line) => ['text', line])
	].map(([name = '', value = '']) => `${name}=${encodeURIComponent(value)}`);
	return given.length === 0 ? '/tag' : `/tag?${given.join('&')}`;
}

/** Where the stamps of a maker's cars sit. @example whereAddress('Plymouth', 1970) // '/where?maker=plymouth&year=1970' */
export const whereAddress = (maker: string, year: number | null): string =>
	`/where?maker=${encodeURIComponent(maker.toLowerCase())}${year === null ? '' : `&year=${year}`}`;
