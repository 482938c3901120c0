/**
 * The interface's client, for our own pages: the same functions in the browser and, with the framework's
 * `fetch`, on the server. It takes types alone from the schemas, so that no schema reaches the browser.
 */
import type {
	EditionDetail,
	EditionsAnswer,
	ItemsAnswer,
	LayoutsAnswer,
	MakersAnswer,
	ProblemDetails,
	RowDetail,
	RowHistoryAnswer,
	SourceDetail,
	SourcesAnswer,
	TableAnswer,
	TablesAnswer
} from '../types/api';
import type {
	EditionQuery,
	ItemsQuery,
	ListQuery,
	ReadingBody,
	ReadingQuery,
	SourcesQuery,
	TableQuery,
	TablesQuery
} from '../types/api-requests';
import type { Maker } from '../types/makers';
import type { ReadAnswer } from '../types/readings';
import type { TableName } from '../types/tables';

/** The interface refused, and says why. */
export class ApiProblem extends Error {
	override readonly name = 'ApiProblem';
	/** Seconds to wait where the refusal names them. */
	readonly retryAfter: number | null;

	constructor(
		readonly problem: ProblemDetails,
		retryAfter: string | null
	) {
		super(problem.detail);
		this.retryAfter = retryAfter === null ? null : Number(retryAfter);
	}

	get status(): number {
		return this.problem.status;
	}
}

/** The interface was not reached, or something that is not ours answered in its place. */
export class ApiUnreachable extends Error {
	override readonly name = 'ApiUnreachable';
}

type Query = Readonly<Record<string, string | number | undefined>>;

/** Parameters in the order in which they are given; what is undefined or empty is left out. */
function queryString(query: Query): string {
	const parameters = new URLSearchParams();
	for (const [name, value] of Object.entries(query))
		if (value !== undefined && value !== '') parameters.set(name, String(value));
	const text = parameters.toString();
	return text === '' ? '' : `?${text}`;
}

interface Options {
	readonly signal?: AbortSignal;
}

async function answerOf<T>(response: Response): Promise<T> {
	const type = response.headers.get('content-type') ?? '';
	if (response.ok && type.startsWith('application/json')) return (await response.json()) as T;
	if (type.startsWith('application/problem+json'))
		throw new ApiProblem(
			(await response.json()) as ProblemDetails,
			response.headers.get('retry-after')
		);
	throw new ApiUnreachable(`${response.status} ${type}`);
}

/**
 * Every GET of the interface and the posted reading as functions.
 * Each throws `ApiProblem` for a refusal and `ApiUnreachable` when there is no answer of ours.
 * @param fetch the browser's, or the one that the framework hands to `load`
 * @example const { readings } = await apiClient(fetch).read({ text: 'RM23N0G100001' });
 */
export function apiClient(fetch: typeof globalThis.fetch, root = '/api/v1') {
	const ask = async <T>(path: string, init: RequestInit): Promise<T> => {
		let response: Response;
		try {
			response = await fetch(root + path, init);
		} catch (error) {
			if (error instanceof DOMException && error.name === 'AbortError') throw error;
			throw new ApiUnreachable('No answer', { cause: error });
		}
		return answerOf<T>(response);
	};
	const get = <T>(path: string, query: Query, { signal }: Options): Promise<T> =>
		ask(path + queryString(query), { signal, headers: { accept: 'application/json' } });
	const at = (...parts: string[]): string =>
		parts.map((part) => `/${encodeURIComponent(part)}`).join('');

	return {
		read: (query: ReadingQuery, options: Options = {}) =>
			get<ReadAnswer>('/readings', query, options),
		/** As `read`, with the stamp in the body: it stands in no address and no log. */
		readPosted: (body: ReadingBody, { signal }: Options = {}) =>
			ask<ReadAnswer>('/readings', {
				method: 'POST',
				body: JSON.stringify(body),
				signal,
				headers: { accept: 'application/json', 'content-type': 'application/json' }
			}),
		makers: (query: ListQuery = {}, options: Options = {}) =>
			get<MakersAnswer>('/makers', query, options),
		layouts: (query: ListQuery = {}, options: Options = {}) =>
			get<LayoutsAnswer>('/layouts', query, options),
		tables: (query: TablesQuery = {}, options: Options = {}) =>
			get<TablesAnswer>('/tables', query, options),
		table: (maker: Maker, table: TableName, query: TableQuery = {}, options: Options = {}) =>
			get<TableAnswer>(at('tables', maker, table), query, options),
		row: (row_key: string, query: EditionQuery = {}, options: Options = {}) =>
			get<RowDetail>(at('rows', row_key), query, options),
		rowHistory: (row_key: string, query: ListQuery = {}, options: Options = {}) =>
			get<RowHistoryAnswer>(at('rows', row_key, 'history'), query, options),
		sources: (query: SourcesQuery = {}, options: Options = {}) =>
			get<SourcesAnswer>('/sources', query, options),
		source: (key: string, query: EditionQuery = {}, options: Options = {}) =>
			get<SourceDetail>(at('sources', key), query, options),
		items: (query: ItemsQuery = {}, options: Options = {}) =>
			get<ItemsAnswer>('/items', query, options),
		editions: (query: ListQuery = {}, options: Options = {}) =>
			get<EditionsAnswer>('/editions', query, options),
		edition: (number: number, options: Options = {}) =>
			get<EditionDetail>(at('editions', String(number)), {}, options)
	};
}
export type ApiClient = ReturnType<typeof apiClient>;

/** All items of a list, page after page. */
export async function everyItem<Item>(
	page: (cursor: string | undefined) => Promise<{ items: readonly Item[]; next: string | null }>
): Promise<Item[]> {
	const all: Item[] = [];
	let cursor: string | undefined;
	do {
		const { items, next } = await page(cursor);
		all.push(...items);
		cursor = next ?? undefined;
	} while (cursor !== undefined);
	return all;
}
