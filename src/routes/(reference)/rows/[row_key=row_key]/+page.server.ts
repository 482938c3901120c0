import { admit } from '$lib/server/http';
import { readEdition } from '$lib/server/readings';
import type { PageServerLoad } from './$types';
import { rowPage } from './row-page.server';

export const load: PageServerLoad = ({ params, url, locals, getClientAddress }) => {
	admit(getClientAddress());
	const edition = readEdition(url.searchParams.get('edition') || undefined);
	return rowPage(params.row_key, edition, locals.requestId);
};
