import { answerEditionList, sourceKindFilter } from '$lib/server/answers';
import { jsonEndpoint, otherMethods, readParameters } from '$lib/server/http';
import { sourcesList } from '$lib/server/reference';

export const GET = jsonEndpoint((event) => {
	const asked = readParameters(event.url.search, ['edition', 'kind', 'limit', 'cursor']);
	const kind = sourceKindFilter(asked.kind);
	return answerEditionList(event, asked, ({ tables }) =>
		sourcesList(tables).filter((source) => kind === undefined || source.kind === kind)
	);
});

export const fallback = otherMethods('GET');
