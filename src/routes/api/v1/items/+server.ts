import { answerEditionList, itemEntry, makerFilter } from '$lib/server/answers';
import { jsonEndpoint, otherMethods, readParameters } from '$lib/server/http';
import { tablesInOrder } from '$lib/server/reference';

export const GET = jsonEndpoint((event) => {
	const asked = readParameters(event.url.search, ['edition', 'maker', 'limit', 'cursor']);
	const maker = makerFilter(asked.maker);
	return answerEditionList(event, asked, ({ tables }) =>
		tablesInOrder(tables, { maker, table: 'item' }).flatMap(({ rows }) => rows.map(itemEntry))
	);
});

export const fallback = otherMethods('GET');
