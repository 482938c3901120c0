import { redirect } from '@sveltejs/kit';
import { z } from 'zod';
import { readForm } from '$lib/server/forms';
import { ground } from '$lib/server/ground';
import { ownPreferences, setOwnPreferences } from '$lib/server/inbox';
import { signedIn } from '$lib/server/sign-in';
import { NOTICE_KINDS, NOTICE_MAILS } from '$lib/types';
import type { Actions, PageServerLoad } from './$types';

const preferencesSchema = z.record(z.enum(NOTICE_KINDS), z.enum(NOTICE_MAILS, 'unknown'));

export const load: PageServerLoad = async (event) => ({
	preferences: await ownPreferences(ground(), await signedIn(event)),
	saved: event.url.searchParams.has('saved')
});

export const actions: Actions = {
	default: async ({ request, locals }) => {
		const form = await readForm(request, 'preferences', preferencesSchema);
		if (!form.ok) return form.refusal;
		await setOwnPreferences(ground(), await locals.actor(), form.data);
		redirect(303, '/inbox/preferences?saved=1');
	}
};
