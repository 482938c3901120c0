import { redirect } from '@sveltejs/kit';
import { readForm, refused } from '$lib/server/forms';
import { enterByCode, ownPath } from '$lib/server/sign-in';
import { codeSchema } from '../../schemas';
import type { Actions, PageServerLoad } from './$types';

export const load: PageServerLoad = async ({ locals, url }) => {
	const next = url.searchParams.get('next');
	const actor = await locals.actor();
	if (actor.role !== 'visitor') redirect(303, ownPath(next));
	if (!actor.awaitsCode) redirect(303, '/signin');
	return { next };
};

export const actions: Actions = {
	default: async (event) => {
		const form = await readForm(event.request, 'code', codeSchema);
		if (!form.ok) return form.refusal;
		try {
			await enterByCode(event, form.data.code);
		} catch (error) {
			return refused('code', form.typed, error, { wrong_code: 'code' });
		}
		redirect(303, ownPath(event.url.searchParams.get('next')));
	}
};
