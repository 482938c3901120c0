import { redirect } from '@sveltejs/kit';
import { admit } from '$lib/server/http';
import type { PageServerLoad } from './$types';
import { readingPage, usualAddress } from './reading/reading-page.server';

export const load: PageServerLoad = ({ url, getClientAddress }) => {
	admit(getClientAddress());
	const usual = usualAddress(url);
	if (usual !== null) redirect(303, usual);
	return readingPage(url, new Date());
};
