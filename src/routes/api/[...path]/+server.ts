import { fault, jsonEndpoint, notFound } from '$lib/server/http';
import { interfaceText } from '$lib/text/en/interface';

/** Whatever stands at no address of the interface, by any method. */
export const fallback = jsonEndpoint(({ url }) => {
	throw notFound(
		fault('path', 'unknown_path', interfaceText.unknown.path, [url.origin + '/api/v1/openapi.json'])
	);
});
