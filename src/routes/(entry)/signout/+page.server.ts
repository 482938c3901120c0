import { redirect } from '@sveltejs/kit';
import { leave } from '$lib/server/sign-in';
import type { Actions } from './$types';

export const actions: Actions = {
	default: async (event) => {
		await leave(event);
		redirect(303, '/signin?said=out');
	}
};
