import { demoMailbox, keptMail } from '$lib/server/mail';
import type { PageServerLoad } from './$types';

export const load: PageServerLoad = async ({ params }) => {
	const { html, ...mail } = await keptMail(demoMailbox(), params.id);
	return { mail, formatted: html !== null };
};
