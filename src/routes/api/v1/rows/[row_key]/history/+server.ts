import { answerHistory } from '$lib/server/answers';
import { jsonEndpoint, otherMethods, readParameters } from '$lib/server/http';
import { rowHistory } from '$lib/server/reference';
import type { RequestHandler } from './$types';

export const GET: RequestHandler = jsonEndpoint(async (event) => {
	const asked = readParameters(event.url.search, ['limit', 'cursor']);
	return answerHistory(event, asked, await rowHistory(event.params.row_key));
});

export const fallback = otherMethods('GET');
