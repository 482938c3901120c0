import { admit } from '$lib/server/http';
import type { PageServerLoad } from './$types';
import { sourcePage } from './source-page.server';

export const load: PageServerLoad = ({ params, url, getClientAddress }) => {
	admit(getClientAddress());
	return sourcePage(url, params.key);
};
