import { redirect } from '@sveltejs/kit';
import { deleteOwnAccount } from '$lib/server/accounts';
import { readForm, refused } from '$lib/server/forms';
import { ground } from '$lib/server/ground';
import { leave, signedIn } from '$lib/server/sign-in';
import { deletionSchema } from '../schemas';
import type { Actions, PageServerLoad } from './$types';

export const load: PageServerLoad = async (event) => {
	await signedIn(event);
};

export const actions: Actions = {
	default: async (event) => {
		const form = await readForm(event.request, 'delete', deletionSchema);
		if (!form.ok) return form.refusal;
		try {
			await deleteOwnAccount(ground(), await event.locals.actor(), form.data.password);
		} catch (error) {
			return refused('delete', form.typed, error, {
				wrong_password: 'password',
				last_administrator: 'form'
			});
		}
		await leave(event);
		redirect(303, '/account/gone');
	}
};
