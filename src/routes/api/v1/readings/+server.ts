import { answerPostedReading, answerReading } from '$lib/server/answers';
import { jsonEndpoint, otherMethods, readJsonObject, readParameters } from '$lib/server/http';
import { parametersOfBody, READING_PARAMETERS, readRequest } from '$lib/server/readings';

export const GET = jsonEndpoint((event) =>
	answerReading(event, readRequest(readParameters(event.url.search, READING_PARAMETERS)))
);

export const POST = jsonEndpoint(async (event) => {
	const body = await readJsonObject(event.request);
	return answerPostedReading(event, readRequest(parametersOfBody(body)));
});

export const fallback = otherMethods('GET', 'POST');
