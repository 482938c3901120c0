import { admit } from '$lib/server/http';
import type { PageServerLoad } from './$types';
import { editionPage } from './edition-page.server';

export const load: PageServerLoad = ({ params, url, getClientAddress }) => {
	admit(getClientAddress());
	return editionPage(url, Number(params.n));
};
