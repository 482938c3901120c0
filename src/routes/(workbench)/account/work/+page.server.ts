import { redirect } from '@sveltejs/kit';
import { readForm } from '$lib/server/forms';
import { ground } from '$lib/server/ground';
import { stopWork } from '$lib/server/jobs';
import { signedIn } from '$lib/server/sign-in';
import { idFormSchema } from '$lib/types';
import type { Actions, PageServerLoad } from './$types';
import { workPage } from './work-page.server';

export const load: PageServerLoad = async (event) => ({
	work: await workPage(await signedIn(event)),
	stopped: event.url.searchParams.has('stopped')
});

export const actions: Actions = {
	default: async ({ request, locals }) => {
		const form = await readForm(request, 'stop', idFormSchema);
		if (!form.ok) return form.refusal;
		await stopWork(ground(), await locals.actor(), form.data.id);
		redirect(303, '/account/work?stopped=1');
	}
};
