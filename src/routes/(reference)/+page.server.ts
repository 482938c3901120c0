import { redirect } from '@sveltejs/kit';
import { forServerAlone } from '$lib/format/server-alone';
import { admit } from '$lib/server/http';
import type { PageServerLoad } from './$types';
import { readingPage, usualAddress } from './reading/reading-page.server';

/** The page ships no framework: what script adds is live.js alone. */
export const csr = false;

export const load: PageServerLoad = async ({ url, getClientAddress, isDataRequest }) => {
	admit(getClientAddress());
	const usual = usualAddress(url);
	if (usual !== null) redirect(303, usual);
	const page = await readingPage(url, new Date());
	// Another page's router asks for the data itself.
	return { page: isDataRequest ? page : forServerAlone(page) };
};
