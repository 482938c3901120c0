import { admit, counted } from '$lib/server/http';
import type { PageServerLoad } from './$types';
import { tagPage } from './tag-page.server';

export const load: PageServerLoad = ({ url, getClientAddress }) => {
	const address = getClientAddress();
	admit(address);
	return counted(address, () => tagPage(url.searchParams, new Date()));
};
