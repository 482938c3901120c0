import { fail, redirect } from '@sveltejs/kit';
import { deleteFile, fileGround, takeFileOfForm } from '$lib/server/files';
import { readForm } from '$lib/server/forms';
import { signedIn } from '$lib/server/sign-in';
import { idFormSchema } from '$lib/types';
import type { Actions, PageServerLoad } from './$types';
import { codeOf, filesPage } from './files-page.server';

export const load: PageServerLoad = async (event) => ({
	...(await filesPage(fileGround(), await signedIn(event), event.url))
});

export const actions: Actions = {
	send: async ({ request, locals }) => {
		let sent;
		try {
			sent = await takeFileOfForm(fileGround(), await locals.actor(), request);
		} catch (error) {
			return fail(422, { form: 'send', typed: {}, faults: { file: codeOf(error) } });
		}
		redirect(303, `/account/files?sent=${sent.id}`);
	},
	delete: async ({ request, locals }) => {
		const form = await readForm(request, 'delete', idFormSchema);
		if (!form.ok) return form.refusal;
		await deleteFile(fileGround(), await locals.actor(), form.data.id);
		redirect(303, '/account/files?deleted=1');
	}
};
