import { signedIn } from '$lib/server/sign-in';
import { moveFromForm, noticesPage, openFromForm } from '../inbox-page.server';
import type { Actions, PageServerLoad } from './$types';

export const load: PageServerLoad = async (event) => ({
	notices: await noticesPage(await signedIn(event), true)
});

export const actions: Actions = {
	open: openFromForm,
	move: (event) => moveFromForm(event, false)
};
