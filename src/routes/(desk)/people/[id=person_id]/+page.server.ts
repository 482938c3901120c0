import { redirect } from '@sveltejs/kit';
import { readForm, refused } from '$lib/server/forms';
import { ground } from '$lib/server/ground';
import { endSessionsOf, pausePerson, resumePerson, setRole } from '$lib/server/people';
import { signedIn } from '$lib/server/sign-in';
import type { Actions, PageServerLoad } from './$types';
import { personPage } from './person-page.server';
import { pauseSchema, resumeSchema, roleSchema, sessionSchema } from './schemas';

/** Errors that are about a form as a whole. */
const WHOLE = { changed_meanwhile: 'form', last_administrator: 'form', own_account: 'form' };
const saved = (id: string, what: string): never => redirect(303, `/people/${id}?saved=${what}`);

export const load: PageServerLoad = async (event) => ({
	person: await personPage(await signedIn(event), event.params.id),
	saved: event.url.searchParams.get('saved')
});

export const actions: Actions = {
	role: async ({ request, locals, params: { id } }) => {
		const form = await readForm(request, 'role', roleSchema, ['areas']);
		if (!form.ok) return form.refusal;
		const { version, ...role } = form.data;
		try {
			await setRole(ground(), await locals.actor(), { id, version }, role);
		} catch (error) {
			return refused('role', form.typed, error, WHOLE);
		}
		saved(id, 'role');
	},
	pause: async ({ request, locals, params: { id } }) => {
		const form = await readForm(request, 'pause', pauseSchema(ground().clock()));
		if (!form.ok) return form.refusal;
		const { version, ...pause } = form.data;
		try {
			await pausePerson(ground(), await locals.actor(), { id, version }, pause);
		} catch (error) {
			return refused('pause', form.typed, error, WHOLE);
		}
		saved(id, 'pause');
	},
	resume: async ({ request, locals, params: { id } }) => {
		const form = await readForm(request, 'resume', resumeSchema);
		if (!form.ok) return form.refusal;
		try {
			await resumePerson(ground(), await locals.actor(), { id, ...form.data });
		} catch (error) {
			return refused('resume', form.typed, error, WHOLE);
		}
		saved(id, 'resumed');
	},
	sessions: async ({ request, locals, params: { id } }) => {
		const form = await readForm(request, 'sessions', sessionSchema);
		if (!form.ok) return form.refusal;
		await endSessionsOf(ground(), await locals.actor(), id, form.data.session);
		saved(id, 'sessions');
	}
};
