import { redirect } from '@sveltejs/kit';
import { isReset, requestReset, resetPassword } from '$lib/server/accounts';
import { readForm, refused } from '$lib/server/forms';
import { ground } from '$lib/server/ground';
import { addressSchema, chosenSchema } from '../schemas';
import type { Actions, PageServerLoad } from './$types';

export const load: PageServerLoad = async ({ url }) => {
	const token = url.searchParams.get('token');
	return {
		token,
		good: token !== null && (await isReset(ground(), token)),
		sent: url.searchParams.has('sent')
	};
};

export const actions: Actions = {
	ask: async ({ request, getClientAddress }) => {
		const form = await readForm(request, 'ask', addressSchema);
		if (!form.ok) return form.refusal;
		try {
			await requestReset(ground(), form.data.address, getClientAddress());
		} catch (error) {
			return refused('ask', form.typed, error, {});
		}
		redirect(303, '/reset?sent=yes');
	},
	choose: async ({ request }) => {
		const form = await readForm(request, 'choose', chosenSchema);
		if (!form.ok) return form.refusal;
		try {
			await resetPassword(ground(), form.data.token, form.data.new_password);
		} catch (error) {
			return refused('choose', form.typed, error, { lapsed_link: 'form' });
		}
		redirect(303, '/signin?said=changed');
	}
};
