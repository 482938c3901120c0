/** Where a list of pages stands. Numbers from 1. */
export interface Paging {
	readonly page: number;
	readonly of: number;
	/** Addresses of the pages around it; null where there is none. */
	readonly previous: string | null;
	readonly next: string | null;
}

/** The same address with some parameters set otherwise; null takes one away. Those that are empty are left out. */
export function withParameters(
	url: URL,
	changes: Readonly<Record<string, string | number | null>>,
	fragment = ''
): string {
	const parameters = new URLSearchParams();
	for (const [name, value] of url.searchParams)
		if (value !== '' && !(name in changes)) parameters.append(name, value);
	for (const [name, value] of Object.entries(changes))
		if (value !== null && value !== '') parameters.set(name, String(value));
	const query = parameters.toString();
	return `${url.pathname}${query && `?${query}`}${fragment && `#${fragment}`}`;
}

/** The pages around one, of a list that is so long. */
export function pagingOf(
	url: URL,
	page: number,
	total: number,
	size: number,
	fragment = ''
): Paging {
	const of = Math.max(1, Math.ceil(total / size));
	const address = (n: number) => withParameters(url, { page: n === 1 ? null : n }, fragment);
	return {
		page,
		of,
		previous: page > 1 ? address(Math.min(page - 1, of)) : null,
		next: page < of ? address(page + 1) : null
	};
}

/**
 * The page that an address asks for, and the part of a list that it shows. A number beyond the last page
 * means the last.
 */
export function pageOfList<T>(
	url: URL,
	list: readonly T[],
	size: number,
	fragment = ''
): { readonly items: readonly T[]; readonly paging: Paging } {
	const of = Math.max(1, Math.ceil(list.length / size));
	const asked = Number(url.searchParams.get('page') ?? 1);
	const page = Number.isInteger(asked) ? Math.min(Math.max(asked, 1), of) : 1;
	return {
		items: list.slice((page - 1) * size, page * size),
		paging: pagingOf(url, page, list.length, size, fragment)
	};
}
