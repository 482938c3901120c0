import { redirect } from '@sveltejs/kit';
import {
	confirmFactor,
	offerFactor,
	ownAccount,
	removeFactor,
	renewRecoveryCodes
} from '$lib/server/accounts';
import { readForm, refused } from '$lib/server/forms';
import { ground } from '$lib/server/ground';
import { qrDrawing } from '$lib/server/qr';
import { signedIn } from '$lib/server/sign-in';
import { factorSchema, removeFactorSchema } from '../schemas';
import type { Actions, PageServerLoad } from './$types';

export const load: PageServerLoad = async (event) => {
	const actor = await signedIn(event);
	const { factor } = await ownAccount(ground(), actor);
	if (factor) return { offer: null };
	const { secret, address } = await offerFactor(ground(), actor);
	return { offer: { secret: secret.replace(/.{4}(?=.)/g, '$& '), qr: qrDrawing(address) } };
};

export const actions: Actions = {
	add: async ({ request, locals }) => {
		const form = await readForm(request, 'add', factorSchema);
		if (!form.ok) return form.refusal;
		try {
			return { codes: await confirmFactor(ground(), await locals.actor(), form.data.code) };
		} catch (error) {
			return refused('add', form.typed, error, { wrong_code: 'code', factor_state: 'form' });
		}
	},
	renew: async ({ request, locals }) => {
		const form = await readForm(request, 'renew', factorSchema);
		if (!form.ok) return form.refusal;
		try {
			return { codes: await renewRecoveryCodes(ground(), await locals.actor(), form.data.code) };
		} catch (error) {
			return refused('renew', form.typed, error, { wrong_code: 'code' });
		}
	},
	remove: async ({ request, locals }) => {
		const form = await readForm(request, 'remove', removeFactorSchema);
		if (!form.ok) return form.refusal;
		try {
			await removeFactor(ground(), await locals.actor(), form.data);
		} catch (error) {
			const fields = { wrong_password: 'password', wrong_code: 'code' };
			return refused('remove', form.typed, error, fields);
		}
		redirect(303, '/account?saved=factor');
	}
};
