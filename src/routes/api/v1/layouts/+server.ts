import { answerFixedList, LAYOUT_LIST } from '$lib/server/answers';
import { jsonEndpoint, otherMethods, readParameters } from '$lib/server/http';

export const GET = jsonEndpoint((event) =>
	answerFixedList(event, readParameters(event.url.search, ['limit', 'cursor']), LAYOUT_LIST)
);

export const fallback = otherMethods('GET');
