import { answerTus, fileGround } from '$lib/server/files';
import { admit } from '$lib/server/http';
import type { RequestHandler } from './$types';

/** The resumable upload protocol (tus 1.0): a POST makes room for a file. */
export const fallback: RequestHandler = async ({ request, locals, getClientAddress }) => {
	admit(getClientAddress());
	return answerTus(fileGround(), await locals.actor(), request);
};
