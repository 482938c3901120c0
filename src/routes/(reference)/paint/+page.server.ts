import { admit, counted } from '$lib/server/http';
import type { PageServerLoad } from './$types';
import { paintPage } from './paint-page.server';

export const load: PageServerLoad = ({ url, getClientAddress }) => {
	const address = getClientAddress();
	admit(address);
	return counted(address, () => paintPage(url.searchParams));
};
