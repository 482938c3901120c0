import { admit, counted } from '$lib/server/http';
import type { PageServerLoad } from './$types';
import { wherePage } from './where-page.server';

export const load: PageServerLoad = ({ url, getClientAddress }) => {
	const address = getClientAddress();
	admit(address);
	return counted(address, () => wherePage(url.searchParams, new Date()));
};
