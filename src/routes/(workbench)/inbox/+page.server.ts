import { redirect } from '@sveltejs/kit';
import { ground } from '$lib/server/ground';
import { readAllNotices } from '$lib/server/inbox';
import { signedIn } from '$lib/server/sign-in';
import type { Actions, PageServerLoad } from './$types';
import { moveFromForm, noticesPage, openFromForm } from './inbox-page.server';

export const load: PageServerLoad = async (event) => ({
	notices: await noticesPage(await signedIn(event), false)
});

export const actions: Actions = {
	open: openFromForm,
	move: (event) => moveFromForm(event, true),
	read: async ({ locals }) => {
		await readAllNotices(ground(), await locals.actor());
		redirect(303, '/inbox');
	}
};
