import { redirect } from '@sveltejs/kit';
import { forServerAlone } from '$lib/format/server-alone';
import { admit } from '$lib/server/http';
import { KEPT_WHILE, presentPages } from '$lib/server/kept-pages';
import type { PageServerLoad } from './$types';
import { readingPage, usualAddress } from './reading/reading-page.server';

/** The page ships no framework: what script adds is live.js alone. */
export const csr = false;

export const load: PageServerLoad = async ({
	url,
	request,
	getClientAddress,
	isDataRequest,
	setHeaders
}) => {
	admit(getClientAddress());
	const usual = usualAddress(url);
	if (usual !== null) redirect(303, usual);
	const now = new Date();
	const present = presentPages(now);
	const page = await readingPage(url, now);
	// What is drawn for nobody is the same for all.
	if (!request.headers.has('cookie')) setHeaders({ [KEPT_WHILE]: present });
	// Another page's router asks for the data itself.
	return { page: isDataRequest ? page : forServerAlone(page) };
};
