import { admit } from '$lib/server/http';
import type { PageServerLoad } from './$types';
import { tablesPage } from './tables-page.server';

/** What a search costs beside a reading. */
const SEARCH = 5;

export const load: PageServerLoad = ({ url, getClientAddress }) => {
	admit(getClientAddress(), url.searchParams.get('q') ? SEARCH : 1);
	return tablesPage(url);
};
