import { answerEditionList, makerFilter, tableEntry } from '$lib/server/answers';
import { jsonEndpoint, otherMethods, readParameters } from '$lib/server/http';
import { tablesInOrder } from '$lib/server/reference';

export const GET = jsonEndpoint((event) => {
	const asked = readParameters(event.url.search, ['edition', 'maker', 'limit', 'cursor']);
	const maker = makerFilter(asked.maker);
	return answerEditionList(event, asked, ({ tables }) =>
		tablesInOrder(tables, { maker }).map(tableEntry)
	);
});

export const fallback = otherMethods('GET');
