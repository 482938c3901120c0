import { redirect } from '@sveltejs/kit';
import {
	changeOwnName,
	changeOwnPassword,
	endAllOwnSessions,
	endOwnSession,
	requestNewAddress
} from '$lib/server/accounts';
import { readForm, refused } from '$lib/server/forms';
import { ground } from '$lib/server/ground';
import { signedIn } from '$lib/server/sign-in';
import type { Actions, PageServerLoad } from './$types';
import { accountPage } from './account-page.server';
import { nameSchema, newAddressSchema, passwordSchema, sessionSchema } from './schemas';

export const load: PageServerLoad = async (event) => ({
	account: await accountPage(await signedIn(event)),
	saved: event.url.searchParams.get('saved')
});

export const actions: Actions = {
	name: async ({ request, locals }) => {
		const form = await readForm(request, 'name', nameSchema);
		if (!form.ok) return form.refusal;
		await changeOwnName(ground(), await locals.actor(), form.data.name);
		redirect(303, '/account?saved=name');
	},
	address: async ({ request, locals }) => {
		const form = await readForm(request, 'address', newAddressSchema);
		if (!form.ok) return form.refusal;
		try {
			await requestNewAddress(ground(), await locals.actor(), form.data);
		} catch (error) {
			return refused('address', form.typed, error, { wrong_password: 'password' });
		}
		redirect(303, '/account?saved=address');
	},
	password: async ({ request, locals }) => {
		const form = await readForm(request, 'password', passwordSchema);
		if (!form.ok) return form.refusal;
		const { password: current, new_password: chosen } = form.data;
		try {
			await changeOwnPassword(ground(), await locals.actor(), { current, chosen });
		} catch (error) {
			return refused('password', form.typed, error, { wrong_password: 'password' });
		}
		redirect(303, '/account?saved=password');
	},
	session: async ({ request, locals }) => {
		const form = await readForm(request, 'session', sessionSchema);
		if (!form.ok) return form.refusal;
		await endOwnSession(ground(), await locals.actor(), form.data.id);
		redirect(303, '/account?saved=session');
	},
	everywhere: async ({ locals }) => {
		await endAllOwnSessions(ground(), await locals.actor());
		redirect(303, '/signin?said=out');
	}
};
