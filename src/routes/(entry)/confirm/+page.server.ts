import { redirect } from '@sveltejs/kit';
import {
	confirmNewAddress,
	confirmSignUp,
	lookAtNewAddress,
	lookAtSignUp
} from '$lib/server/accounts';
import { readForm, refused } from '$lib/server/forms';
import { ground } from '$lib/server/ground';
import { enterByPassword } from '$lib/server/sign-in';
import { chosenSchema, tokenSchema } from '../schemas';
import type { Actions, PageServerLoad } from './$types';

export const load: PageServerLoad = async ({ url }) => {
	const token = url.searchParams.get('token') ?? '';
	return {
		token,
		moved: url.searchParams.has('moved'),
		signUp: await lookAtSignUp(ground(), token),
		newAddress: await lookAtNewAddress(ground(), token)
	};
};

export const actions: Actions = {
	open: async (event) => {
		const form = await readForm(event.request, 'open', chosenSchema);
		if (!form.ok) return form.refusal;
		const { token, new_password: password } = form.data;
		try {
			const { address } = await confirmSignUp(ground(), token, password);
			await enterByPassword(event, { address, password });
		} catch (error) {
			return refused('open', form.typed, error, { lapsed_link: 'form' });
		}
		redirect(303, '/account');
	},
	move: async ({ request }) => {
		const form = await readForm(request, 'move', tokenSchema);
		if (!form.ok) return form.refusal;
		try {
			await confirmNewAddress(ground(), form.data.token);
		} catch (error) {
			return refused('move', form.typed, error, { lapsed_link: 'form' });
		}
		redirect(303, '/confirm?moved=yes');
	}
};
