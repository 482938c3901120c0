import { readForm, refused } from '$lib/server/forms';
import { askForLink } from '$lib/server/sign-in';
import { redirect } from '@sveltejs/kit';
import { addressSchema } from '../../schemas';
import type { Actions, PageServerLoad } from './$types';

/**
 * `token`: somebody comes from their mail; the link is used by a press, because programs that look after mail
 * open links too. `sent`: one was asked for. `lapsed`, or the library's own `error`: it is good no longer.
 */
export const load: PageServerLoad = ({ url }) => {
	const has = (name: string) => url.searchParams.has(name);
	return {
		token: url.searchParams.get('token'),
		sent: has('sent') || has('provider'),
		lapsed: has('lapsed') || has('error')
	};
};

export const actions: Actions = {
	default: async (event) => {
		const form = await readForm(event.request, 'link', addressSchema);
		if (!form.ok) return form.refusal;
		try {
			await askForLink(event, form.data.address);
		} catch (error) {
			return refused('link', form.typed, error, {});
		}
		redirect(303, '/signin/link?sent=yes');
	}
};
