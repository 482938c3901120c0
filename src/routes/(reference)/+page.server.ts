import { redirect } from '@sveltejs/kit';
import { admit } from '$lib/server/http';
import type { PageServerLoad } from './$types';
import { readingPage, usualAddress } from './reading/reading-page.server';

/** The page ships no framework: what script adds is live.js alone. */
export const csr = false;

export const load: PageServerLoad = ({ url, getClientAddress }) => {
	admit(getClientAddress());
	const usual = usualAddress(url);
	if (usual !== null) redirect(303, usual);
	return readingPage(url, new Date());
};
