import { admit, counted } from '$lib/server/http';
import type { PageServerLoad } from './$types';
import { partPage } from './part-page.server';

export const load: PageServerLoad = ({ url, getClientAddress }) => {
	const address = getClientAddress();
	admit(address);
	return counted(address, () => partPage(url.searchParams));
};
