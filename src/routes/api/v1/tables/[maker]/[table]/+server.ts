import { answerTable, readFormat, TABLE_PARAMETERS, tableAsked } from '$lib/server/answers';
import { admit, chooseType, endpoint, otherMethods, readParameters } from '$lib/server/http';
import type { RequestHandler } from './$types';

/** A search goes through a whole table: it counts as so many requests more. */
const SEARCH_COST = 9;

export const GET: RequestHandler = endpoint(({ url, request, params, getClientAddress }) => {
	const asked = readParameters(url.search, TABLE_PARAMETERS);
	const format = readFormat(asked.format);
	const type = chooseType(request.headers.get('accept'), ['application/json', 'text/csv']);
	const table = tableAsked(params.maker, params.table);
	if (asked.q !== undefined) admit(getClientAddress(), SEARCH_COST);
	const as = format ?? (type === 'text/csv' ? 'csv' : 'json');
	return answerTable({ url, request }, table, asked, as);
});

export const fallback = otherMethods('GET');
