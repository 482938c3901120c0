import { config } from '$lib/server/config';
import { viewerOf } from '$lib/server/sign-in';
import type { LayoutServerLoad } from './$types';

export const load: LayoutServerLoad = async ({ locals }) => {
	const { demo, mailboxFolder } = config();
	return {
		viewer: await viewerOf(locals.actor),
		demo,
		/** Its mail can be read here. */
		mailbox: demo && mailboxFolder !== undefined
	};
};
