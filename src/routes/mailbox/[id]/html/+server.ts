import { error } from '@sveltejs/kit';
import { demoMailbox, keptMail } from '$lib/server/mail';
import type { RequestHandler } from './$types';

/** A mail is set by styles of its own; beyond that nothing in it loads, runs or leads anywhere. */
const HEADERS = {
	'content-type': 'text/html; charset=utf-8',
	'content-security-policy':
		"default-src 'none'; style-src 'unsafe-inline'; base-uri 'none'; form-action 'none'; frame-ancestors 'self'; sandbox",
	'x-frame-options': 'SAMEORIGIN',
	'cache-control': 'private, no-store'
};

export const GET: RequestHandler = async ({ params }) => {
	const { html } = await keptMail(demoMailbox(), params.id);
	if (html === null) error(404);
	return new Response(html, { headers: HEADERS });
};
