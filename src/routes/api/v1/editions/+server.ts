import { answerEditions } from '$lib/server/answers';
import { jsonEndpoint, otherMethods, readParameters } from '$lib/server/http';

export const GET = jsonEndpoint((event) =>
	answerEditions(event, readParameters(event.url.search, ['limit', 'cursor']))
);

export const fallback = otherMethods('GET');
