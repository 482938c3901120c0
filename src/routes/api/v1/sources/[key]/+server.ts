import { answerFromEdition } from '$lib/server/answers';
import { jsonEndpoint, MOST, otherMethods, readParameters } from '$lib/server/http';
import { sourceWithRows } from '$lib/server/reference';
import type { RequestHandler } from './$types';

export const GET: RequestHandler = jsonEndpoint((event) => {
	const asked = readParameters(event.url.search, ['edition']);
	return answerFromEdition(event, asked, ({ tables }) => {
		const { source, rows, repeated_by } = sourceWithRows(tables, event.params.key);
		return {
			...source,
			rows: rows.slice(0, MOST).map(({ row }) => row.row_key),
			repeated_by: repeated_by.map(({ key }) => key)
		};
	});
});

export const fallback = otherMethods('GET');
