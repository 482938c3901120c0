import { json } from '@sveltejs/kit';
import { fileAddress, fileFor, fileGround } from '$lib/server/files';
import { endpoint } from '$lib/server/http';
import { filesText } from '$lib/text/en/files';
import type { SentFileState } from '$lib/types';
import type { RequestHandler } from './$types';

/** How a file of who asks stands, for the page that has just sent it. */
export const GET: RequestHandler = endpoint(async ({ params, locals }) => {
	const ground = fileGround();
	const actor = await locals.actor();
	const { id, state, refusal, type } = await fileFor(ground, actor, params.id);
	const isPicture = type?.startsWith('image/') ?? false;
	return json({
		id,
		state,
		message: refusal && filesText.refusals[refusal],
		thumb: isPicture ? fileAddress(ground, actor, id, 'thumb') : null
	} satisfies SentFileState);
});
