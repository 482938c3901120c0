import { answerReading } from '$lib/server/answers';
import {
	answerPosted,
	jsonEndpoint,
	otherMethods,
	readJsonObject,
	readParameters
} from '$lib/server/http';
import { parametersOfBody, READING_PARAMETERS, readRequest, readStamp } from '$lib/server/readings';

export const GET = jsonEndpoint(({ url, request }) => {
	const asked = readRequest(readParameters(url.search, READING_PARAMETERS));
	return answerReading(request, asked, url.search);
});

export const POST = jsonEndpoint(async ({ request }) => {
	const asked = readRequest(parametersOfBody(await readJsonObject(request)));
	return answerPosted(await readStamp(asked));
});

export const fallback = otherMethods('GET', 'POST');
