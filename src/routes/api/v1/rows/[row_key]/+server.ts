import { answerFromEdition, citationsOf, rowAnswer } from '$lib/server/answers';
import { jsonEndpoint, otherMethods, readParameters } from '$lib/server/http';
import { rowOf } from '$lib/server/reference';
import type { RequestHandler } from './$types';

export const GET: RequestHandler = jsonEndpoint((event) => {
	const asked = readParameters(event.url.search, ['edition']);
	return answerFromEdition(event, asked, ({ tables }) => {
		const row = rowOf(tables, event.params.row_key);
		return { ...rowAnswer(row), citations: citationsOf(row, tables) };
	});
});

export const fallback = otherMethods('GET');
