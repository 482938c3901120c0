import { etagOf, jsonEndpoint, otherMethods, answerWritten } from '$lib/server/http';
import { openApiJson } from '$lib/server/openapi';

export const GET = jsonEndpoint(({ request }) =>
	answerWritten(request, { etag: etagOf('', '', '/openapi.json') }, openApiJson)
);

export const fallback = otherMethods('GET');
