import { redirect } from '@sveltejs/kit';
import { requestSignUp } from '$lib/server/accounts';
import { readForm, refused } from '$lib/server/forms';
import { ground } from '$lib/server/ground';
import { signUpSchema } from '../schemas';
import type { Actions, PageServerLoad } from './$types';

export const load: PageServerLoad = ({ url }) => ({ sent: url.searchParams.has('sent') });

export const actions: Actions = {
	default: async ({ request, getClientAddress }) => {
		const form = await readForm(request, 'sign_up', signUpSchema);
		if (!form.ok) return form.refusal;
		const { name, address } = form.data;
		try {
			await requestSignUp(ground(), { name, address, from: getClientAddress() });
		} catch (error) {
			return refused('sign_up', form.typed, error, {});
		}
		redirect(303, '/signup?sent=yes');
	}
};
