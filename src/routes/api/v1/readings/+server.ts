import { answerPostedReading, answerReading, answerStamps } from '$lib/server/answers';
import { jsonEndpoint, otherMethods, readJsonObject, readParameters } from '$lib/server/http';
import {
	READING_PARAMETERS,
	readRequest,
	requestOfBody,
	stampsRequestOfBody
} from '$lib/server/readings';

export const GET = jsonEndpoint((event) =>
	answerReading(event, readRequest(readParameters(event.url.search, READING_PARAMETERS)))
);

/** One stamp, or under `stamps` several of one car. */
export const POST = jsonEndpoint(async (event) => {
	const body = await readJsonObject(event.request);
	return 'stamps' in body
		? answerStamps(event, stampsRequestOfBody(body))
		: answerPostedReading(event, requestOfBody(body));
});

export const fallback = otherMethods('GET', 'POST');
