import { answerEdition, editionNumber } from '$lib/server/answers';
import { jsonEndpoint, otherMethods, readParameters } from '$lib/server/http';
import type { RequestHandler } from './$types';

export const GET: RequestHandler = jsonEndpoint((event) => {
	readParameters(event.url.search, []);
	return answerEdition(event, editionNumber(event.params.n));
});

export const fallback = otherMethods('GET');
