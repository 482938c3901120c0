import { admit } from '$lib/server/http';
import type { PageServerLoad } from './$types';
import { sourcesPage } from './sources-page.server';

export const load: PageServerLoad = ({ url, getClientAddress }) => {
	admit(getClientAddress());
	return sourcesPage(url);
};
