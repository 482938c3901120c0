import { config } from '$lib/server/config';
import { viewerOf } from '$lib/server/sign-in';
import type { LayoutServerLoad } from './$types';

export const load: LayoutServerLoad = async ({ locals }) => ({
	viewer: await viewerOf(locals.actor),
	demo: config().demo
});
