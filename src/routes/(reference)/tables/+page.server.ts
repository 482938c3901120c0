import { admit, counted } from '$lib/server/http';
import type { PageServerLoad } from './$types';
import { tablesPage } from './tables-page.server';

export const load: PageServerLoad = ({ url, getClientAddress }) => {
	const address = getClientAddress();
	admit(address);
	return counted(address, () => tablesPage(url));
};
