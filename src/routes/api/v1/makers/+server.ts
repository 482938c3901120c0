import { answerFixedList } from '$lib/server/answers';
import { jsonEndpoint, otherMethods, readParameters } from '$lib/server/http';
import { MAKER_LIST } from '$lib/server/readings';

export const GET = jsonEndpoint((event) =>
	answerFixedList(event, readParameters(event.url.search, ['limit', 'cursor']), MAKER_LIST)
);

export const fallback = otherMethods('GET');
