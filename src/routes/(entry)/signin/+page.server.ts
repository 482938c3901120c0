import { redirect } from '@sveltejs/kit';
import { DEMO_PASSWORD, demoPeople } from '$lib/server/accounts';
import { readForm, refused } from '$lib/server/forms';
import { actorOfRequest, enterByPassword, ownPath } from '$lib/server/sign-in';
import { accountsText } from '$lib/text/en/accounts';
import { signInSchema } from '../schemas';
import type { Actions, PageServerLoad } from './$types';

/** What is said above the form, by how somebody came here. */
const SAID: Readonly<Record<string, string>> = {
	out: accountsText.signIn.out,
	changed: accountsText.signIn.changed
};

export const load: PageServerLoad = async ({ locals, url }) => {
	const next = url.searchParams.get('next');
	const actor = await locals.actor();
	if (actor.role !== 'visitor') redirect(303, ownPath(next));
	const people = demoPeople();
	const chosen = people?.find(({ key }) => key === url.searchParams.get('as'));
	return {
		next,
		said: SAID[url.searchParams.get('said') ?? ''] ?? null,
		filled: chosen ? { address: chosen.address, password: DEMO_PASSWORD } : null,
		people:
			people?.map(({ key, name, stands }) => ({
				key,
				name,
				stands,
				chosen: key === chosen?.key
			})) ?? null
	};
};

export const actions: Actions = {
	default: async (event) => {
		const form = await readForm(event.request, 'sign_in', signInSchema);
		if (!form.ok) return form.refusal;
		try {
			await enterByPassword(event, form.data);
		} catch (error) {
			return refused('sign_in', form.typed, error, { wrong_sign_in: 'password' });
		}
		const next = ownPath(event.url.searchParams.get('next'));
		const { role } = await actorOfRequest(event);
		redirect(303, role === 'visitor' ? `/signin/code?next=${encodeURIComponent(next)}` : next);
	}
};
